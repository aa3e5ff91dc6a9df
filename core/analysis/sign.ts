/** Which way a rail points, from the window it must stay in. */
import type { Band } from '../quantity/figure';

export function isNegative(window: Band): boolean {
  return window.min + window.max < 0;
}
