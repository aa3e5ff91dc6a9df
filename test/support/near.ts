/** Comparison of numbers with a stated relative tolerance, so that each check says how close it wants to be. */
import { expect } from 'vitest';

/** Fails unless `actual` lies within `relative` (0.001 is 0.1 %) of `expected`; absent and NaN fail. */
export function expectNear(actual: number | undefined, expected: number, relative: number): void {
  const error = actual === undefined ? Number.NaN : Math.abs(actual - expected) / Math.abs(expected);
  expect(error, `${actual} against ${expected}`).toBeLessThanOrEqual(relative);
}
