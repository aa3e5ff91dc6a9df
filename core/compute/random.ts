/** Random numbers that depend on nothing but a seed, a name and a place in the row: the same on every machine. */

const all = 64;

/**
 * Number `index` (from 0) of the row that starts from `seed`, 64 bits. Any place of the row can be asked for directly.
 *
 * Source: SplitMix64 of G. L. Steele, D. Lea and C. H. Flood, OOPSLA 2014; constants of S. Vigna's public domain
 * version (from memory; the test holds them against a published row).
 * Worked: seed 1234567: 6457827717110365317, 3203168211198807973, ...
 */
export function splitMix64(seed: bigint, index: number): bigint {
  let z = BigInt.asUintN(all, seed + BigInt(index + 1) * 0x9e3779b97f4a7c15n);
  z = BigInt.asUintN(all, (z ^ (z >> 30n)) * 0xbf58476d1ce4e5b9n);
  z = BigInt.asUintN(all, (z ^ (z >> 27n)) * 0x94d049bb133111ebn);
  return z ^ (z >> 31n);
}

/**
 * 64 bits of a text, for a row of its own: FNV-1a over its UTF-16 units.
 *
 * Source: G. Fowler, L. C. Noll and K.-P. Vo, public domain (from memory; the test holds it against published values).
 * Worked: "a" is af63dc4c8601ec8c.
 */
export function textHash(text: string): bigint {
  let hash = 0xcbf29ce484222325n;
  for (let k = 0; k < text.length; k++)
    hash = BigInt.asUintN(all, (hash ^ BigInt(text.charCodeAt(k))) * 0x100000001b3n);
  return hash;
}

/** Start of the row that belongs to a name under a seed; `seed` is a whole number. */
export function namedSeed(seed: number, name: string): bigint {
  return splitMix64(splitMix64(BigInt.asUintN(all, BigInt(seed)), 0) ^ textHash(name), 0);
}

/** 53 of the bits as a number from 0 to 1, 1 excluded. */
export function toUnit(bits: bigint): number {
  return Number(bits >> 11n) * 2 ** -53;
}
