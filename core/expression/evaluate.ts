/**
 * Evaluates `= 3 * 1.2 mA + 0.4 mA`: an allow-list walk over the parsed tree with dimension checking.
 * Whatever is not listed here is refused; nothing of the library runs besides its parser.
 */
import { expectation, problem, type QuantityField, type QuantityProblem } from '../quantity/problem';
import { spellings, unitFacts } from '../quantity/units';
import type { Span } from '../text/span';
import { span } from '../text/span';
import { combine, type Measure, nameOfDimension, none, power, pure, same } from './dimension';
import { functions } from './functions';
import { type ExpressionNode, parseExpression } from './parse';

export const longestExpression = 200;
const mostNodes = 100;
const deepest = 20;

export type ExpressionReading = { readonly value: number } | { readonly problem: QuantityProblem };

export function isExpression(text: string): boolean {
  return /^\s*=/.test(text);
}

/** `text` begins with `=`. The result is finite, in SI units, of the field's dimension. Never throws. */
export function evaluateExpression(text: string, field: QuantityField): ExpressionReading {
  const start = text.indexOf('=') + 1;
  const body = text.slice(start);
  const whole = span(text.length - text.trimStart().length, text.trimEnd().length);
  const fail = (message: string, where: Span = whole, code: QuantityProblem['code'] = 'bad-quantity') => ({
    problem: problem(code, text, where, field, message),
  });
  if (body.trim() === '') return fail(`The expression is empty: ${expectation(field)}, is expected.`);
  if (body.length > longestExpression)
    return fail(`An expression is at most ${longestExpression} characters long.`);
  const parsed = parseExpression(body);
  if ('fault' in parsed) {
    const open = count(body, '(') > count(body, ')');
    const cure = open
      ? ': a closing bracket is missing. Inside `{ }` and `[ ]` an expression with a comma stands in quotes.'
      : '.';
    const at = Math.min(start + parsed.at, whole.end - 1);
    return fail(`The expression ${parsed.fault}${cure}`, span(at, Math.max(at + 1, whole.end)));
  }
  try {
    const measure = walk(parsed.tree, { nodes: 0, depth: 0 });
    if (!Number.isFinite(measure.value)) return fail('The expression has no finite result.');
    if (!same(measure.dimension, unitFacts[field.unit].dimension)) {
      const message = `The expression gives ${nameOfDimension(measure.dimension)}, but ${expectation(field)}, is expected.`;
      return fail(message, whole, 'wrong-unit');
    }
    return { value: measure.value };
  } catch (error) {
    if (!(error instanceof Refusal)) throw error;
    return fail(error.message, error.word === undefined ? whole : (find(text, start, error.word) ?? whole));
  }
}

/** Why an expression is not evaluated; caught above, never seen outside. */
class Refusal extends Error {
  constructor(
    message: string,
    readonly word?: string,
  ) {
    super(message);
  }
}

interface Count {
  nodes: number;
  depth: number;
}

function walk(node: ExpressionNode, count: Count): Measure {
  count.nodes++;
  count.depth++;
  if (count.nodes > mostNodes || count.depth > deepest)
    throw new Refusal('The expression is too long to be read.');
  const result = value(node, count);
  count.depth--;
  return result;
}

function value(node: ExpressionNode, count: Count): Measure {
  switch (node.kind) {
    case 'number':
      return pure(node.value);
    case 'group':
      return walk(node.content, count);
    case 'name':
      return named(node.name);
    case 'call': {
      const compute = functions.get(node.name);
      if (!compute) {
        const known = [...functions.keys()].join(', ');
        throw new Refusal(`\`${node.name}\` is no function here; there are ${known}.`, node.name);
      }
      const result = compute(node.operands.map((operand) => walk(operand, count)));
      if (typeof result === 'string') throw new Refusal(`\`${node.name}\`: ${result}`, node.name);
      return result;
    }
    case 'operator':
      return operated(node, count);
    case 'foreign':
      throw new Refusal(`An expression is arithmetic with units: ${node.what} cannot stand in it.`);
  }
}

function named(name: string): Measure {
  if (name === 'pi') return pure(Math.PI);
  const spelling = spellings.get(name);
  if (!spelling) {
    const code = /^[a-zA-Z\u03bc]\d+$/.test(name)
      ? ' Letter codes such as `4k7` do not work in expressions.'
      : '';
    throw new Refusal(
      `\`${name.replaceAll('\u03bc', '\u00b5')}\` is no unit and no name known in expressions.${code}`,
      name,
    );
  }
  if (spelling.offset !== 0) throw new Refusal('Expressions count temperatures in K.', name);
  return { value: 10 ** spelling.exponent * spelling.factor, dimension: unitFacts[spelling.unit].dimension };
}

function operated(node: ExpressionNode & { kind: 'operator' }, count: Count): Measure {
  if (node.percent)
    throw new Refusal('Percent are ambiguous in expressions: write 0.05 instead of 5 %.', '%');
  const [first, second] = node.operands;
  if (!first) throw new Refusal('Something is missing in the expression.');
  const a = walk(first, count);
  if (!second) {
    if (node.operator === '-') return { value: -a.value, dimension: a.dimension };
    if (node.operator === '+') return a;
    throw new Refusal(`\`${node.operator}\` is no operator here.`, node.operator);
  }
  if (node.implicit && !isUnit(second)) {
    throw new Refusal('Only a unit stands behind a figure without a sign between them: write `*`.');
  }
  const b = walk(second, count);
  switch (node.operator) {
    case '+':
    case '-': {
      if (!same(a.dimension, b.dimension)) {
        const kinds = `${nameOfDimension(a.dimension)} and ${nameOfDimension(b.dimension)}`;
        throw new Refusal(
          `${kinds} cannot be ${node.operator === '+' ? 'added' : 'subtracted'}.`.replace(/^a/, 'A'),
        );
      }
      return { value: node.operator === '+' ? a.value + b.value : a.value - b.value, dimension: a.dimension };
    }
    case '*':
      return { value: a.value * b.value, dimension: combine(a.dimension, b.dimension) };
    case '/':
      return { value: a.value / b.value, dimension: combine(a.dimension, b.dimension, -1) };
    case '^':
      if (!same(b.dimension, none)) throw new Refusal('An exponent is a plain number.', '^');
      return { value: a.value ** b.value, dimension: power(a.dimension, b.value) };
    default:
      throw new Refusal(`\`${node.operator}\` is no operator here; there are + - * / ^.`, node.operator);
  }
}

/** `mA`, or `V^2`. */
function isUnit(node: ExpressionNode): boolean {
  if (node.kind === 'name') return node.name !== 'pi';
  return node.kind === 'operator' && node.operator === '^' && node.operands[0]?.kind === 'name';
}

function find(text: string, from: number, word: string): Span | undefined {
  const at = text.replaceAll('\u00b5', '\u03bc').indexOf(word, from);
  return at < 0 ? undefined : span(at, at + word.length);
}

function count(text: string, character: string): number {
  return text.split(character).length - 1;
}
