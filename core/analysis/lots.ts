/**
 * Quantities that a sample of the board draws by lot. One sample is one board: what has the same place in the file
 * and the same label is one thing with one value in it, whichever pump and mode asks.
 */
import { type Distribution, quantileOf } from '../compute/distribution';
import { namedSeed, splitMix64, toUnit } from '../compute/random';
import type { Band } from '../quantity/figure';

export interface Quantity {
  /** In the user's words: `flying capacitor`, `ambient`. */
  readonly label: string;
  /** Dotted path of the place in the file that it belongs to. */
  readonly path: string;
}

/** Reads a quantity in the present sample. */
export type Reader = () => number;

export class Lots {
  readonly quantities: Quantity[] = [];
  /** Of the present sample: the share of all boards (0..1) that have less of the quantity. */
  readonly shares: number[] = [];
  readonly #seeds: bigint[] = [];
  readonly #indices = new Map<string, number>();

  constructor(
    private readonly seed: number,
    private readonly distribution: Distribution,
  ) {}

  /** `used` learns which lot it is; a band without width is no lot. */
  reader(label: string, path: string, band: Band, used: Set<number>): Reader {
    const { min, typical, max } = band;
    if (!(max > min)) return () => typical;
    const index = this.#index(label, path);
    used.add(index);
    return () => quantileOf(band, this.shares[index]!, this.distribution);
  }

  /** Draws sample `number` (from 0). Any sample can be drawn without those before it. */
  draw(number: number): void {
    this.#seeds.forEach((seed, k) => {
      this.shares[k] = toUnit(splitMix64(seed, number));
    });
  }

  /**
   * Each quantity has a row of numbers of its own, by its name: an edit elsewhere in the file does not change its
   * draws, so that two versions of a board are compared on the same parts.
   */
  #index(label: string, path: string): number {
    const key = `${path}\n${label}`;
    const known = this.#indices.get(key);
    if (known !== undefined) return known;
    const index = this.quantities.push({ label, path }) - 1;
    this.shares.push(0.5);
    this.#seeds.push(namedSeed(this.seed, key));
    this.#indices.set(key, index);
    return index;
  }
}
