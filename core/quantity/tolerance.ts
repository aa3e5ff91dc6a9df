/**
 * What stands behind a value as its tolerance: `±2 %`, `+-50 mV`, `+80 % -20 %`.
 */
import { span } from '../text/span';
import type { QuantityField, QuantityProblem } from './problem';
import { problem } from './problem';
import { readTerm, skipBlanks, type Term } from './term';
import type { Spelling } from './units';

export interface Tolerance {
  /** How far up and down, as written; both are positive. */
  readonly above: Term;
  readonly below: Term;
  readonly shared: Spelling | undefined;
  readonly end: number;
}

export type ToleranceReading =
  | { readonly tolerance?: Tolerance }
  | { readonly tolerance?: undefined; readonly problem: QuantityProblem };

const both = /\s*(?:\u00b1|\+\/?[-\u2212])/y;
const up = /\s*\+/y;
const down = /\s*\/?\s*[-\u2212]/y;

/** Reads at `start`; an empty answer means that no tolerance stands there. */
export function readTolerance(text: string, start: number, field: QuantityField): ToleranceReading {
  const symmetrical = length(both, text, start);
  if (symmetrical > 0) {
    const reading = readTerm(text, start + symmetrical, field, true);
    if ('problem' in reading) return reading;
    const { term } = reading;
    return unsigned(text, field, { above: term, below: term, shared: undefined, end: term.span.end });
  }
  const upFirst = length(up, text, start);
  const firstSign = upFirst || length(down, text, start);
  if (firstSign === 0) return {};
  const first = readTerm(text, start + firstSign, field, true);
  if ('problem' in first) return first;
  const secondSign = length(upFirst > 0 ? down : up, text, first.term.span.end);
  if (secondSign === 0) {
    const whole = span(skipBlanks(text, start), first.term.span.end);
    const example = upFirst > 0 ? '+80 % -20 %' : '+-2 %';
    const message = `A tolerance needs both of its sides: write \`${example}\`, or \`+-\` before one figure for both; a range has two dots between its ends.`;
    return { problem: problem('bad-quantity', text, whole, field, message) };
  }
  const second = readTerm(text, first.term.span.end + secondSign, field, true);
  if ('problem' in second) return second;
  const [above, below] = upFirst > 0 ? [first.term, second.term] : [second.term, first.term];
  const shared = second.term.unit?.spelling;
  return unsigned(text, field, { above, below, shared, end: second.term.span.end });
}

function unsigned(text: string, field: QuantityField, tolerance: Tolerance): ToleranceReading {
  for (const term of [tolerance.above, tolerance.below]) {
    if (term.digits.startsWith('-')) {
      const message = 'A tolerance is written without a sign of its own behind `+-`, `+` or `-`.';
      return { problem: problem('bad-quantity', text, term.span, field, message) };
    }
  }
  return { tolerance };
}

function length(pattern: RegExp, text: string, at: number): number {
  pattern.lastIndex = at;
  return pattern.exec(text)?.[0].length ?? 0;
}
