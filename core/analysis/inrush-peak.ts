/**
 * The first pulses at switch-on through a pin.
 */
import type { BoardAnalysis, PinResult } from './types';

/** Pumps on one pin may start together, so their first pulses add; undefined when one cannot be followed. */
export function inrushPeak(
  { pumps, charges, peakSource, peakSink }: PinResult,
  { rails }: BoardAnalysis,
): number | undefined {
  // Gates are charged at switch-on as at every other edge.
  if (pumps.length === 0) return charges.length > 0 ? Math.max(peakSource ?? 0, peakSink ?? 0) : undefined;
  let sum = 0;
  for (const { railName, index, share } of pumps) {
    const inrush = rails.get(railName)?.transients?.()?.inrush;
    if (!inrush) return undefined;
    sum += share * inrush[index]!;
  }
  return sum;
}
