/**
 * Preferred values against IEC 60063 (lists from memory: confirm).
 */
import { describe, expect, test } from 'vitest';
import {
  nearestPreferred,
  nextPreferredDown,
  nextPreferredUp,
  preferredValues,
} from '../../../core/quantity/preferred';

describe('the series of IEC 60063', () => {
  test('E3, E6 and E12', () => {
    expect(preferredValues.E3).toEqual([1, 2.2, 4.7]);
    expect(preferredValues.E6).toEqual([1, 1.5, 2.2, 3.3, 4.7, 6.8]);
    expect(preferredValues.E12).toEqual([1, 1.2, 1.5, 1.8, 2.2, 2.7, 3.3, 3.9, 4.7, 5.6, 6.8, 8.2]);
  });
  test('E24 departs from the geometric series in eight values', () => {
    const geometric = Array.from({ length: 24 }, (_, i) => Number((10 ** (i / 24)).toFixed(1)));
    const departing = preferredValues.E24.filter((value, i) => value !== geometric[i]);
    expect(departing).toEqual([2.7, 3, 3.3, 3.6, 3.9, 4.3, 4.7, 8.2]);
  });
  test('counts, and the neighbours of 4.7 in E96', () => {
    for (const [series, values] of Object.entries(preferredValues)) {
      expect(values, series).toHaveLength(Number(series.slice(1)));
      expect([...values].sort((a, b) => a - b)).toEqual(values);
    }
    const at = preferredValues.E96.indexOf(4.64);
    expect(preferredValues.E96.slice(at - 1, at + 3)).toEqual([4.53, 4.64, 4.75, 4.87]);
  });
  test('E48 is every second of E96, which is every second of E192', () => {
    expect(preferredValues.E96.filter((_, i) => i % 2 === 0)).toEqual(preferredValues.E48);
    expect(preferredValues.E192.filter((_, i) => i % 2 === 0)).toEqual(preferredValues.E96);
  });
  test('E192 holds 9.20, not 9.19', () => {
    expect(preferredValues.E192).toContain(9.2);
    expect(preferredValues.E192).not.toContain(9.19);
  });
});

describe('choosing', () => {
  test('the nearest on a logarithmic scale', () => {
    expect(nearestPreferred(4.7, 'E96')).toBe(4.75);
    expect(nearestPreferred(9.6, 'E12')).toBe(10);
    expect(nearestPreferred(0.95e-6, 'E6')).toBe(1e-6);
    expect(nearestPreferred(8.3e-6, 'E6')).toBe(10e-6);
  });
  test('a tie goes to the lower', () => {
    expect(nearestPreferred(Math.sqrt(2.2 * 4.7), 'E3')).toBe(2.2);
  });
  test('up and down', () => {
    expect(nextPreferredUp(3.4e-6, 'E6')).toBe(4.7e-6);
    expect(nextPreferredUp(4.7e-6, 'E6')).toBe(4.7e-6);
    expect(nextPreferredUp(6.9, 'E6')).toBe(10);
    expect(nextPreferredDown(3.4e-6, 'E6')).toBe(3.3e-6);
    expect(nextPreferredDown(0.99, 'E6')).toBe(0.68);
  });
  test('every preferred value is its own nearest', () => {
    for (const digits of preferredValues.E24)
      expect(nearestPreferred(Number(`${digits}e-7`), 'E24')).toBe(Number(`${digits}e-7`));
  });
  test.each([0, -1, Number.NaN, Number.POSITIVE_INFINITY])('%d has none', (value) => {
    expect(nearestPreferred(value, 'E6')).toBeNaN();
  });
});
