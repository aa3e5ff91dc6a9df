/**
 * Letter codes against a hand-checked table of IEC 60062, marking codes for resistors and capacitors
 * (from memory: confirm).
 */
import { describe, expect, test } from 'vitest';
import { readLetterCode, smallCapacitorLetters, toleranceLetters } from '../../../core/quantity/letter-code';
import { checkProblem, checkQuantity } from '../../support/check-quantity';

describe('resistances, IEC 60062', () => {
  test.each([
    ['R10', 0.1],
    ['R47', 0.47],
    ['1R0', 1],
    ['3R32', 3.32],
    ['10R', 10],
    ['59R04', 59.04],
    ['590R', 590],
    ['K10', 100],
    ['1K0', 1e3],
    ['1k', 1e3],
    ['4k7', 4700],
    ['5K904', 5904],
    ['100K', 1e5],
    ['M10', 1e5],
    ['2M2', 2.2e6],
    ['10M', 1e7],
    ['1G0', 1e9],
    ['3T32', 3.32e12],
    ['4L7', 4.7e-3],
  ])('%s', (code, ohms) => checkQuantity(code, 'ohm', ohms));
});

describe('capacitances, IEC 60062', () => {
  test.each([
    ['p10', 0.1e-12],
    ['p332', 0.332e-12],
    ['1p0', 1e-12],
    ['6p8', 6.8e-12],
    ['100p', 1e-10],
    ['n10', 1e-10],
    ['1n5', 1.5e-9],
    ['100n', 1e-7],
    ['u10', 1e-7],
    ['2u2', 2.2e-6],
    ['2µ2', 2.2e-6],
    ['2μ2', 2.2e-6],
    ['4m7', 4.7e-3],
    ['1F0', 1],
  ])('%s', (code, farads) => checkQuantity(code, 'F', farads));
});

describe('tolerance letters, IEC 60062', () => {
  test.each([
    ['E', 0.005],
    ['L', 0.01],
    ['P', 0.02],
    ['W', 0.05],
    ['B', 0.1],
    ['C', 0.25],
    ['D', 0.5],
    ['F', 1],
    ['G', 2],
    ['J', 5],
    ['K', 10],
    ['M', 20],
    ['N', 30],
  ])('%s is %d percent', (letter, percent) => {
    checkQuantity(`1k0${letter}`, 'ohm', [1e3 * (1 - percent / 100), 1e3, 1e3 * (1 + percent / 100)]);
  });
  test.each([
    ['Q', 10, 30],
    ['T', 10, 50],
    ['S', 20, 50],
    ['Z', 20, 80],
  ])('%s is not symmetrical', (letter, below, above) => {
    checkQuantity(`10u${letter}`, 'F', [1e-5 * (1 - below / 100), 1e-5, 1e-5 * (1 + above / 100)]);
  });
  test('below 10 pF the letters count in picofarad', () => {
    checkQuantity('4p7B', 'F', [4.6e-12, 4.7e-12, 4.8e-12]);
    checkQuantity('4p7C', 'F', [4.45e-12, 4.7e-12, 4.95e-12]);
    checkQuantity('10pJ', 'F', [9.5e-12, 10e-12, 10.5e-12]);
  });
  test('no letter of either table is left untested', () => {
    expect(Object.keys(toleranceLetters).sort().join('')).toBe('BCDEFGJKLMNPQSTWZ');
    expect(Object.keys(smallCapacitorLetters).sort().join('')).toBe('BCDFG');
  });
});

describe('what is no letter code', () => {
  test.each(['k', 'R', '4k7k', '4x7', '47', '4k7X', '-4k7', '4 k7', '', '__proto__', '4k7JJ', '0x1F'])(
    '%s',
    (word) => {
      expect(readLetterCode(word, 'ohm')).toBeUndefined();
    },
  );
  test('letters belong to their unit', () => {
    expect(readLetterCode('4k7', 'F')).toBeUndefined();
    expect(readLetterCode('2u2', 'ohm')).toBeUndefined();
    expect(readLetterCode('3V3', 'A')).toBeUndefined();
  });
});

test('a unit behind a code', () => {
  checkQuantity('4k7 ohm', 'ohm', 4700);
  checkQuantity('4k7Ω', 'ohm', 4700);
  checkQuantity('2u2 F', 'F', 2.2e-6);
});

test('F behind a capacitance may be farad or one percent', () => {
  checkProblem('«2n2F»', 'F', 'bad-quantity', 'may be the unit or a tolerance');
  checkQuantity('100nF', 'F', 1e-7);
});

test('voltages in the same way, common practice', () => checkQuantity('3V3', 'V', 3.3));
