/**
 * Prefixes and units against the SI brochure (BIPM, 9th edition, tables 2, 4, 5, 7 and 8; from memory: confirm).
 */
import { describe, expect, test } from 'vitest';
import { prefixes } from '../../../core/quantity/prefix';
import { spellings, suggestSpelling, unitFacts } from '../../../core/quantity/units';
import { checkQuantity } from '../../support/check-quantity';

describe('SI prefixes', () => {
  test.each([
    ['f', -15],
    ['p', -12],
    ['n', -9],
    ['µ', -6],
    ['μ', -6],
    ['u', -6],
    ['m', -3],
    ['', 0],
    ['k', 3],
    ['M', 6],
    ['G', 9],
    ['T', 12],
  ])('%s is 10^%d', (symbol, exponent) => {
    checkQuantity(`1 ${symbol}Hz`, 'Hz', Number(`1e${exponent}`));
    checkQuantity(`2.5${symbol}Hz`, 'Hz', Number(`2.5e${exponent}`));
  });
  test('none is left untested', () => {
    expect(prefixes.flatMap(({ symbols }) => symbols).sort()).toEqual(
      ['', 'G', 'M', 'T', 'f', 'k', 'm', 'n', 'p', 'u', '\u00b5', '\u03bc'].sort(),
    );
  });
});

describe('units', () => {
  test.each([
    ['1 V', 'V', 1],
    ['1 A', 'A', 1],
    ['1 ohm', 'ohm', 1],
    ['1 \u03a9', 'ohm', 1],
    ['1 \u2126', 'ohm', 1],
    ['1 Ohm', 'ohm', 1],
    ['22 ohms', 'ohm', 22],
    ['1 R', 'ohm', 1],
    ['1 F', 'F', 1],
    ['1 H', 'H', 1],
    ['1 Hz', 'Hz', 1],
    ['1 s', 's', 1],
    ['1 min', 's', 60],
    ['1 h', 's', 3600],
    ['1 d', 's', 86_400],
    ['2 days', 's', 172_800],
    ['1 K', 'K', 1],
    ['0 degC', 'K', 273.15],
    ['25 °C', 'K', 298.15],
    ['25 ℃', 'K', 298.15],
    ['-40 degC', 'K', 233.15],
    ['1 W', 'W', 1],
    ['1 C', 'C', 1],
    ['1 Ah', 'C', 3600],
    ['1200 mAh', 'C', 4320],
    ['200 K/W', 'K/W', 200],
    ['200 degC/W', 'K/W', 200],
    ['200 °C/W', 'K/W', 200],
    ['1 S', 'S', 1],
    ['50 %', '1', 0.5],
    ['100 ppm', '1', 1e-4],
  ] as const)('%s', (text, unit, value) => checkQuantity(text, unit, value));
  test('no spelling stands for two units', () => {
    const rows = prefixes.flatMap(({ symbols }) => symbols);
    const bare = [
      'V',
      'A',
      'ohm',
      '\u03a9',
      '\u2126',
      'Ohm',
      'ohms',
      'R',
      'F',
      'H',
      'Hz',
      's',
      'K',
      'W',
      'C',
      'Ah',
      'S',
    ];
    const alone = [
      'min',
      'h',
      'd',
      'day',
      'days',
      'degC',
      '\u00b0C',
      '\u2103',
      'K/W',
      'degC/W',
      '\u00b0C/W',
      '%',
      'ppm',
    ];
    expect(spellings.size).toBe(rows.length * bare.length + alone.length);
  });
  test('dimensions are consistent: ohm = V/A, F = A s/V, H = V s/A, W = V A, C = A s, S = A/V', () => {
    const [ohm, farad, henry] = [unitFacts.ohm.dimension, unitFacts.F.dimension, unitFacts.H.dimension];
    expect(ohm).toEqual([1, -1, 0, 0]);
    // The time constants R C, L/R and the root of L C are times.
    expect(ohm.map((power, i) => power + farad[i]!)).toEqual(unitFacts.s.dimension);
    expect(henry.map((power, i) => power - ohm[i]!)).toEqual(unitFacts.s.dimension);
    expect(henry.map((power, i) => (power + farad[i]!) / 2)).toEqual(unitFacts.s.dimension);
    expect(unitFacts.V.dimension.map((power, i) => power + unitFacts.A.dimension[i]!)).toEqual(
      unitFacts.W.dimension,
    );
    expect(unitFacts.A.dimension.map((power, i) => power + unitFacts.s.dimension[i]!)).toEqual(
      unitFacts.C.dimension,
    );
    expect(unitFacts.K.dimension.map((power, i) => power - unitFacts.W.dimension[i]!)).toEqual(
      unitFacts['K/W'].dimension,
    );
    expect(ohm.map((power) => 0 - power)).toEqual(unitFacts.S.dimension.map((power) => power + 0));
  });
});

test.each([
  ['khz', 'Hz', 'kHz'],
  ['HZ', 'Hz', 'Hz'],
  ['Kohm', 'ohm', 'kohm'],
  ['volts', 'V', 'V'],
  ['amps', 'A', 'A'],
  ['milliamps', 'A', 'mA'],
  ['uf', 'F', 'uF'],
  ['microfarad', 'F', 'uF'],
  ['celsius', 'K', 'degC'],
  ['kilohertz', 'Hz', 'kHz'],
  ['megaohm', 'ohm', 'Mohm'],
  ['MHZ', 'Hz', 'MHz'],
  ['hours', 's', 'h'],
  ['minutes', 's', 'min'],
] as const)('%s for %s is meant as %s', (written, unit, meant) => {
  expect(suggestSpelling(written, unit)).toBe(meant);
});
