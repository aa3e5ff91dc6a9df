/** Which way a rail points, from the window it must stay in. */
import type { Band } from '../quantity/figure';

export function isNegative(window: Band): boolean {
  return window.min + window.max < 0;
}

/** A voltage less a drop in magnitude: a negative rail is pulled up. */
export function sag(volts: number, drop: number): number {
  return volts < 0 ? volts + drop : volts - drop;
}
