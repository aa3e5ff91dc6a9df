/**
 * Share of its value that a capacitor keeps under direct voltage, from points of its curve.
 */

/** `share` of the rated voltage, `left` of the value, both as shares. */
export interface BiasPoint {
  readonly share: number;
  readonly left: number;
}

/** What no curve goes below: a capacitor never vanishes. */
const least = 0.01;

/**
 * `1 / left` is taken as straight in the square of the share between two points, which is exact for the usual form
 * `left = 1 / (1 + (share / half)^2)` (shape from memory: confirm; the reference sheet of this project uses it) and
 * steady for any curve that falls. Beyond the last point the last straight line goes on.
 *
 * Points in any order, shares 0 or more; 1 at no voltage is added where it is missing. Result 0.01 to 1 or what the
 * points say; undefined for a share that is not a number of 0 or more.
 */
export function valueLeft(points: readonly BiasPoint[], share: number): number | undefined {
  if (!(share >= 0)) return undefined;
  const sorted = [...points].sort((a, b) => a.share - b.share);
  if (!(sorted[0]?.share === 0)) sorted.unshift({ share: 0, left: 1 });
  if (sorted.length === 1) return sorted[0]!.left;
  const next = sorted.findIndex((point) => point.share >= share);
  const upper = Math.max(next < 0 ? sorted.length - 1 : next, 1);
  const [a, b] = [sorted[upper - 1]!, sorted[upper]!];
  const inverse = (point: BiasPoint) => 1 / Math.max(point.left, least);
  const span = b.share ** 2 - a.share ** 2;
  const part = span > 0 ? (share ** 2 - a.share ** 2) / span : 0;
  const found = inverse(a) + part * (inverse(b) - inverse(a));
  return found > 0 ? Math.max(1 / found, least) : sorted.at(-1)!.left;
}

/**
 * Share of the rating at which a class 2 ceramic of that case has lost half of its value: the denser the part, the
 * sooner. Classes from memory: confirm with the maker's curve. `size` is the usual code (`0805`); undefined for others.
 */
export function caseHalfShare(size: string, farads: number): number | undefined {
  const rank = cases.indexOf(size.trim());
  if (rank < 0 || !(farads > 0)) return undefined;
  if (farads <= 0.1e-6) return 1.5;
  if (rank <= cases.indexOf('0603')) return farads >= 4.7e-6 ? 0.4 : 0.6;
  if (rank === cases.indexOf('0805')) return farads >= 4.7e-6 ? 0.6 : 0.9;
  return farads >= 22e-6 ? 0.6 : 0.9;
}

const cases = ['0201', '0402', '0603', '0805', '1206', '1210', '1812', '2220'];

/** The same of a curve given by points, from its last one; undefined for a curve that loses nothing. */
export function curveHalfShare(points: readonly BiasPoint[]): number | undefined {
  const last = [...points].sort((a, b) => a.share - b.share).at(-1);
  if (!last || !(last.left < 1 && last.left > 0 && last.share > 0)) return undefined;
  return last.share / Math.sqrt(1 / last.left - 1);
}
