/**
 * Expressions: what is computed, with which dimension, and what is refused.
 * Outside sources: arithmetic by hand; Ohm's law and the definitions of the SI units for dimensions.
 */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { evaluateExpression, longestExpression } from '../../../core/expression';
import type { Unit } from '../../../core/quantity/figure';
import { quantityField } from '../../../core/quantity/problem';
import { expectNear } from '../../support/near';

function value(text: string, unit: Unit): number {
  const reading = evaluateExpression(text, quantityField(unit));
  if ('problem' in reading) throw new Error(`${text}: ${reading.problem.message}`);
  return reading.value;
}

/** `marked` has the wrong part in «guillemets». */
function refused(marked: string, unit: Unit = 'A'): { code: string; message: string } {
  const start = marked.indexOf('«');
  const end = marked.indexOf('»') - 1;
  const text = marked.replace(/[«»]/g, '');
  const reading = evaluateExpression(text, quantityField(unit));
  if (!('problem' in reading)) throw new Error(`${text} gave ${reading.value}`);
  expect(reading.problem.span, reading.problem.message).toEqual({ start, end });
  return reading.problem;
}

describe('each allowed operator and function', () => {
  test.each([
    ['= 3 * 1.2 mA + 0.4 mA', 'A', 4e-3],
    ['= 5 mA - 2 mA', 'A', 3e-3],
    ['= 3.3 V / 1 kohm', 'A', 3.3e-3],
    ['= -(-2 V)', 'V', 2],
    ['= +2 V', 'V', 2],
    ['= 2 ^ 3', '1', 8],
    ['= 2 V ^ 2 / 4 ohm', 'W', 0.5],
    ['= min(1 mA, 2 mA)', 'A', 1e-3],
    ['= max(1 mA, 2 mA, 3 mA)', 'A', 3e-3],
    ['= abs(-2 V)', 'V', 2],
    ['= sqrt(4 ohm * 1 W)', 'V', 2],
    ['= exp(1)', '1', Math.E],
    ['= log(exp(2))', '1', 2],
    ['= log10(1000)', '1', 3],
    ['= round(2.6)', '1', 3],
    ['= floor(2.6)', '1', 2],
    ['= ceil(2.2)', '1', 3],
    ['= 2 * pi', '1', 2 * Math.PI],
  ] as const)('%s', (text, unit, expected) => expectNear(value(text, unit), expected, 1e-12));
});

describe('units', () => {
  test.each([
    ['= 1.2 kΩ', 'ohm', 1200],
    ['= 10 \u00b5F', 'F', 10e-6],
    ['= 10 \u03bcF', 'F', 10e-6],
    ['= 10 uF', 'F', 10e-6],
    ['= 1 / (2 * pi * 1 kohm * 1 uF)', 'Hz', 159.15494309],
    ['= 12 mA * 3.3 V', 'W', 39.6e-3],
    ['= 2 mA * 3 h', 'C', 21.6],
    ['= 2 * 600 mAh', 'C', 4320],
    ['= 1/2 mA', 'A', 0.5e-3],
    ['= (1 + 2) mA', 'A', 3e-3],
    ['= 300 K', 'K', 300],
    ['= 50 K / 2 W', 'K/W', 25],
    ['= 3 V / 2 V', '1', 1.5],
  ] as const)('%s', (text, unit, expected) => expectNear(value(text, unit), expected, 1e-9));
});

describe('wrong dimensions', () => {
  test.each([
    ['«= 3.3 V»', 'A', 'gives a voltage, but a current'],
    ['«= 3»', 'A', 'gives a plain number'],
    ['«= 3 V * 2 V»', 'A', 'V^2'],
  ] as const)('%s', (marked, unit, words) => {
    const { code, message } = refused(marked, unit);
    expect(code).toBe('wrong-unit');
    expect(message).toContain(words);
  });
  test.each([
    ['«= 3 V + 2 mA»', 'cannot be added'],
    ['= «min»(1 mA, 2 V)', 'of one kind'],
    ['= «exp»(1 V)', 'plain number'],
    ['= 2 «^» (1 V)', 'exponent'],
  ])('%s', (marked, words) => expect(refused(marked).message).toContain(words));
});

describe('everything else is refused', () => {
  test.each([
    ['«= x = 3»', 'an assignment'],
    ['«= f(x) = x»', 'a function definition'],
    ['«= 1 mA; 2 mA»', 'several expressions'],
    ['«= [1, 2]»', 'an array'],
    ['«= {a: 1}»', 'an object'],
    ['«= 1:3»', 'a range'],
    ['«= 1 mA > 2 mA»', 'no operator here'],
    ['«= 1 ? 2 : 3»', 'a condition'],
    ['«= "a"»', 'a text'],
    ['«= a.b»', 'a property access'],
    ['«= a[1]»', ''],
    ['«= cos.constructor("x")()»', ''],
    ['= «constructor»', 'no unit'],
    ['= «toString»', 'no unit'],
    ['= «__proto__»', 'no unit'],
    ['= «ones»(3000, 3000)', 'no function'],
    ['= «createUnit»(1)', 'no function'],
    ['= «i»', 'no unit'],
    ['= 1 mA * 5 «%»', 'ambiguous'],
    ['= 4«k7»', 'Letter codes'],
    ['= 20 «degC»', 'in K'],
    ['«= 2 (3 mA)»', 'write `*`'],
    ['= 3 «!»', 'no operator'],
    ['«= 7 mod 2»', ''],
    ['«= 1 mA / 0»', 'no finite result'],
    ['«= sqrt(-1)»', 'no finite result'],
    ['«=»', 'empty'],
    ['= 3 *« »', ''],
    ['= «max»()', 'at least one'],
    ['= «abs»(1, 2)', 'exactly one'],
  ])('%s', (marked, words) => {
    const text = marked.replace(/[«»]/g, '');
    const reading = evaluateExpression(text, quantityField('A'));
    if (!('problem' in reading)) throw new Error(`${text} gave ${reading.value}`);
    expect(reading.problem.message).toContain(words);
  });
  test('at its place', () => {
    refused('= 3 * «foo» + 1 mA');
    refused('= 3 * «ohmm» + 1 mA');
    refused('= 1 mA + 5 «%»');
  });
  test('a bracket that is cut off by a comma says how to write it', () => {
    expect(refused('= max(1 m«A»').message).toContain('in quotes');
  });
  test('too long, too deep', () => {
    expect(refused(`«= ${'1 mA + '.repeat(40)}1 mA»`).message).toContain(String(longestExpression));
    expect(refused(`«= ${'('.repeat(60)}1 mA${')'.repeat(60)}»`).message).toContain('too long');
  });
});

test('any text is computed or refused, with a span inside it', () => {
  const letters = fc.constantFrom(
    ...'0123456789.+-*/^()[]{},;:=!%<>?\'" mkVAFe'.split(''),
    'min',
    'sqrt',
    'ohm',
    '\u00b5',
  );
  fc.assert(
    fc.property(fc.string({ unit: letters, maxLength: 30 }), (body) => {
      const text = `=${body}`;
      const reading = evaluateExpression(text, quantityField('A'));
      if ('value' in reading) return Number.isFinite(reading.value);
      const { span } = reading.problem;
      return 0 <= span.start && span.start < span.end && span.end <= text.length;
    }),
    { numRuns: 2000 },
  );
});
