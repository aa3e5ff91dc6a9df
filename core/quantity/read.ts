/**
 * Reads a quantity as people write it into SI units: a number with prefix and unit, an IEC 60062 letter code,
 * a range `min..max` or `min..typical..max`, or a value with its tolerance.
 */
import type { Span } from '../text/span';
import { span } from '../text/span';
import type { Band } from './figure';
import { exactly } from './figure';
import type { QuantityField, QuantityProblem } from './problem';
import { expectation, problem } from './problem';
import { readTerm, skipBlanks, type Term, termValue } from './term';
import { readTolerance, type Tolerance } from './tolerance';
import type { Spelling } from './units';
import { unitFacts } from './units';

export interface QuantityValue {
  readonly band: Band;
  /** True when the text itself gave a band: a range, a tolerance or a tolerance letter. */
  readonly toleranceGiven: boolean;
}

export type QuantityReading = { readonly value: QuantityValue } | { readonly problem: QuantityProblem };

/**
 * `text` is the whole quantity, blanks around it allowed. Never throws. Of a range of two, typical is the middle.
 * A share written in percent takes a tolerance in percent as percentage points (`50 % ±1 %` is 49..51 %);
 * everywhere else percent are relative to the value. A tolerance alone is a share around nothing (`+80 % -20 %`).
 */
export function readQuantity(text: string, field: QuantityField): QuantityReading {
  const first = skipBlanks(text, 0);
  const whole = span(first, Math.max(first, text.trimEnd().length));
  const fail = (message: string, where: Span = whole, code: QuantityProblem['code'] = 'bad-quantity') => ({
    problem: problem(code, text, where, field, message),
  });
  if (whole.start === whole.end) return fail(`A value is missing: ${expectation(field)}, is expected.`);

  const aroundNothing = field.unit === '1' && /^\s*[\u00b1+]/.test(text);
  const terms: Term[] = [];
  let at = first;
  if (!aroundNothing) {
    for (;;) {
      const reading = readTerm(text, at, field);
      if ('problem' in reading) return reading;
      terms.push(reading.term);
      at = skipBlanks(text, reading.term.span.end);
      if (!text.startsWith('..', at)) break;
      at += 2;
    }
  }
  const toleranceReading = readTolerance(text, at, field);
  if ('problem' in toleranceReading) return toleranceReading;
  const { tolerance } = toleranceReading;
  at = skipBlanks(text, tolerance?.end ?? at);
  if (at < text.length) return fail(leftover(text.slice(at).trim(), field), span(at, whole.end));

  if (terms.length > 3) return fail('A range has two ends, or three figures: `min..typical..max`.');
  if (tolerance && terms.length > 1) return fail('Give either a range or a tolerance, not both.');
  const unitProblem = checkUnits(text, terms, tolerance, field);
  if (unitProblem) return { problem: unitProblem };

  const value = tolerance ? tolerated(terms[0], tolerance) : ranged(terms);
  const { min, typical, max } = value.band;
  if (![min, typical, max].every(Number.isFinite)) return fail(`\`${text.trim()}\` is too large a number.`);
  if (min > max || min > typical || typical > max) {
    const turned = terms.length === 2 ? turn(text, terms) : undefined;
    const cure = turned === undefined ? '' : `: write \`${turned}\``;
    const message = `The figures of a range go from the lowest to the highest${cure}.`;
    return { problem: problem('bad-quantity', text, whole, field, message, turned) };
  }
  return { value };
}

function ranged(terms: readonly Term[]): QuantityValue {
  const [a, b, c] = terms;
  if (!a) return { band: exactly(Number.NaN), toleranceGiven: false };
  if (!b) {
    const band = a.code?.band ?? exactly(termValue(a));
    return { band, toleranceGiven: a.code?.toleranceGiven ?? false };
  }
  const last = termValue(c ?? b);
  const middle = termValue(b, c?.unit?.spelling);
  const min = termValue(a, b.unit?.spelling ?? c?.unit?.spelling);
  return { band: { min, typical: c ? middle : (min + last) / 2, max: last }, toleranceGiven: true };
}

function tolerated(term: Term | undefined, { above, below, shared }: Tolerance): QuantityValue {
  const unitOfBoth = above.unit?.spelling ?? below.unit?.spelling;
  const typical = term ? termValue(term, unitOfBoth) : 0;
  const inPercent = term === undefined || term.unit?.spelling.unit === '1';
  const reach = (side: Term): number => {
    const spelling = side.unit?.spelling ?? shared;
    const amount = termValue(side, spelling) - (spelling?.offset ?? 0);
    const relative = spelling?.unit === '1' && !inPercent;
    return relative ? Math.abs(typical) * amount : amount;
  };
  return {
    band: { min: typical - reach(below), typical, max: typical + reach(above) },
    toleranceGiven: true,
  };
}

/** Each term needs the field's dimension; a unit given once stands behind the last figure. */
function checkUnits(
  text: string,
  terms: readonly Term[],
  tolerance: Tolerance | undefined,
  field: QuantityField,
): QuantityProblem | undefined {
  for (const term of terms) {
    const spelling = term.unit?.spelling;
    if (spelling && spelling.unit !== field.unit) return wrongUnit(text, term, spelling, field);
  }
  const sides = tolerance ? [tolerance.above, tolerance.below] : [];
  const absolute = sides.find(({ unit }) => unit && unit.spelling.unit !== '1');
  for (const side of sides) {
    const spelling = side.unit?.spelling ?? tolerance?.shared;
    if (!spelling && field.unit !== '1') {
      const message = 'The tolerance has no unit: write percent, or the unit of the value.';
      return problem('wrong-unit', text, side.span, field, message);
    }
    if (spelling?.unit === '1' && field.unit === 'K') {
      const message = 'Percent of a temperature mean nothing: write the tolerance in K.';
      return problem('wrong-unit', text, side.span, field, message);
    }
  }
  if (field.unit === '1') return undefined;
  const last = terms.at(-1);
  if (!last || last.code || last.unit || absolute) return undefined;
  const some = terms.find(({ unit }) => unit);
  const message = some
    ? 'The last figure has no unit: the unit stands once at the end, or behind each figure.'
    : `\`${text.slice(last.span.start, last.span.end)}\` has no unit: ${expectation(field)}, is expected.`;
  return problem('wrong-unit', text, last.span, field, message);
}

function wrongUnit(text: string, term: Term, spelling: Spelling, field: QuantityField): QuantityProblem {
  const symbol = term.unit ? text.slice(term.unit.span.start, term.unit.span.end) : '';
  const celsius = field.unit === 'K' && spelling.unit === 'C' ? ' Degrees Celsius are written `degC`.' : '';
  const message = `\`${symbol}\` is the unit of ${unitFacts[spelling.unit].what}, but ${expectation(field)}, is expected.${celsius}`;
  return problem('wrong-unit', text, term.unit?.span ?? term.span, field, message);
}

/** A range of two with its ends exchanged; a unit given once stays behind the last figure. */
function turn(text: string, terms: readonly Term[]): string {
  const [first = '', second = ''] = terms.map(({ span: { start, end } }) => text.slice(start, end));
  const [a, b] = terms;
  if (a?.unit || !b?.unit) return `${second}..${first}`;
  return `${second.slice(0, b.digits.length)}..${first}${second.slice(b.digits.length)}`;
}

function leftover(rest: string, field: QuantityField): string {
  if (/^([-\u2212\u2013\u2014\u2026~]|to\b)/.test(rest)) {
    return 'A range is written with two dots between its ends, for example `4.75..5.25 V`.';
  }
  if (rest.startsWith('.')) return 'A range is written with two dots between its figures.';
  return `\`${rest}\` is not understood here: ${expectation(field)}, is expected.`;
}
