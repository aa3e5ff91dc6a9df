/**
 * What can be wrong with a quantity as somebody wrote it. Spans count from the beginning of the quantity's own
 * text; whoever knows where that text stands in the file moves them.
 */
import type { Span } from '../text/span';
import type { Unit } from './figure';
import { unitFacts } from './units';

/** What the place in the file wants to read. */
export interface QuantityField {
  readonly unit: Unit;
  /** With article, for a sentence: `a current`. */
  readonly what: string;
  /** A good value. */
  readonly example: string;
}

export interface QuantityProblem {
  readonly code: 'bad-quantity' | 'wrong-unit';
  readonly span: Span;
  readonly message: string;
  readonly expected: string;
  readonly actual: string;
  /** What should stand at the span instead, when that is plain. */
  readonly meant?: string;
}

export function quantityField(unit: Unit): QuantityField {
  const { what, example } = unitFacts[unit];
  return { unit, what, example };
}

export function expectation(field: QuantityField): string {
  return `${field.what}, such as \`${field.example}\``;
}

export function problem(
  code: QuantityProblem['code'],
  text: string,
  span: Span,
  field: QuantityField,
  message: string,
  meant?: string,
): QuantityProblem {
  const actual = text.slice(span.start, span.end);
  const found = { code, span, message, expected: expectation(field), actual };
  return meant === undefined ? found : { ...found, meant };
}
