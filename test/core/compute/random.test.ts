import { describe, expect, it } from 'vitest';
import { namedSeed, splitMix64, textHash, toUnit } from '../../../core/compute/random';

const row = (seed: number, name: string, count: number) => {
  const start = namedSeed(seed, name);
  return Array.from({ length: count }, (_, k) => toUnit(splitMix64(start, k)));
};

describe('random numbers', () => {
  it('are the published row of SplitMix64 from 1234567', () => {
    // Row printed at the "Splitmix64" task of Rosetta Code (from memory).
    expect([0, 1, 2, 3, 4].map((k) => splitMix64(1234567n, k))).toEqual([
      6457827717110365317n,
      3203168211198807973n,
      9817491932198370423n,
      4593380528125082431n,
      16408922859458223821n,
    ]);
  });

  it('hash a name as FNV-1a of 64 bits does', () => {
    // Test values of the authors' own page (from memory).
    expect(textHash('')).toBe(0xcbf29ce484222325n);
    expect(textHash('a')).toBe(0xaf63dc4c8601ec8cn);
    expect(textHash('foobar')).toBe(0x85944171f73967e8n);
  });

  it('are spread evenly: chi-square of 50 cells below its 99.9 % point', () => {
    // Pearson 1900; 85.35 for 49 degrees of freedom (table value, from memory), lower point 23.98.
    for (const [seed, name] of [
      [1, 'ambient'],
      [2, 'ambient'],
      [1, 'flying capacitor'],
    ] as const) {
      const cells = new Array<number>(50).fill(0);
      const numbers = row(seed, name, 20_000);
      for (const u of numbers) cells[Math.floor(50 * u)]!++;
      const chi = cells.reduce((sum, n) => sum + (n - 400) ** 2 / 400, 0);
      expect(chi).toBeLessThan(85.35);
      expect(chi).toBeGreaterThan(23.98);
    }
  });

  it('of other names, other seeds and the number before have nothing to do with each other', () => {
    const n = 10_000;
    const a = row(1, 'one', n);
    const shifted = [...a.slice(1), 0.5];
    for (const b of [row(1, 'two', n), row(2, 'one', n), row(-1, 'one', n), shifted]) {
      const sum = a.reduce((total, u, k) => total + (u - 0.5) * (b[k]! - 0.5), 0);
      // Four standard errors of a correlation of nothing.
      expect(Math.abs((12 * sum) / n)).toBeLessThan(4 / Math.sqrt(n));
    }
  });
});
