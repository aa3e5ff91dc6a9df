/**
 * Switch-on from empty capacitors and switch-off, computed when somebody asks: they cost more than the steady state.
 */
import { type RunDown, runDown, type StartUp, solve, startUp } from '../engine';
import { type PumpNetwork, pumpNetwork } from '../pump/network';
import { type PumpModel, typicalPoint } from './pump-model';
import type { ModeModel } from './pump-result';
import type { Transients } from './types';

/** A rail counts as started at this share of its final voltage. */
const arrived = 0.9;
/** Below this nothing on a board is awake or dangerous, V; from above 60 V d.c. the way down to 60 V counts. */
const quiet = 1;
const touchable = 60;

/** In the given mode, typical values; undefined when the pump has no steady state. */
export function pumpTransients({ mode, model }: ModeModel): Transients | undefined {
  const values = model.values(typicalPoint(model));
  const placed = pumpNetwork(values);
  if (!placed) return undefined;
  const { network, output } = placed;
  const solved = solve(network);
  if (!solved.converged) return undefined;
  const final = solved.nodes[output]!.average;
  const trace = placed.drives.flatMap(({ high, low }) => [high, low]);
  const start = startUp(network, { output, final, states: solved.start, reach: arrived, trace });
  const level = Math.abs(final) > touchable ? touchable : quiet;
  const low = placed.phases.indexOf('low');
  const off = runDown(network, { output, states: solved.start, level, segment: low });
  const time = off?.time;
  return {
    ...(mode === undefined ? {} : { mode }),
    startTime: start?.time ?? null,
    startCourse: start?.course ?? [],
    inrush: start
      ? placed.drives.map((drive) =>
          Math.max(start.resistorPeaks[drive.high]!, start.resistorPeaks[drive.low]!),
        )
      : null,
    transistorPeaks: start
      ? placed.drives.map(({ driver }) =>
          driver
            ? {
                npn: start.resistorPeaks[driver.npn.collector]!,
                pnp: start.resistorPeaks[driver.pnp.collector]!,
              }
            : null,
        )
      : null,
    startTrace: start
      ? {
          time: start.trace.time,
          output: start.trace.output,
          drives: placed.drives.map((_, k) =>
            start.trace.time.map(
              (__, n) => start.trace.currents[2 * k]![n]! - start.trace.currents[2 * k + 1]![n]!,
            ),
          ),
        }
      : null,
    diodePeaks: start ? placed.diodes.map((k) => start.diodePeaks[k]!) : null,
    railCharge: new Map(
      start ? values.rails.map((rail, k) => [rail.name, start.charge[placed.rails[k]!.known]!]) : [],
    ),
    railEnergy: new Map(
      start ? values.rails.map((rail, k) => [rail.name, start.energy[placed.rails[k]!.known]!]) : [],
    ),
    capacitors: start && off ? switching(model, placed, start, off) : null,
    dischargeTime: time !== undefined && Number.isFinite(time) ? time : null,
    dischargeLevel: level,
  };
}

/** What each capacitor bears on the way up and down, in the order of the steady figures. */
function switching(
  { keys }: PumpModel,
  placed: PumpNetwork,
  start: StartUp,
  off: RunDown,
): NonNullable<Transients['capacitors']> {
  const of = (key: string, k: number) => ({
    key,
    lowest: Math.min(start.capacitorLows[k]!, off.capacitorLows[k]!),
    highest: Math.max(start.capacitorHighs[k]!, off.capacitorHighs[k]!),
  });
  return [
    ...placed.flying.map((k, n) => of(keys.flying[n]!, k)),
    ...placed.smoothing.map((k, n) => of(keys.smoothing[n]!, k)),
    ...(placed.reservoir === undefined ? [] : [of(keys.reservoir, placed.reservoir)]),
  ];
}
