/** From a share of all boards to a value within a band. */
import type { Band } from '../quantity/figure';

export type Distribution = 'uniform' | 'triangular';

/**
 * Value below which the share `share` (0..1) of the distribution lies.
 *
 * `uniform`: every value of the band is as likely, `min + u (max - min)`; the typical value has no part in it.
 * `triangular`: likeliest at typical, not to be met at the ends: with `c = (typ - min) / (max - min)` it is
 * `min + sqrt(u c) (max - min)` up to `u = c` and `max - sqrt((1 - u)(1 - c)) (max - min)` beyond.
 * Source: inverse distribution functions as in textbooks of statistics (from memory: confirm).
 * Worked: triangular, 0..1..4 and u = 0.25 gives 1; symmetric -1..0..1 and u = 0.125 gives -0.5.
 */
export function quantileOf({ min, typical, max }: Band, share: number, distribution: Distribution): number {
  const width = max - min;
  if (!(width > 0)) return typical;
  if (distribution === 'uniform') return min + share * width;
  const peak = (typical - min) / width;
  return share < peak
    ? min + Math.sqrt(share * peak) * width
    : max - Math.sqrt((1 - share) * (1 - peak)) * width;
}
