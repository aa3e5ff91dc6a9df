/**
 * How much of a class 2 ceramic's value is left under steady voltage, as a generic curve: half is lost at
 * `halfShare` of the rating and the loss grows with the square of the voltage below that. It stands for no
 * particular part; a curve from the maker's own tool is always better.
 */
import { practice } from '../figures';
import type { CapacitorKind } from '../part';

const shares = [0, 0.1, 0.25, 0.5, 0.75, 1] as const;

/** Shares of the rated voltage at which half the value is gone: weakest, usual and best part of the kind. */
export interface HalfShare {
  readonly weakest: number;
  readonly usual: number;
  readonly best: number;
}

/** Points of the curve, each `{ share of the rating, share of the value left }`. */
export function genericBias(half: HalfShare): NonNullable<CapacitorKind['bias']> {
  const origin = practice(
    "generic curve of the dielectric, not a particular part: use the maker's curve where known",
  );
  return shares.map((share) => ({
    share,
    left: {
      min: valueLeft(share, half.weakest),
      typical: valueLeft(share, half.usual),
      max: valueLeft(share, half.best),
      unit: '1',
      origin,
    },
  }));
}

function valueLeft(share: number, halfShare: number): number {
  return 1 / (1 + (share / halfShare) ** 2);
}
