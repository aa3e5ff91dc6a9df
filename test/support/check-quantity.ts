/**
 * Quantities: text in, band or marked problem out.
 */
import { expect } from 'vitest';
import type { Unit } from '../../core/quantity/figure';
import { quantityField } from '../../core/quantity/problem';
import { readQuantity } from '../../core/quantity/read';

/** `expected` is one figure, or min, typical and max; agreement to a part in 10^12. */
export function checkQuantity(
  text: string,
  unit: Unit,
  expected: number | readonly [number, number, number],
): void {
  const reading = readQuantity(text, quantityField(unit));
  if ('problem' in reading) throw new Error(`${text}: ${reading.problem.message}`);
  const { min, typical, max } = reading.value.band;
  const wanted = typeof expected === 'number' ? [expected, expected, expected] : expected;
  for (const [index, actual] of [min, typical, max].entries()) {
    const target = wanted[index] ?? Number.NaN;
    expect(Math.abs(actual - target), `${text}: ${actual} for ${target}`).toBeLessThanOrEqual(
      1e-12 * Math.abs(target),
    );
  }
}

/** `marked` is the text with the wrong part in «guillemets»; `words` are part of the message. */
export function checkProblem(
  marked: string,
  unit: Unit,
  code: 'bad-quantity' | 'wrong-unit',
  words = '',
): void {
  const start = marked.indexOf('«');
  const end = marked.indexOf('»') - 1;
  const text = marked.replace(/[«»]/g, '');
  const reading = readQuantity(text, quantityField(unit));
  if (!('problem' in reading)) throw new Error(`${text} was read as ${JSON.stringify(reading.value.band)}`);
  const { problem } = reading;
  expect({ code: problem.code, span: problem.span }).toEqual({ code, span: { start, end } });
  expect(problem.message).toContain(words);
}
