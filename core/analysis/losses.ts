/**
 * Which of its three losses holds a pump down, and what a change of parts could win at most: from the closed
 * forms beside the solution, for sentences that say what would cure a rail.
 */
import { combinedResistance } from '../compute/combined-resistance';
import { diodeCount } from '../compute/pump-topology';
import type { Topology } from '../model/board';
import type { PumpResult } from './types';

export type LossKind = 'capacitance' | 'resistance' | 'diodes';

export interface PumpLosses {
  readonly largest: LossKind;
  /** Average into the loads that the figures hold for, A. */
  readonly currentA: number;
  /** Slow limit, 1/(f C) of all stages, and fast limit, the resistance in the path, ohm. */
  readonly slowOhm: number;
  readonly fastOhm: number;
  readonly diodes: number;
  readonly diodeV: number;
  /** What flying capacitors without limit, and drives and diodes without resistance, would win, V. */
  readonly capacitanceWinsV: number;
  readonly resistanceWinsV: number;
}

/** Undefined without an estimate, and for an overloaded pump, where the closed forms say nothing. */
export function pumpLosses(
  pump: { readonly topology?: Topology; readonly stages?: { readonly typical: number } },
  result: PumpResult,
): PumpLosses | undefined {
  const { estimate, heaviest } = result;
  if (estimate === null || pump.topology === undefined) return undefined;
  if (heaviest.loadCurrent < 0.99 * heaviest.askedCurrent) return undefined;
  const { slowLimit, fastLimit, resistance, diodeDrop } = estimate;
  const diodes = diodeCount(pump.topology, Math.round(pump.stages?.typical ?? 1));
  const shares: readonly (readonly [LossKind, number])[] = [
    ['capacitance', heaviest.loadCurrent * slowLimit],
    ['resistance', heaviest.loadCurrent * fastLimit],
    ['diodes', diodes * diodeDrop],
  ];
  return {
    largest: shares.reduce((best, share) => (share[1] > best[1] ? share : best))[0],
    currentA: heaviest.loadCurrent,
    slowOhm: slowLimit,
    fastOhm: fastLimit,
    diodes,
    diodeV: diodeDrop,
    capacitanceWinsV: heaviest.loadCurrent * Math.max(0, resistance - fastLimit),
    resistanceWinsV: heaviest.loadCurrent * Math.max(0, resistance - slowLimit),
  };
}

/**
 * Factor by which the flying capacitors (or the frequency) must grow to win `missingV`; undefined when no factor
 * up to a thousand does.
 */
export function capacitanceFactor(losses: PumpLosses, missingV: number): number | undefined {
  const { slowOhm, fastOhm, currentA } = losses;
  const present = combinedResistance(slowOhm, fastOhm);
  if (present === undefined || currentA <= 0) return undefined;
  const wanted = present - missingV / currentA;
  let low = 1;
  let high = 1000;
  const resistance = (factor: number) => combinedResistance(slowOhm / factor, fastOhm) ?? Infinity;
  if (!(resistance(high) <= wanted)) return undefined;
  // The resistance falls steadily with the factor, so halving the interval is enough.
  for (let round = 0; round < 40; round++) {
    const middle = Math.sqrt(low * high);
    if (resistance(middle) <= wanted) high = middle;
    else low = middle;
  }
  return high;
}
