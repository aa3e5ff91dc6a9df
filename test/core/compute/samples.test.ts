import { describe, expect, it } from 'vitest';
import { Correlation } from '../../../core/compute/correlation';
import { quantileOf } from '../../../core/compute/distribution';
import { sampledCoverage, sampleSize } from '../../../core/compute/sample-size';
import { spreadOf } from '../../../core/compute/spread';
import { wilsonInterval } from '../../../core/compute/wilson-interval';

describe('interval of a share', () => {
  it('is that of the published worked values', () => {
    // R. G. Newcombe, Statistics in Medicine 17, 857-872, 1998, table I, score method (from memory).
    for (const [hits, trials, low, high] of [
      [81, 263, 0.2553, 0.3662],
      [15, 148, 0.0624, 0.1605],
      [0, 20, 0, 0.1611],
      [1, 29, 0.0061, 0.1718],
    ] as const) {
      const interval = wilsonInterval(hits, trials)!;
      expect(Math.abs(interval.low - low)).toBeLessThan(6e-5);
      expect(Math.abs(interval.high - high)).toBeLessThan(6e-5);
    }
  });

  it('reaches both ends, mirrors, and refuses what is no share', () => {
    expect(wilsonInterval(20, 20)?.high).toBe(1);
    expect(wilsonInterval(20, 20)!.low).toBeCloseTo(1 - wilsonInterval(0, 20)!.high, 12);
    expect([wilsonInterval(0, 0), wilsonInterval(5, 4), wilsonInterval(Number.NaN, 4)]).toEqual([
      undefined,
      undefined,
      undefined,
    ]);
  });
});

describe('coverage of samples', () => {
  it('turns the sample sizes of Wilks round', () => {
    // S. S. Wilks 1941 (from memory): 29/46, 59/93, 299/473, 1109/1756 samples for 95 % confidence.
    for (const [coverage, one, two] of [
      [0.9, 29, 46],
      [0.95, 59, 93],
      [0.99, 299, 473],
      [0.9973, 1109, 1756],
    ] as const) {
      for (const [count, sides] of [
        [one, 1],
        [two, 2],
      ] as const) {
        expect(sampleSize(coverage, 0.95, sides)).toBe(count);
        expect(sampledCoverage(count, 0.95, sides)).toBeGreaterThanOrEqual(coverage);
        expect(sampledCoverage(count - 1, 0.95, sides)).toBeLessThan(coverage);
      }
    }
  });

  it('leaves 3/N to fail when nothing failed', () => {
    // The rule of three (J. A. Hanley, A. Lippman-Hand, JAMA 249, 1743-1745, 1983, from memory).
    for (const n of [100, 1000, 1_000_000])
      expect(Math.abs((1 - sampledCoverage(n, 0.95, 1)!) * (n / 3) - 1)).toBeLessThan(0.02);
  });

  it('is undefined for too few samples', () => {
    expect(sampledCoverage(0, 0.95, 1)).toBeUndefined();
    expect(sampledCoverage(1, 0.95, 2)).toBeUndefined();
  });
});

describe('spread', () => {
  it('has the quantiles of type 7', () => {
    // R. J. Hyndman, Y. Fan 1996, type 7: of 1..10 the quarter is 3.25 (default of common statistics packages).
    const spread = spreadOf([10, 9, 8, 7, 6, 5, 4, 3, 2, 1], [0, 0.25, 0.5, 1])!;
    expect(spread.quantiles.map(({ value }) => value)).toEqual([1, 3.25, 5.5, 10]);
    expect([spread.count, spread.mean, spread.min, spread.max]).toEqual([10, 5.5, 1, 10]);
    // Sum of squares of 1..10 about the mean is 82.5.
    expect(spread.deviation).toBeCloseTo(Math.sqrt(82.5 / 9), 12);
  });

  it('leaves out what is no number, and needs one', () => {
    expect(spreadOf([Number.NaN, 2], [0.5])?.quantiles).toEqual([{ share: 0.5, value: 2 }]);
    expect(spreadOf([Number.NaN], [0.5])).toBeUndefined();
  });
});

describe('distributions', () => {
  const band = { min: 2, typical: 3, max: 6 };
  const moments = (distribution: 'uniform' | 'triangular') => {
    const n = 20_000;
    const values = Array.from({ length: n }, (_, k) => quantileOf(band, (k + 0.5) / n, distribution));
    return spreadOf(values, [])!;
  };

  it('have mean and variance of the textbook', () => {
    // Uniform: (a + b) / 2, (b - a)^2 / 12. Triangular: (a + b + c) / 3, (a^2 + b^2 + c^2 - ab - ac - bc) / 18.
    const uniform = moments('uniform');
    expect(uniform.mean).toBeCloseTo(4, 6);
    expect(uniform.deviation ** 2).toBeCloseTo(16 / 12, 3);
    const triangular = moments('triangular');
    expect(triangular.mean).toBeCloseTo(11 / 3, 4);
    expect(triangular.deviation ** 2).toBeCloseTo((4 + 36 + 9 - 12 - 6 - 18) / 18, 3);
  });

  it('stay within the band, at its ends too, and know bands without width', () => {
    for (const distribution of ['uniform', 'triangular'] as const) {
      expect(quantileOf(band, 0, distribution)).toBe(2);
      expect(quantileOf(band, 1, distribution)).toBe(6);
      expect(quantileOf({ min: 1, typical: 1, max: 1 }, 0.3, distribution)).toBe(1);
      expect(quantileOf({ min: 1, typical: 1, max: 2 }, 0.75, 'triangular')).toBe(1.5);
    }
  });
});

describe('correlation', () => {
  it('is 0.816 for each of the four data sets of Anscombe', () => {
    // F. J. Anscombe, The American Statistician 27, 17-21, 1973 (data of sets I and IV from memory).
    const x = [10, 8, 13, 9, 11, 14, 6, 4, 12, 7, 5];
    const y = [8.04, 6.95, 7.58, 8.81, 8.33, 9.96, 7.24, 4.26, 10.84, 4.82, 5.68];
    const x4 = [8, 8, 8, 8, 8, 8, 8, 19, 8, 8, 8];
    const y4 = [6.58, 5.76, 7.71, 8.84, 8.47, 7.04, 5.25, 12.5, 5.56, 7.91, 6.89];
    for (const [a, b] of [
      [x, y],
      [x4, y4],
    ] as const) {
      const correlation = new Correlation();
      a.forEach((value, k) => {
        correlation.add(value, 1e6 + b[k]!);
      });
      // Sets I to IV have 0.8162 to 0.8165.
      expect(Math.abs(correlation.value! - 0.816)).toBeLessThan(0.001);
    }
  });

  it('is undefined where one side never moves', () => {
    const correlation = new Correlation();
    for (const x of [1, 2, 3]) correlation.add(x, 5);
    expect(correlation.value).toBeUndefined();
  });
});
