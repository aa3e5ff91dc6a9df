/**
 * A measured figure against its predicted band, with the eyes of the instruments of a bench.
 */
import type { Band } from '../quantity/figure';
import type { Target } from './pump-corners';
import type { BenchComparison } from './types';

/**
 * What instruments can tell, as a share of the reading: a handheld meter on a d.c. range, and the height of a trace
 * on a scope (common practice, no source). A figure with a band of its own says it better.
 */
export const readingError: Readonly<Record<Target, number>> = { voltage: 1e-3, ripple: 0.03 };

export function compareBench(target: Target, figure: Band, predicted: Band): BenchComparison {
  const error = figure.min < figure.max ? 0 : readingError[target] * Math.abs(figure.typical);
  const measured: Band = { min: figure.min - error, typical: figure.typical, max: figure.max + error };
  const over = Math.max(0, measured.min - predicted.max);
  const under = Math.min(0, measured.max - predicted.min);
  return {
    measured,
    predicted: { min: predicted.min, typical: predicted.typical, max: predicted.max },
    deviation: figure.typical - predicted.typical,
    outside: over > 0 ? over : under,
  };
}

/** True when the instrument could not tell what was measured from `value`. */
export function reads({ measured }: BenchComparison, value: number): boolean {
  return measured.min <= value && value <= measured.max;
}
