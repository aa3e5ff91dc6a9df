/**
 * Text of an expression to a tree of plain data. The only door to mathjs, of which nothing but the parser is
 * taken: no evaluator, no function, no unit of its own is in reach of a file.
 */
import { create, parseDependencies } from 'mathjs/number';

export type ExpressionNode =
  | { readonly kind: 'number'; readonly value: number }
  | { readonly kind: 'name'; readonly name: string }
  | { readonly kind: 'group'; readonly content: ExpressionNode }
  | {
      readonly kind: 'operator';
      readonly operator: string;
      /** True for `3 mA`, where no sign stands between the two. */
      readonly implicit: boolean;
      readonly percent: boolean;
      readonly operands: readonly ExpressionNode[];
    }
  | { readonly kind: 'call'; readonly name: string; readonly operands: readonly ExpressionNode[] }
  | { readonly kind: 'foreign'; readonly what: string };

export type ParsedExpression =
  | { readonly tree: ExpressionNode }
  /** `at` counts from 0 in the text. */
  | { readonly fault: string; readonly at: number };

/** What mathjs's nodes look like, as far as they are looked at. */
interface LibraryNode {
  readonly type: string;
  readonly value?: unknown;
  readonly name?: unknown;
  readonly op?: unknown;
  readonly implicit?: boolean;
  readonly isPercentage?: boolean;
  readonly fn?: { readonly type?: string; readonly name?: string };
  readonly args?: readonly LibraryNode[];
  readonly content?: LibraryNode;
}

let parser: ((text: string) => unknown) | undefined;

/** Never throws. `text` should be short: the caller caps its length before. */
export function parseExpression(text: string): ParsedExpression {
  // Made at first use, so that loading the core does not pay for files without expressions.
  parser ??= create(parseDependencies ?? {}).parse as (text: string) => unknown;
  try {
    // The library's letters lack the micro sign U+00B5; the Greek letter is as long and means the same.
    return { tree: plain(parser(text.replaceAll('\u00b5', '\u03bc')) as LibraryNode) };
  } catch (error) {
    const place = (error as { readonly char?: unknown }).char;
    const at = typeof place === 'number' ? Math.min(Math.max(place - 1, 0), text.length) : 0;
    return { fault: at >= text.trimEnd().length ? 'ends too early' : 'cannot be read from here on', at };
  }
}

function plain(node: LibraryNode): ExpressionNode {
  switch (node.type) {
    case 'ConstantNode':
      return typeof node.value === 'number'
        ? { kind: 'number', value: node.value }
        : { kind: 'foreign', what: node.value === undefined ? 'nothing' : 'a text or a truth value' };
    case 'SymbolNode':
      return { kind: 'name', name: String(node.name) };
    case 'ParenthesisNode':
      return node.content
        ? { kind: 'group', content: plain(node.content) }
        : { kind: 'foreign', what: 'nothing' };
    case 'OperatorNode':
      return {
        kind: 'operator',
        operator: String(node.op),
        implicit: node.implicit === true,
        percent: node.isPercentage === true,
        operands: (node.args ?? []).map(plain),
      };
    case 'FunctionNode':
      return node.fn?.type === 'SymbolNode'
        ? { kind: 'call', name: String(node.fn.name), operands: (node.args ?? []).map(plain) }
        : { kind: 'foreign', what: 'a call of something that is no function' };
    default:
      return { kind: 'foreign', what: foreignWords[node.type] ?? 'something that is no arithmetic' };
  }
}

const foreignWords: Readonly<Record<string, string>> = {
  AccessorNode: 'a property access',
  ArrayNode: 'an array',
  AssignmentNode: 'an assignment',
  BlockNode: 'several expressions',
  ConditionalNode: 'a condition',
  FunctionAssignmentNode: 'a function definition',
  IndexNode: 'an index',
  ObjectNode: 'an object',
  RangeNode: 'a range',
  RelationalNode: 'a comparison',
};
