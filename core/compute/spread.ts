/** What a row of samples looks like: mean, standard deviation, ends and quantiles. */

export interface Spread {
  readonly count: number;
  readonly mean: number;
  /** Standard deviation of the distribution as the samples tell it; 0 for a single sample. */
  readonly deviation: number;
  readonly min: number;
  readonly max: number;
  /** In the order of the shares asked for. */
  readonly quantiles: readonly { readonly share: number; readonly value: number }[];
}

/**
 * Undefined without a finite value; values that are not finite are left out.
 *
 * Quantile of share p: straight line between the sorted samples around place `p (N - 1)`.
 * Source: type 7 of R. J. Hyndman and Y. Fan, The American Statistician 50, 361-365, 1996 (from memory: confirm).
 * Worked: the quarter of 1, 2, 3, 4 is 1.75.
 */
export function spreadOf(values: Iterable<number>, shares: readonly number[]): Spread | undefined {
  const sorted = Float64Array.from(values)
    .filter((value) => Number.isFinite(value))
    .sort();
  const count = sorted.length;
  if (count === 0) return undefined;
  const mean = sorted.reduce((sum, value) => sum + value, 0) / count;
  const squares = sorted.reduce((sum, value) => sum + (value - mean) ** 2, 0);
  const at = (share: number) => {
    const place = share * (count - 1);
    const below = sorted[Math.floor(place)]!;
    const above = sorted[Math.ceil(place)]!;
    return below + (place - Math.floor(place)) * (above - below);
  };
  return {
    count,
    mean,
    deviation: count > 1 ? Math.sqrt(squares / (count - 1)) : 0,
    min: sorted[0]!,
    max: sorted[count - 1]!,
    quantiles: shares.map((share) => ({ share, value: at(share) })),
  };
}
