/**
 * Numbers as JSON can hold them: anything else counts as not computed.
 */
import type { Band } from '../quantity/figure';

/** Only the three numbers, whatever else the figure carries; a number that JSON cannot hold is not computed. */
export function band(value: Band | null): Band | null {
  if (value === null || ![value.min, value.typical, value.max].every(Number.isFinite)) return null;
  return { min: value.min, typical: value.typical, max: value.max };
}

export function finite(value: number | null | undefined): number | null {
  return value !== null && value !== undefined && Number.isFinite(value) ? value : null;
}
