/**
 * One operating point of a pump: its network solved, and the solution put into the words of the trade.
 */
import { type Solved, solve } from '../engine';
import type { DrivePlace } from '../pump/drive';
import { type PumpNetwork, pumpNetwork } from '../pump/network';
import { type CapacitorValues, idealVoltage, type PumpValues } from '../pump/values';
import { driverFigures } from './driver-figures';
import { besideCurrents } from './driver-overlap';
import { belowLoad } from './pump-assembly';
import { pumpDrops } from './pump-drops';
import { hasBand, type PumpModel } from './pump-model';
import type { CapacitorFigures, DiodeFigures, DriveFigures, PumpPoint } from './types';

export interface SolvedPoint {
  readonly point: PumpPoint;
  /** d(voltage) and d(ripple) per unit of each variable; NaN where there is none. */
  readonly slopes: { readonly voltage: readonly number[]; readonly ripple: readonly number[] };
}

/** Why there is no operating point. */
export interface NoPoint {
  readonly reason: string;
}

/** Solves the pump with its variables at `at`. */
export function solvePoint(
  model: PumpModel,
  at: readonly number[],
  mode: string | undefined,
  /** `figures`: no derivatives, which a corner that nobody moves on from does not need. */
  wanted: 'all' | 'figures' = 'all',
): SolvedPoint | NoPoint {
  const values = model.values(at);
  const network = pumpNetwork(values);
  if (!network) return { reason: 'the edges of its clock leave no room for its levels' };
  const contributions = wanted === 'all' ? model.contributions(at, network) : [];
  const solved = solve(network.network, {
    port: { a: network.output, b: network.ground },
    parameters: [
      { kind: 'draw', a: network.output, b: network.ground },
      ...contributions.map((c) => c.parameter),
    ],
  });
  if (!solved.converged) return { reason: solved.reason };
  const slopes = { voltage: new Array<number>(at.length), ripple: new Array<number>(at.length) };
  slopes.voltage.fill(0);
  slopes.ripple.fill(0);
  contributions.forEach((c, k) => {
    slopes.voltage[c.variable] = slopes.voltage[c.variable]! + c.weight * solved.derivatives.average[k + 1]!;
    slopes.ripple[c.variable] = slopes.ripple[c.variable]! + c.weight * solved.derivatives.ripple[k + 1]!;
  });
  if (wanted === 'figures') {
    slopes.voltage.fill(Number.NaN);
    slopes.ripple.fill(Number.NaN);
  }
  const tied = new Set(contributions.map((c) => c.variable));
  model.variables.forEach((variable, k) => {
    if (tied.has(k) || !hasBand(variable) || variable.still) return;
    slopes.voltage[k] = Number.NaN;
    slopes.ripple[k] = Number.NaN;
  });
  return { point: describe(model, values, network, solved, mode), slopes };
}

function describe(
  model: PumpModel,
  values: PumpValues,
  network: PumpNetwork,
  solved: Solved,
  mode: string | undefined,
): PumpPoint {
  const output = solved.nodes[network.output]!;
  const loads = network.loads.map(({ kind, index }) =>
    kind === 'load' ? solved.loads[index]! : solved.resistors[index]!,
  );
  const loadCurrent = sum(loads.map((load) => load.average));
  const askedCurrent = sum(
    values.loads.map((load, k) => {
      if (load.kind === 'current') return load.amps;
      if (load.kind === 'resistance') return loads[k]!.average;
      return Math.max(loads[k]!.average, load.watts / Math.max(Math.abs(output.average), load.knee));
    }),
  );
  const resistance = Math.abs(solved.derivatives.average[0]!);
  const sign = values.negative ? -1 : 1;
  const drivers = values.drives.map((_, k) => driverFigures(values, network, solved, k));
  const powerOut = sum(loads.map((load) => load.loss));
  const powerIn = sum(solved.knowns.map((known) => known.power));
  return {
    ...(mode === undefined ? {} : { mode }),
    voltage: output.average,
    lowest: output.min,
    highest: output.max,
    ripple: output.max - output.min,
    loadCurrent,
    belowCurrent: sum(values.loads.map((load, k) => (load.name === belowLoad ? loads[k]!.average : 0))),
    askedCurrent,
    // The first diode is the only way from the input rail.
    inputCurrent: values.input === undefined ? 0 : sign * throughFirst(network, solved),
    powerIn,
    powerOut,
    ideal: idealVoltage(values),
    openCircuit: output.average + sign * resistance * loadCurrent,
    outputResistance: resistance,
    drops: pumpDrops(values, network, solved, drivers, loadCurrent),
    balance: solved.balance,
    powerAveraged: solved.powerAveraged,
    drives: network.drives.map((drive) => driveFigures(solved, drive)),
    drivers,
    railCurrents: new Map(
      values.rails.map((rail, k) => [rail.name, solved.knowns[network.rails[k]!.known]!.average]),
    ),
    besideCurrents: besideCurrents(values, drivers),
    driveHeat: network.drives.map(
      ({ high, low }) => solved.resistors[high]!.loss + solved.resistors[low]!.loss,
    ),
    capacitors: capacitorFigures(model, values, network, solved),
    diodes: network.diodes.map((index, k): DiodeFigures => {
      const figures = solved.diodes[index]!;
      return {
        key: model.keys.diodes[k]!,
        reverse: Math.max(-figures.voltage.min, 0),
        average: figures.average,
        peak: Math.max(figures.max, 0),
      };
    }),
    effort: {
      iterations: solved.counts.coarse + solved.counts.fine,
      steps: Math.round(solved.counts.stages / 2),
    },
  };
}

/** Average through the first diode and what leaks past it, from anode to cathode, A. */
function throughFirst(network: PumpNetwork, solved: Solved): number {
  const [leak] = network.leaks.diodes;
  return (
    solved.diodes[network.diodes[0]!]!.average + (leak === undefined ? 0 : solved.resistors[leak]!.average)
  );
}

/** What the clock's output gives (through its upper switch) and takes (through its lower one). */
function driveFigures(solved: Solved, { high, low }: DrivePlace): DriveFigures {
  const upper = solved.resistors[high]!;
  const lower = solved.resistors[low]!;
  return {
    sourceAverage: upper.averagePositive + lower.averageNegative,
    sinkAverage: lower.averagePositive + upper.averageNegative,
    rms: Math.hypot(upper.rms, lower.rms),
    peakSource: Math.max(upper.max, -lower.min, 0),
    peakSink: Math.max(lower.max, -upper.min, 0),
  };
}

function capacitorFigures(
  model: PumpModel,
  values: PumpValues,
  network: PumpNetwork,
  solved: Solved,
): CapacitorFigures[] {
  const of = (key: string, index: number, { farads, ohms }: CapacitorValues): CapacitorFigures => {
    const { voltage, rms } = solved.capacitors[index]!;
    return {
      key,
      voltage: Math.max(Math.abs(voltage.min), Math.abs(voltage.max)),
      average: voltage.average,
      lowest: voltage.min,
      highest: voltage.max,
      rmsCurrent: rms,
      heat: rms * rms * ohms,
      effective: farads,
    };
  };
  return [
    ...network.flying.map((index, k) => of(model.keys.flying[k]!, index, values.flying[k]!)),
    ...network.smoothing.map((index, k) => of(model.keys.smoothing[k]!, index, values.smoothing[k]!)),
    ...(network.reservoir === undefined
      ? []
      : [of(model.keys.reservoir, network.reservoir, values.reservoir!)]),
  ];
}

function sum(values: readonly number[]): number {
  return values.reduce((total, value) => total + value, 0);
}
