/**
 * One operating point of a pump: its network solved, and the solution put into the words of the trade.
 */
import { type ElementFigures, type Solved, solve } from '../engine';
import { type PumpNetwork, pumpNetwork } from '../pump/network';
import { idealVoltage, type PumpValues } from '../pump/values';
import { hasBand, type PumpModel } from './pump-model';
import type { CapacitorFigures, DiodeFigures, Drop, PumpPoint } from './types';

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
): SolvedPoint | NoPoint {
  const values = model.values(at);
  const network = pumpNetwork(values);
  const contributions = model.contributions(at, network);
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
  const tied = new Set(contributions.map((c) => c.variable));
  model.variables.forEach((variable, k) => {
    if (tied.has(k) || !hasBand(variable)) return;
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
    values.loads.map((load, k) => (load.kind === 'current' ? load.amps : loads[k]!.average)),
  );
  const resistance = Math.abs(solved.derivatives.average[0]!);
  const sign = values.negative ? -1 : 1;
  const powerOut = sum(loads.map((load) => load.loss));
  const powerIn = sum(solved.knowns.map((known) => known.power));
  return {
    ...(mode === undefined ? {} : { mode }),
    voltage: output.average,
    lowest: output.min,
    highest: output.max,
    ripple: output.max - output.min,
    loadCurrent,
    askedCurrent,
    inputCurrent: values.input === 0 ? 0 : solved.knowns[~network.input]!.average,
    powerIn,
    powerOut,
    ideal: idealVoltage(values),
    openCircuit: output.average + sign * resistance * loadCurrent,
    outputResistance: resistance,
    drops: drops(values, network, solved, loadCurrent, powerIn, powerOut),
    balance: solved.balance,
    drives: network.drives.map(({ resistor }) => {
      const figures = solved.resistors[resistor]!;
      return {
        sourceAverage: figures.averagePositive,
        sinkAverage: figures.averageNegative,
        rms: figures.rms,
        peakSource: Math.max(figures.max, 0),
        peakSink: Math.max(-figures.min, 0),
      };
    }),
    capacitors: capacitorFigures(model, network, solved),
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

function capacitorFigures(model: PumpModel, network: PumpNetwork, solved: Solved): CapacitorFigures[] {
  const of = (key: string, index: number): CapacitorFigures => {
    const { voltage, rms } = solved.capacitors[index]!;
    return { key, voltage: Math.max(Math.abs(voltage.min), Math.abs(voltage.max)), rmsCurrent: rms };
  };
  return [
    ...network.flying.map((index, k) => of(model.keys.flying[k]!, index)),
    ...network.smoothing.map((index, k) => of(model.keys.smoothing[k]!, index)),
    ...(network.reservoir === undefined ? [] : [of(model.keys.reservoir, network.reservoir)]),
  ];
}

/**
 * Where the volts go: each loss divided by the load current. Every period each source delivers the load's charge
 * once per stage that it feeds, so the losses add up to the ideal voltage minus the actual one; what leaks back
 * through the diodes and the difference between average power and average voltage make up the last small entry.
 */
function drops(
  values: PumpValues,
  network: PumpNetwork,
  solved: Solved,
  loadCurrent: number,
  powerIn: number,
  powerOut: number,
): Drop[] {
  if (!(loadCurrent > 0)) return [];
  const volts = (elements: readonly (ElementFigures | undefined)[]) =>
    sum(elements.map((e) => e?.loss ?? 0)) / loadCurrent;
  const ideal = Math.abs(idealVoltage(values));
  const actual = Math.abs(solved.nodes[network.output]!.average);
  const list: Drop[] = [
    { in: 'drive', volts: volts(network.drives.map((d) => solved.resistors[d.resistor])) },
    {
      in: 'series resistor',
      volts: volts(
        network.drives.map((d) => (d.series === undefined ? undefined : solved.resistors[d.series])),
      ),
    },
    { in: 'diodes', volts: volts(network.diodes.map((k) => solved.diodes[k])) },
    { in: 'flying capacitor ESR', volts: volts(network.flying.map((k) => solved.capacitors[k])) },
    { in: 'smoothing capacitor ESR', volts: volts(network.smoothing.map((k) => solved.capacitors[k])) },
    {
      in: 'reservoir ESR',
      volts: volts([network.reservoir === undefined ? undefined : solved.capacitors[network.reservoir]]),
    },
  ];
  const rest = ideal - powerIn / loadCurrent + (powerOut / loadCurrent - actual);
  return [...list, { in: 'leakage and ripple', volts: rest }].filter(
    (drop) => Math.abs(drop.volts) > 1e-5 * ideal,
  );
}

function sum(values: readonly number[]): number {
  return values.reduce((total, value) => total + value, 0);
}
