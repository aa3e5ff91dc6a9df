/** Between which shares the true one lies when `hits` of `trials` samples were good. */

/** Normal deviate that 95 % of all cases stay within, two sides. */
const deviate95 = 1.959963984540054;

/**
 * Score interval of 95 % confidence for a share, with `p = hits / n`:
 * `(p + z^2/2n -+ z sqrt(p (1 - p)/n + z^2/4n^2)) / (1 + z^2/n)`.
 *
 * Holds to the ends of the range, where the plain standard error would claim certainty.
 * `hits` from 0 to `trials`, `trials` above 0; undefined otherwise.
 * Source: E. B. Wilson, Journal of the American Statistical Association 22, 209-212, 1927 (from memory: confirm).
 * Worked: 81 of 263: 0.2553 and 0.3662.
 */
export function wilsonInterval(
  hits: number,
  trials: number,
): { readonly low: number; readonly high: number } | undefined {
  if (!(trials > 0 && hits >= 0 && hits <= trials)) return undefined;
  const z2 = deviate95 ** 2 / trials;
  const p = hits / trials;
  const middle = p + z2 / 2;
  const half = Math.sqrt(z2 * (p * (1 - p)) + (z2 / 2) ** 2);
  return {
    low: hits === 0 ? 0 : Math.max(0, (middle - half) / (1 + z2)),
    high: hits === trials ? 1 : Math.min(1, (middle + half) / (1 + z2)),
  };
}
