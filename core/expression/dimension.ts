/**
 * Numbers that carry their dimension through arithmetic, so that volts are never added to amperes.
 */
import type { Dimension } from '../quantity/units';
import { unitFacts } from '../quantity/units';

/** `value` in SI units. */
export interface Measure {
  readonly value: number;
  readonly dimension: Dimension;
}

export const none: Dimension = [0, 0, 0, 0];

export function pure(value: number): Measure {
  return { value, dimension: none };
}

export function same(a: Dimension, b: Dimension): boolean {
  // Roots leave fractions, so that equality is up to rounding.
  return a.every((power, index) => Math.abs(power - (b[index] ?? 0)) < 1e-9);
}

/** The dimension of a product, `sign` -1 of a quotient. */
export function combine(a: Dimension, b: Dimension, sign: 1 | -1 = 1): Dimension {
  return [a[0] + sign * b[0], a[1] + sign * b[1], a[2] + sign * b[2], a[3] + sign * b[3]];
}

export function power(a: Dimension, exponent: number): Dimension {
  return [a[0] * exponent, a[1] * exponent, a[2] * exponent, a[3] * exponent];
}

/** For a sentence: `a voltage`, or base units when the dimension has no name in the trade. */
export function nameOfDimension(dimension: Dimension): string {
  for (const fact of Object.values(unitFacts)) {
    if (same(fact.dimension, dimension)) return fact.what;
  }
  const parts = ['V', 'A', 's', 'K'].flatMap((symbol, index) => {
    const exponent = Number((dimension[index] ?? 0).toFixed(3));
    return exponent === 0 ? [] : [exponent === 1 ? symbol : `${symbol}^${exponent}`];
  });
  return `a figure in ${parts.join(' ')}`;
}
