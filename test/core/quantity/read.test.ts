/**
 * Ranges and tolerances, and where a mistake is underlined.
 */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { type QuantityField, quantityField } from '../../../core/quantity/problem';
import { readQuantity } from '../../../core/quantity/read';
import { unitFacts } from '../../../core/quantity/units';
import { checkProblem, checkQuantity } from '../../support/check-quantity';

describe('one number', () => {
  test('is read as the nearest double, whatever the prefix', () => {
    for (const text of ['100 nF', '0.1 µF', '100000pF', '.1 uF', '1e-7 F', '0.0001 mF']) {
      const reading = readQuantity(text, quantityField('F'));
      expect('value' in reading && reading.value.band.typical, text).toBe(1e-7);
    }
  });
  test('with or without blanks and signs', () => {
    checkQuantity('20mA', 'A', 0.02);
    checkQuantity('  20 mA  ', 'A', 0.02);
    checkQuantity('-3 V', 'V', -3);
    checkQuantity('\u22123 V', 'V', -3);
    checkQuantity('010 V', 'V', 10);
  });
});

describe('ranges', () => {
  test('two ends, typical in the middle', () => {
    checkQuantity('4.75..5.25 V', 'V', [4.75, 5, 5.25]);
    checkQuantity('4.75 V .. 5.25 V', 'V', [4.75, 5, 5.25]);
    checkQuantity('-3.1..-2.0 V', 'V', [-3.1, -2.55, -2]);
    checkQuantity('-20..45 degC', 'K', [253.15, 285.65, 318.15]);
    checkQuantity('10..20 %', '1', [0.1, 0.15, 0.2]);
    checkQuantity('4k7..5k6', 'ohm', [4700, 5150, 5600]);
  });
  test('three figures', () => checkQuantity('3.0..3.7..4.2 V', 'V', [3, 3.7, 4.2]));
  test('a unit for each, or one for all', () => {
    checkQuantity('100 mV..5 V', 'V', [0.1, 2.55, 5]);
    checkQuantity('1..3 mA', 'A', [1e-3, 2e-3, 3e-3]);
  });
});

describe('tolerances', () => {
  test('in percent of the magnitude', () => {
    checkQuantity('3.3 V ±2 %', 'V', [3.234, 3.3, 3.366]);
    checkQuantity('3.3 V +-2 %', 'V', [3.234, 3.3, 3.366]);
    checkQuantity('3.3 V +/- 2%', 'V', [3.234, 3.3, 3.366]);
    checkQuantity('-5 V ±1 %', 'V', [-5.05, -5, -4.95]);
    checkQuantity('100 kHz ±50 ppm', 'Hz', [99995, 1e5, 100005]);
  });
  test('with two sides', () => {
    checkQuantity('100 uF +80 % -20 %', 'F', [80e-6, 100e-6, 180e-6]);
    checkQuantity('100 uF -20 % +80 %', 'F', [80e-6, 100e-6, 180e-6]);
    checkQuantity('100 uF +80 -20 %', 'F', [80e-6, 100e-6, 180e-6]);
    checkQuantity('100 uF +80/-20 %', 'F', [80e-6, 100e-6, 180e-6]);
  });
  test('absolute', () => {
    checkQuantity('3.3 V ±50 mV', 'V', [3.25, 3.3, 3.35]);
    checkQuantity('3.3 ±0.1 V', 'V', [3.2, 3.3, 3.4]);
    checkQuantity('25 degC ±5 K', 'K', [293.15, 298.15, 303.15]);
    checkQuantity('25 degC ±5 degC', 'K', [293.15, 298.15, 303.15]);
    checkQuantity('50 % ±1 %', '1', [0.49, 0.5, 0.51]);
  });
  test('alone, around nothing', () => {
    checkQuantity('±20 %', '1', [-0.2, 0, 0.2]);
    checkQuantity('+80 % -20 %', '1', [-0.2, 0, 0.8]);
  });
});

describe('what is wrong is underlined', () => {
  test.each([
    ['«5»', 'V', 'wrong-unit', 'has no unit'],
    ['20 «mA»', 'V', 'wrong-unit', 'unit of a current'],
    ['3 «khz»', 'Hz', 'wrong-unit', 'did you mean `kHz`'],
    ['100«k»', 'Hz', 'wrong-unit', '100 kHz'],
    ['20 «C»', 'K', 'wrong-unit', 'degC'],
    ['4.75 V..«5.25»', 'V', 'wrong-unit', 'once at the end'],
    ['4.75..5.25 «mA»', 'V', 'wrong-unit', ''],
    ['3.3 V ±«2»', 'V', 'wrong-unit', 'tolerance has no unit'],
    ['300 K ±«2 %»', 'K', 'wrong-unit', 'in K'],
    ['5 «V»', '1', 'wrong-unit', 'a plain number'],
    ['«-2.0..-3.1 V»', 'V', 'bad-quantity', '`-3.1..-2.0 V`'],
    ['«5 V..4 V»', 'V', 'bad-quantity', '`4 V..5 V`'],
    ['«1..3..2 V»', 'V', 'bad-quantity', 'lowest to the highest'],
    ['«1..2..3..4 V»', 'V', 'bad-quantity', 'two ends'],
    ['«1..2 V ±3 %»', 'V', 'bad-quantity', 'not both'],
    ['3.3 V «-5 %»', 'V', 'bad-quantity', 'both of its sides'],
    ['3.3 V ±«-5 %»', 'V', 'bad-quantity', 'without a sign'],
    ['3 V «4»', 'V', 'bad-quantity', 'not understood'],
    ['3 «– 4 V»', 'V', 'bad-quantity', 'two dots'],
    ['3 «to» 4 V', 'V', 'bad-quantity', 'two dots'],
    ['«4,7» kohm', 'ohm', 'bad-quantity', 'decimal mark'],
    ['«1_000» ohm', 'ohm', 'bad-quantity', 'decimal mark'],
    ['«0x1F»', 'ohm', 'bad-quantity', ''],
    ['«.inf»', 'V', 'bad-quantity', ''],
    ['«1e999 V»', 'V', 'bad-quantity', 'too large'],
    ['«null»', 'V', 'bad-quantity', '`null` is not a quantity'],
    ['5 V.«.»', 'V', 'bad-quantity', 'number is missing'],
    ['«»', 'V', 'bad-quantity', 'value is missing'],
  ] as const)('%s', (marked, unit, code, words) => checkProblem(marked, unit, code, words));
});

test('any text is read or refused, with a span inside it', () => {
  const alphabet = fc.constantFrom(...'0123456789.-+±%kMmunpVAFRohmsdegC /JK=\u00b5\u03a9'.split(''));
  const units = fc.constantFrom(
    ...Object.values(unitFacts).map(({ unit }): QuantityField => quantityField(unit)),
  );
  fc.assert(
    fc.property(fc.oneof(fc.string({ unit: alphabet, maxLength: 24 }), fc.string()), units, (text, field) => {
      const reading = readQuantity(text, field);
      if ('problem' in reading) {
        const { span } = reading.problem;
        return 0 <= span.start && span.start <= span.end && span.end <= text.length;
      }
      const { min, typical, max } = reading.value.band;
      return min <= typical && typical <= max && Number.isFinite(max - min);
    }),
    { numRuns: 3000 },
  );
});
