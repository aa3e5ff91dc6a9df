/**
 * Values of capacitors to choose from, and looking for the smallest that serves.
 */
import type { Board } from '../model/board';
import { preferredValues } from '../quantity/preferred';

const smallest = 1e-9;
const largest = 470e-6;

/** In F, ascending: what is in stock, or the preferred values from 1 nF to 470 uF. */
export function stockedValues({ stock }: Board): readonly number[] {
  if (stock.capacitors && stock.capacitors.length > 0)
    return [...new Set(stock.capacitors)].sort((a, b) => a - b);
  const series = preferredValues[stock.series ?? 'E6'];
  const all = Array.from({ length: 7 }, (_, decade) =>
    series.map((value) => Number((value * 10 ** (decade - 9)).toPrecision(3))),
  ).flat();
  return all.filter((farads) => farads >= smallest * (1 - 1e-9) && farads <= largest * (1 + 1e-9));
}

/** Steps of the list in a decade, at least 1. */
export function stepsInDecade(values: readonly number[]): number {
  return Math.max(1, Math.round(values.length / Math.log10(largest / smallest)));
}

/**
 * Index of the first value for which a test holds that stays true once it is, looked for from a guess outwards in
 * growing steps; undefined if it never is.
 */
export function firstFrom(guess: number, last: number, test: (index: number) => boolean): number | undefined {
  let low = -1;
  let high: number | undefined;
  let at = Math.min(Math.max(guess, 0), last);
  for (let step = 1; ; step *= 2) {
    if (test(at)) {
      high = at;
      if (at === 0) return 0;
      at = Math.max(0, at - step);
      if (low >= 0) break;
    } else {
      low = Math.max(low, at);
      if (high !== undefined) break;
      if (at === last) return undefined;
      at = Math.min(last, at + step);
    }
    if (high !== undefined && low >= 0) break;
  }
  let to = high!;
  let from = Math.max(low, -1) + 1;
  while (from < to) {
    const middle = (from + to) >> 1;
    if (test(middle)) to = middle;
    else from = middle + 1;
  }
  return to;
}
