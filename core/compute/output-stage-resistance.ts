/** Resistance of a chip's output from the test points of its data sheet. */
import type { Band } from '../quantity/figure';

/** One line of an output table: at this current the output sits at this voltage against ground. */
export interface OutputTestPoint {
  /** Magnitude, A. */
  readonly current: Band;
  /** V. */
  readonly voltage: Band;
  /** V. */
  readonly supply: Band;
}

/**
 * `R = drop / current`, drop measured to the rail that the output is switched to; between two test points of different
 * supply the resistance is interpolated, beyond them the nearest one holds.
 *
 * `supplyV` in volt; answers a band in ohm, its largest value from the guaranteed limit. Of several points at one
 * supply the one with the largest resistance counts. Undefined without a usable point.
 * Source: definition. Worked: 0.9 V at 20 mA gives 45 ohm; 4.2 V of 5 V at 20 mA gives 40 ohm.
 */
export function outputStageResistance(
  points: readonly OutputTestPoint[],
  level: 'high' | 'low',
  supplyV: number,
): Band | undefined {
  const known = points
    .map((point) => ({ supplyV: point.supply.typical, ohm: pointResistance(point, level) }))
    .filter((entry): entry is { supplyV: number; ohm: Band } => entry.ohm !== undefined)
    .sort((a, b) => a.supplyV - b.supplyV || b.ohm.max - a.ohm.max);
  const distinct = known.filter((entry, i) => entry.supplyV !== known[i - 1]?.supplyV);
  const above = distinct.find((entry) => entry.supplyV >= supplyV) ?? distinct.at(-1);
  const below = distinct.findLast((entry) => entry.supplyV <= supplyV) ?? distinct[0];
  if (above === undefined || below === undefined || !Number.isFinite(supplyV)) return undefined;
  if (above.supplyV === below.supplyV) return above.ohm;
  const share = (supplyV - below.supplyV) / (above.supplyV - below.supplyV);
  const between = (key: keyof Band) => below.ohm[key] + share * (above.ohm[key] - below.ohm[key]);
  return { min: between('min'), typical: between('typical'), max: between('max') };
}

function pointResistance(point: OutputTestPoint, level: 'high' | 'low'): Band | undefined {
  const { current, voltage, supply } = point;
  const drop: Band =
    level === 'low'
      ? voltage
      : {
          min: supply.typical - voltage.max,
          typical: supply.typical - voltage.typical,
          max: supply.typical - voltage.min,
        };
  if (!(current.min > 0 && drop.min >= 0 && drop.max < Number.POSITIVE_INFINITY)) return undefined;
  return {
    min: drop.min / current.max,
    typical: drop.typical / current.typical,
    max: drop.max / current.min,
  };
}
