/** Output resistance of a pump when every capacitor settles completely in each phase: the slow limit. */
import { type PumpTopology, stageCount } from './pump-topology';

export interface SlowLimitInput {
  readonly topology: PumpTopology;
  readonly stages: number;
  readonly frequencyHz: number;
  /** Flying (or, in a ladder, coupling) capacitors from the input upward, F; one value stands for all. */
  readonly flyingF: readonly number[];
  /** Smoothing column of a ladder from ground upward, F; one value stands for all; ignored for the others. */
  readonly smoothingF: readonly number[];
}

/**
 * `R = sum a_i^2 / (C_i f)`, where a_i is the charge through capacitor i for one charge at the output.
 *
 * Answers ohm. Undefined for values out of range or lists of the wrong length. The reservoir is taken as much
 * larger than the other capacitors. Every flying capacitor of a multiplier carries 1, coupling capacitor k of a ladder
 * n - k + 1; the smoothing column shares its charge so that the sum is smallest, which is what loops of capacitors do.
 * Diodes conduct one way only: where their own resistance dominates, some turn off before a ladder has shared its
 * charge, and the solved resistance is less, by 4 % with two stages and 7 % with four (compared with the engine).
 * Source: M. D. Seeman, S. R. Sanders, IEEE Trans. Power Electronics 23(2), 841-851, 2008 (from memory: confirm).
 * Worked: 3-stage multiplier, 1.05 uF, 20 kHz: 142.9 ohm; 3-stage ladder of equal capacitors: 16/(f C).
 */
export function slowLimit(input: SlowLimitInput): number | undefined {
  const stages = stageCount(input.topology, input.stages);
  if (stages === undefined || !(input.frequencyHz > 0)) return undefined;
  const flying = spreadList(input.flyingF, stages);
  if (flying === undefined) return undefined;
  if (input.topology !== 'ladder') {
    return flying.reduce((sum, farads) => sum + 1 / farads, 0) / input.frequencyHz;
  }
  const smoothing = spreadList(input.smoothingF, stages);
  if (smoothing === undefined) return undefined;
  const coupling = flying.reduce((sum, farads, i) => sum + (stages - i) ** 2 / farads, 0);
  return (coupling + smoothingSum(smoothing)) / input.frequencyHz;
}

/** One charge through smoothing capacitor k is `n - k + 1 - d`; the `d` that makes the sum least is a weighted mean. */
function smoothingSum(smoothing: readonly number[]): number {
  const n = smoothing.length;
  const weight = smoothing.reduce((sum, farads) => sum + 1 / farads, 0);
  const d = smoothing.reduce((sum, farads, i) => sum + (n - i) / farads, 0) / weight;
  return smoothing.reduce((sum, farads, i) => sum + (n - i - d) ** 2 / farads, 0);
}

/** A list of `count` positive values from one value or as many as needed; undefined for anything else. */
export function spreadList(values: readonly number[], count: number): readonly number[] | undefined {
  const list = values.length === 1 ? Array.from({ length: count }, () => values[0]!) : values;
  return list.length === count && list.every((value) => value > 0 && Number.isFinite(value))
    ? list
    : undefined;
}
