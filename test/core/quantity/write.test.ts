/**
 * Engineering notation: prefixes are multiples of three, three significant digits, never an exponent
 * (usage after the SI brochure, 9th edition, chapter 3; from memory: confirm).
 */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Unit } from '../../../core/quantity/figure';
import { quantityField } from '../../../core/quantity/problem';
import { readQuantity } from '../../../core/quantity/read';
import { formatBand, formatDuration, formatPercent, formatQuantity } from '../../../core/quantity/write';

describe('one figure', () => {
  test.each([
    [4700, 'ohm', '4.7 kohm'],
    [0.47, 'ohm', '470 mohm'],
    [8.4312, 'V', '8.43 V'],
    [-2.31, 'V', '-2.31 V'],
    [120e-6, 'A', '120 µA'],
    [0.9996, 'V', '1 V'],
    [999.6, 'Hz', '1 kHz'],
    [0, 'A', '0 A'],
    [-0, 'A', '0 A'],
    [100e-9, 'F', '100 nF'],
    [2.2e-3, 'F', '2200 µF'],
    [31250, 'Hz', '31.3 kHz'],
    [298.15, 'K', '25 degC'],
    [253.15, 'K', '-20 degC'],
    [4320, 'C', '1200 mAh'],
    [50e-6, 'C', '50 µC'],
    [1.05, '1', '1.05'],
    [1e-30, 'A', '0.000000000000001 fA'],
    [1e30, 'ohm', '1000000000000000000 Tohm'],
    [Number.NaN, 'V', '? V'],
    [Number.POSITIVE_INFINITY, 'V', '∞ V'],
  ] as const)('%d %s is %s', (value, unit, text) => expect(formatQuantity(value, unit)).toBe(text));
  test('more digits on demand', () => expect(formatQuantity(31250, 'Hz', 5)).toBe('31.25 kHz'));
});

test('bands share one prefix', () => {
  expect(formatBand({ min: 7.9, typical: 8.43, max: 8.8 }, 'V')).toBe('7.9..8.43..8.8 V');
  expect(formatBand({ min: 4.75, typical: 5, max: 5.25 }, 'V')).toBe('4.75..5.25 V');
  expect(formatBand({ min: 0.05, typical: 0.2, max: 1.5 }, 'A')).toBe('0.05..0.2..1.5 A');
  expect(formatBand({ min: 5, typical: 5, max: 5 }, 'V')).toBe('5 V');
  expect(formatBand({ min: 253.15, typical: 285.65, max: 318.15 }, 'K')).toBe('-20..45 degC');
  expect(formatBand({ min: -3.1, typical: -2.55, max: -2 }, 'V')).toBe('-3.1..-2 V');
});

test('shares and times', () => {
  expect(formatPercent(0.5208)).toBe('52.1 %');
  expect(formatDuration(0.0032)).toBe('3.2 ms');
  expect(formatDuration(600)).toBe('10 min');
  expect(formatDuration(14 * 3600)).toBe('14 h');
  expect(formatDuration(74.24 * 86400)).toBe('74.2 days');
  expect(formatDuration(5 * 365.25 * 86400)).toBe('5 years');
});

test('what is written is read back', () => {
  const units: Unit[] = ['V', 'A', 'ohm', 'F', 'H', 'Hz', 's', 'W', 'C', 'S', 'K/W', '1'];
  const value = fc
    .tuple(fc.double({ min: 1, max: 10, noNaN: true }), fc.integer({ min: -18, max: 12 }), fc.boolean())
    .map(([digits, exponent, negative]) => (negative ? -1 : 1) * digits * 10 ** exponent);
  fc.assert(
    fc.property(value, fc.constantFrom(...units), (figure, unit) => {
      const text = formatQuantity(figure, unit);
      const reading = readQuantity(text, quantityField(unit));
      expect(text).not.toMatch(/\de/);
      expect('value' in reading && Math.abs(reading.value.band.typical / figure - 1), text).toBeLessThan(
        0.0051,
      );
    }),
    { numRuns: 1000 },
  );
});
