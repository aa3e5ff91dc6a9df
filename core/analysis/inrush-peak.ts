/**
 * The first pulses at switch-on through a pin.
 */
import type { BoardAnalysis, PinResult } from './types';

/** Pumps on one pin may start together, so their first pulses add; undefined when one cannot be followed. */
export function inrushPeak({ pumps }: PinResult, { rails }: BoardAnalysis): number | undefined {
  if (pumps.length === 0) return undefined;
  let sum = 0;
  for (const { railName, index, share } of pumps) {
    const inrush = rails.get(railName)?.transients?.()?.inrush;
    if (!inrush) return undefined;
    sum += share * inrush[index]!;
  }
  return sum;
}
