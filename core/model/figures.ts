/**
 * Quantities out of the file: read by the row's units, kept with their place, checked against their limits.
 */
import { evaluateExpression, isExpression } from '../expression';
import type { Limits, Value } from '../format';
import { type Band, exactly, type Figure, figure } from '../quantity/figure';
import type { QuantityField, QuantityProblem } from '../quantity/problem';
import { readQuantity } from '../quantity/read';
import { unitFacts } from '../quantity/units';
import { formatPercent, formatQuantity } from '../quantity/write';
import type { ScalarNode } from '../syntax/node';
import type { Span } from '../text/span';
import { span } from '../text/span';
import { report } from './context';
import { replacement, type Slot } from './slot';

export interface ReadFigure {
  readonly figure: Figure;
  /** True when the text itself gave a band. */
  readonly toleranceGiven: boolean;
}

type QuantityValue = Value & { kind: 'quantity' };

export function figureOf(slot: Slot | undefined): Figure | undefined {
  return readFigure(slot)?.figure;
}

/** The figure in the slot; where the row admits several units, the figure's unit tells which one it was. */
export function readFigure(slot: Slot | undefined): ReadFigure | undefined {
  if (!slot) return undefined;
  const values = slot.row.values.filter((value): value is QuantityValue => value.kind === 'quantity');
  const { node } = slot;
  if (node.kind !== 'scalar') {
    report(
      slot.context,
      'syntax',
      { path: slot.path, span: slot.keySpan },
      `${whatOf(values)} stands here, for example \`${slot.row.example}\`.`,
    );
    return undefined;
  }
  const problems: QuantityProblem[] = [];
  for (const value of values) {
    const reading = readAs(node, fieldOf(value, values, slot.row.example));
    if ('problem' in reading) {
      problems.push(reading.problem);
      continue;
    }
    return accept(slot, node, value, reading);
  }
  const worst = problems.find(({ meant }) => meant !== undefined) ?? problems[0];
  if (worst) reportProblem(slot, node, worst);
  return undefined;
}

type Reading = { readonly band: Band; readonly toleranceGiven: boolean; readonly expression: boolean };

function readAs(node: ScalarNode, field: QuantityField): Reading | { readonly problem: QuantityProblem } {
  if (isExpression(node.text)) {
    const reading = evaluateExpression(node.text, field);
    if ('problem' in reading) return reading;
    return { band: exactly(reading.value), toleranceGiven: false, expression: true };
  }
  const reading = readQuantity(node.text, field);
  return 'problem' in reading ? reading : { ...reading.value, expression: false };
}

function accept(
  slot: Slot,
  node: ScalarNode,
  value: QuantityValue,
  reading: Reading,
): ReadFigure | undefined {
  const place = textSpan(node);
  const found = figure(reading.band, value.unit, { kind: 'file' }, place);
  slot.context.quantities.push({
    span: place,
    path: slot.path,
    figure: found,
    expression: reading.expression,
  });
  const broken = brokenLimit(found, value, node.text.includes('%'));
  if (broken) {
    report(slot.context, 'bad-quantity', { path: slot.path, span: place }, `${subjectOf(slot)} ${broken}`, {
      actual: slot.context.text.slice(place.start, place.end),
    });
    return undefined;
  }
  return { figure: found, toleranceGiven: reading.toleranceGiven };
}

function reportProblem(slot: Slot, node: ScalarNode, problem: QuantityProblem): void {
  const place = widened(node, node.locate(problem.span));
  const fixes = problem.meant === undefined ? {} : { fixes: [replacement(place, problem.meant)] };
  report(slot.context, problem.code, { path: slot.path, span: place }, problem.message, {
    expected: problem.expected,
    actual: problem.actual,
    ...fixes,
  });
}

/** Where the scalar's text stands, blanks at its ends and quotes not counted. */
export function textSpan(node: ScalarNode): Span {
  const start = node.text.length - node.text.trimStart().length;
  return widened(node, node.locate(span(start, Math.max(start, node.text.trimEnd().length))));
}

/** A stretch without width cannot be underlined: the whole scalar stands in. */
function widened(node: ScalarNode, place: Span): Span {
  return place.end > place.start ? place : node.span;
}

function fieldOf(value: QuantityValue, all: readonly QuantityValue[], example: string): QuantityField {
  return { unit: value.unit, what: lower(whatOf(all)), example };
}

/** `A current, a resistance or a power`. */
function whatOf(values: readonly QuantityValue[]): string {
  const words = values.map((value) => (value.percent ? 'a share' : unitFacts[value.unit].what));
  const last = words.at(-1) ?? 'a figure';
  const sentence = words.length > 1 ? `${words.slice(0, -1).join(', ')} or ${last}` : last;
  return sentence.charAt(0).toUpperCase() + sentence.slice(1);
}

function lower(sentence: string): string {
  return sentence.charAt(0).toLowerCase() + sentence.slice(1);
}

function subjectOf(slot: Slot): string {
  const key = slot.path.split('.').at(-1) ?? '';
  return `\`${key}\``;
}

function brokenLimit(found: Figure, value: QuantityValue, signed: boolean): string | undefined {
  const { min, typical, max } = found;
  const { unit, limits, percent } = value;
  const written = (value: number) => (percent ? formatPercent(value) : formatQuantity(value, unit));
  const { above, least, most, whole }: Limits = limits;
  if (above !== undefined && min <= above)
    return `must be greater than ${written(above)}, but ${written(min)} is not.`;
  if (least !== undefined && min < least) {
    const cure =
      least === 0 && (unit === 'A' || unit === 'W')
        ? ' Write the magnitude; the direction follows from the place.'
        : '';
    return `must not be below ${written(least)}, but ${written(min)} is.${cure}`;
  }
  if (most !== undefined && max > most) {
    const cure =
      percent && !signed && max <= 100 * most ? ` Write percent with their sign: \`${max} %\`.` : '';
    return `must not be above ${written(most)}, but ${written(max)} is.${cure}`;
  }
  if (whole && ![min, typical, max].every(Number.isInteger)) return 'must be a whole number.';
  return undefined;
}
