/**
 * What a stage of two transistors does in the solved period: base current, forced gain, heat, cross-conduction.
 */
import { resistorCurrent, type Solved } from '../engine';
import type { DrivePlace } from '../pump/drive';
import type { PumpNetwork } from '../pump/network';
import { inPhase, type PumpValues } from '../pump/values';
import { overlapOf } from './driver-overlap';
import type { DriverFigures } from './types';

/** Null for a drive without such a stage. */
export function driverFigures(
  values: PumpValues,
  network: PumpNetwork,
  solved: Solved,
  k: number,
): DriverFigures | null {
  const place = network.drives[k]!;
  const { driver } = place;
  const stage = values.drives[k]!.driver;
  if (!driver || !stage) return null;
  const { circuit, path } = solved;
  const current = (resistor: number, s: number) => resistorCurrent(circuit, path, resistor, s);
  let cross = 0;
  for (let s = 0; s < path.count; s++) cross += path.weight[s]! * crossAt(driver, stage.kind, current, s);
  const overlap = overlapOf(values, solved, driver, k);
  const average = cross / circuit.period + overlap.current;
  const rail = values.rails[stage.rail]!;
  return {
    baseCurrent: Math.max(peak(solved, driver.npn.base), peak(solved, driver.pnp.base)),
    forcedGain: Math.max(...[driver.npn, driver.pnp].map((t) => gain(solved, t))),
    dissipation: driverLoss(solved, driver) + overlap.current * rail.volts,
    railCurrent: driverRailCurrent(solved, driver, stage.kind) + overlap.current,
    crossCurrent: average,
    crossCharge: (average * circuit.period) / 2,
    overlapCurrent: overlap.current,
    overlapTime: overlap.time,
    collectorPeaks: { npn: peak(solved, driver.npn.collector), pnp: peak(solved, driver.pnp.collector) },
    shortOf: shortOf(solved, network, driver, rail.volts, inPhase(values.drives[k]!)),
  };
}

function peak(solved: Solved, resistor: number): number {
  const { max, min } = solved.resistors[resistor]!;
  return Math.max(max, -min);
}

/** Heat in both transistors with their own resistances, W; the resistors of the bases are not in it. */
export function driverLoss(solved: Solved, { npn, pnp }: NonNullable<DrivePlace['driver']>): number {
  const of = (t: typeof npn) =>
    solved.diodes[t.emitterJunction]!.loss +
    solved.diodes[t.collectorJunction]!.loss +
    solved.resistors[t.collector]!.loss;
  return of(npn) + of(pnp);
}

/** Current that passes through both transistors at stage `s` without reaching the pump, A. */
function crossAt(
  { npn, pnp }: NonNullable<DrivePlace['driver']>,
  kind: 'push-pull' | 'follower',
  current: (resistor: number, s: number) => number,
  s: number,
): number {
  // The resistors run from the inner collector outward: an npn takes current in through its collector.
  const down = kind === 'follower' ? current(pnp.collector, s) : -current(npn.collector, s);
  const up = kind === 'follower' ? -current(npn.collector, s) : current(pnp.collector, s);
  return Math.max(0, Math.min(down, up));
}

function gain(solved: Solved, t: { base: number; collector: number }): number {
  const collector = solved.resistors[t.collector]!;
  const base = solved.resistors[t.base]!;
  const on = Math.max(base.averagePositive, base.averageNegative);
  return on > 0 ? Math.max(collector.averagePositive, collector.averageNegative) / on : 0;
}

/** What the stage takes from its rail: through the pnp's emitter, or the npn's collector of a follower. */
function driverRailCurrent(
  solved: Solved,
  { npn, pnp }: NonNullable<DrivePlace['driver']>,
  kind: 'push-pull' | 'follower',
): number {
  if (kind === 'follower') return -solved.resistors[npn.collector]!.average;
  // Collector and base current leave through their resistors; the base one flows towards the clock.
  return solved.resistors[pnp.collector]!.average - solved.resistors[pnp.base]!.average;
}

function shortOf(
  solved: Solved,
  network: PumpNetwork,
  { stage }: NonNullable<DrivePlace['driver']>,
  railVolts: number,
  inPhaseWithClock: boolean,
): number {
  const { circuit, path } = solved;
  const at = (s: number) => path.volts[s * (circuit.nodes + circuit.knowns) + circuit.place[stage]!]!;
  let worst = 0;
  for (let s = 0; s < path.count; s++) {
    const phase = network.phases[path.segment[s]!];
    const ends = s === path.count - 1 || path.segment[s + 1] !== path.segment[s];
    if (!ends || (phase !== 'high' && phase !== 'low')) continue;
    const goal = (phase === 'high') === inPhaseWithClock ? railVolts : 0;
    worst = Math.max(worst, Math.abs(at(s) - goal));
  }
  return worst;
}
