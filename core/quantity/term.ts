/**
 * One number with its unit, or one letter code: the atoms of ranges and tolerances.
 */
import type { Span } from '../text/span';
import { span } from '../text/span';
import type { LetterCode } from './letter-code';
import { readLetterCode } from './letter-code';
import { scaleDecimal } from './prefix';
import type { QuantityField, QuantityProblem } from './problem';
import { expectation, problem } from './problem';
import type { Spelling } from './units';
import { spellings, suggestSpelling, unitFacts } from './units';

export interface Term {
  readonly span: Span;
  readonly digits: string;
  readonly unit?: { readonly span: Span; readonly spelling: Spelling };
  readonly code?: LetterCode;
}

export type TermReading = { readonly term: Term } | { readonly problem: QuantityProblem };

const numeral = /[-\u2212]?(?:\d+(?:\.\d+)?|\.\d+)(?:[eE][-+]?\d+)?/y;
const unitWord = /\s*([\p{L}\u00b0\u2103%][\p{L}\u00b0\u2103%/]*)/uy;
const wholeWord = /(?:(?!\.\.)[^\s\u00b1+])*/y;

/** Reads at `start`, blanks before it skipped. `alsoPercent` admits shares in fields of any unit. */
export function readTerm(
  text: string,
  start: number,
  field: QuantityField,
  alsoPercent = false,
): TermReading {
  const at = skipBlanks(text, start);
  const word = match(wholeWord, text, at)?.[0] ?? '';
  const digits = match(numeral, text, at)?.[0];
  if (digits === undefined) return wordTerm(text, at, word, field);

  const afterDigits = at + digits.length;
  const unit = match(unitWord, text, afterDigits);
  const end = unit ? afterDigits + unit[0].length : afterDigits;
  const symbol = unit?.[1] ?? '';
  const spelling = spellings.get(symbol);
  const complete = !/[\p{L}\d]/u.test(text[end] ?? '');
  const fits = spelling?.unit === field.unit || (alsoPercent && spelling?.unit === '1');
  if (!(fits && complete)) {
    const code = codeTerm(text, at, word, field);
    if (code) return code;
  }
  if (/[,_'\u2019]\d/.test(text.slice(afterDigits, afterDigits + 2))) {
    const whole = span(at, at + word.length);
    return {
      problem: problem(
        'bad-quantity',
        text,
        whole,
        field,
        `\`${word}\` is not a number here: write a point as the decimal mark and no separators between digits, for example \`${field.example}\`.`,
      ),
    };
  }
  const term = { span: span(at, end), digits: digits.replace('\u2212', '-') };
  if (symbol === '') return { term };
  const unitSpan = span(end - symbol.length, end);
  if (!spelling || !complete) return { problem: unknownUnit(text, at, word, unitSpan, complete, field) };
  return { term: { ...term, unit: { span: unitSpan, spelling } } };
}

/** The term's value in SI units; a term without unit counts in `shared`, or in the field's own unit. */
export function termValue(term: Term, shared?: Spelling): number {
  if (term.code) return term.code.band.typical;
  const spelling = term.unit?.spelling ?? shared;
  if (!spelling) return Number(term.digits);
  return scaleDecimal(term.digits, spelling.exponent) * spelling.factor + spelling.offset;
}

export function skipBlanks(text: string, start: number): number {
  return start + (match(/\s*/y, text, start)?.[0].length ?? 0);
}

function match(pattern: RegExp, text: string, at: number): RegExpExecArray | null {
  pattern.lastIndex = at;
  return pattern.exec(text);
}

/** A letter code, perhaps with the field's bare unit behind it (`4k7 ohm`). */
function codeTerm(text: string, at: number, word: string, field: QuantityField): TermReading | undefined {
  let code = readLetterCode(word, field.unit);
  let end = at + word.length;
  if (!code) {
    const tail = /(\u03a9|\u2126|ohms?|Ohm)$/.exec(word)?.[0];
    if (!tail || field.unit !== 'ohm') return undefined;
    code = readLetterCode(word.slice(0, -tail.length), field.unit);
    if (!code) return undefined;
  } else {
    const unit = match(unitWord, text, end);
    const spelling = unit && spellings.get(unit[1] ?? '');
    if (unit && spelling?.unit === field.unit && spelling.exponent === 0) end += unit[0].length;
  }
  const whole = span(at, end);
  if (code.ambiguous) {
    return {
      problem: problem(
        'bad-quantity',
        text,
        whole,
        field,
        `The last letter of \`${word}\` may be the unit or a tolerance code: write \`${word.slice(0, -1)}\` for the bare value, or the tolerance in percent behind it.`,
      ),
    };
  }
  return { term: { span: whole, digits: '', code } };
}

function wordTerm(text: string, at: number, word: string, field: QuantityField): TermReading {
  const code = codeTerm(text, at, word, field);
  if (code) return code;
  const end = Math.max(at + word.length, Math.min(at + 1, text.length));
  // A span without width cannot be underlined: at the very end the last character stands for the gap.
  const start = end === at ? Math.max(0, at - 1) : at;
  const message =
    word === ''
      ? `A number is missing here: ${expectation(field)}, is expected.`
      : `\`${word}\` is not a quantity: ${expectation(field)}, is expected.`;
  return { problem: problem('bad-quantity', text, span(start, end), field, message) };
}

function unknownUnit(
  text: string,
  at: number,
  word: string,
  unitSpan: Span,
  complete: boolean,
  field: QuantityField,
): QuantityProblem {
  if (!complete || field.unit === '1') {
    const whole = span(at, Math.max(at + word.length, unitSpan.end));
    const read = text.slice(whole.start, whole.end);
    const message = `\`${read}\` is not a quantity: ${expectation(field)}, is expected.`;
    return problem('bad-quantity', text, whole, field, message);
  }
  const symbol = text.slice(unitSpan.start, unitSpan.end);
  if (symbol === 'to') {
    const message = 'A range is written with two dots between its ends, for example `4.75..5.25 V`.';
    return problem('bad-quantity', text, unitSpan, field, message);
  }
  const meant = suggestSpelling(symbol, field.unit);
  const cure = meant
    ? `did you mean \`${meant}\`?`
    : `${field.what} is expected, such as \`${field.example}\` (unit ${unitFacts[field.unit].unit}).`;
  return problem(
    'wrong-unit',
    text,
    unitSpan,
    field,
    `\`${symbol}\` is not a unit known here: ${cure}`,
    meant,
  );
}
