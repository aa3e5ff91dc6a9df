/**
 * Preferred values of IEC 60063 and choosing among them. The lists are from memory: confirm.
 */

export type Series = 'E3' | 'E6' | 'E12' | 'E24' | 'E48' | 'E96' | 'E192';

const e24 = [
  1.0, 1.1, 1.2, 1.3, 1.5, 1.6, 1.8, 2.0, 2.2, 2.4, 2.7, 3.0, 3.3, 3.6, 3.9, 4.3, 4.7, 5.1, 5.6, 6.2, 6.8,
  7.5, 8.2, 9.1,
];

const every = (step: number): readonly number[] => e24.filter((_, index) => index % step === 0);

/**
 * From E48 on the standard rounds the geometric series to two places. The lists below E48 do not follow that rule
 * (2.7 to 4.7 and 8.2 differ), so they are never generated.
 */
function rounded(count: number): readonly number[] {
  return Array.from({ length: count }, (_, index) => Number((10 ** (index / count)).toFixed(2)));
}

/** One decade of each series, ascending, 1 <= value < 10. */
export const preferredValues: Readonly<Record<Series, readonly number[]>> = {
  E3: every(8),
  E6: every(4),
  E12: every(2),
  E24: e24,
  E48: rounded(48),
  E96: rounded(96),
  // The one exception of the standard: the rule would give 9.19.
  E192: rounded(192).map((value) => (value === 9.19 ? 9.2 : value)),
};

/** The preferred value next to `value` on a logarithmic scale, ties to the lower; NaN unless `value` is positive. */
export function nearestPreferred(value: number, series: Series): number {
  const above = nextPreferredUp(value, series);
  const below = nextPreferredDown(value, series);
  // The exact middle is not a double: a part in 10^12 either way still counts as a tie.
  return value / below <= (above / value) * (1 + 1e-12) ? below : above;
}

/** The smallest preferred value that is not below `value`; NaN unless `value` is positive and finite. */
export function nextPreferredUp(value: number, series: Series): number {
  return candidates(value, series).find((candidate) => candidate >= value * (1 - 1e-9)) ?? Number.NaN;
}

/** The largest preferred value that is not above `value`; NaN unless `value` is positive and finite. */
export function nextPreferredDown(value: number, series: Series): number {
  return candidates(value, series).findLast((candidate) => candidate <= value * (1 + 1e-9)) ?? Number.NaN;
}

/** All values of the decade below, the decade of `value` and the decade above, ascending. */
function candidates(value: number, series: Series): number[] {
  if (!(value > 0) || !Number.isFinite(value)) return [];
  const decade = Math.floor(Math.log10(value));
  return [decade - 1, decade, decade + 1].flatMap((exponent) =>
    preferredValues[series].map((digits) => Number(`${digits}e${exponent}`)),
  );
}
