/**
 * The library's nodes to our own: exact spans, aliases followed, merge keys merged, equal keys reported.
 * Aliases share nodes instead of copying them, within a budget, so that a small text cannot grow without end.
 */
import {
  type Alias,
  isAlias,
  isMap,
  isScalar,
  isSeq,
  type Pair,
  type ParsedNode,
  type Scalar,
  type YAMLMap,
  type YAMLSeq,
} from 'yaml';
import type { Span } from '../text/span';
import { span } from '../text/span';
import type {
  ListItem,
  ListNode,
  MapEntry,
  MapNode,
  Node,
  ScalarNode,
  SyntaxIssue,
  SyntaxTree,
} from './node';
import { scalarNode } from './scalar';

/** How many nodes all aliases of a file may stand for together. */
const aliasBudget = 20_000;
const deepest = 100;

export function convert(text: string, contents: unknown): SyntaxTree {
  const issues: SyntaxIssue[] = [];
  const anchors = new Map<string, { readonly node: Node; readonly size: number } | 'open'>();
  /** Nodes that a tree reaches, aliases counted as often as they are used. */
  const sizes = new WeakMap<Node, number>();
  let spent = 0;

  const root = node(contents, 0);
  return root ? { root, issues } : { issues };

  function broken(where: Span, message: string): void {
    issues.push({ kind: 'broken', span: where, message });
  }

  function node(parsed: unknown, depth: number): Node | undefined {
    if (depth > deepest) {
      const range = (parsed as ParsedNode | null)?.range;
      if (range)
        broken(span(range[0], Math.min(range[0] + 1, text.length)), 'This is nested too deeply to be read.');
      return undefined;
    }
    if (isAlias(parsed)) return target(parsed);
    if (!isScalar(parsed) && !isMap(parsed) && !isSeq(parsed)) return undefined;
    const { anchor } = parsed;
    if (anchor !== undefined) anchors.set(anchor, 'open');
    const built = isMap(parsed) ? map(parsed, depth) : isSeq(parsed) ? list(parsed, depth) : scalar(parsed);
    if (anchor !== undefined) {
      if (built) anchors.set(anchor, { node: built, size: sizes.get(built) ?? 1 });
      else anchors.delete(anchor);
    }
    return built;
  }

  function target(alias: Alias): Node | undefined {
    const where = rangeOf(alias.range);
    const anchor = anchors.get(alias.source);
    if (anchor === undefined) {
      broken(where, `No anchor \`&${alias.source}\` stands above this alias.`);
      return undefined;
    }
    if (anchor === 'open') {
      broken(where, `The alias \`*${alias.source}\` stands inside its own anchor.`);
      return undefined;
    }
    spent += anchor.size;
    if (spent > aliasBudget) {
      broken(where, 'The aliases of this file stand for too much: this one is not followed.');
      return undefined;
    }
    return anchor.node;
  }

  function scalar(parsed: Scalar): ScalarNode | undefined {
    const range = parsed.range;
    if (!range) return undefined;
    const style = styles[parsed.type ?? 'PLAIN'] ?? 'plain';
    const decoded = typeof parsed.value === 'string' ? parsed.value : '';
    if (style === 'plain' && range[0] === range[1]) return undefined;
    return scalarNode(text, style === 'block' ? blockLines(range) : span(range[0], range[1]), style, decoded);
  }

  function map(parsed: YAMLMap, depth: number): MapNode {
    const entries = new Map<string, MapEntry>();
    const merges: Node[] = [];
    let size = 1;
    for (const pair of parsed.items as Pair[]) {
      const key = keyOf(pair);
      if (!key) continue;
      const value = node(pair.value, depth + 1);
      size += 1 + (value ? (sizes.get(value) ?? 1) : 0);
      if (key.text === '<<' && key.style === 'plain' && value) {
        merges.push(value);
        continue;
      }
      const before = entries.get(key.text);
      if (before) {
        issues.push({
          kind: 'duplicate-key',
          span: key.span,
          message: `\`${key.text}\` stands here a second time: only the first one counts. Delete or rename one of them.`,
          related: { span: before.key.span, message: 'The first one is here.' },
        });
        continue;
      }
      entries.set(key.text, entry(key, value, pair.value));
    }
    for (const merge of merges) {
      for (const source of merge.kind === 'list' ? merge.items.map((item) => item.value) : [merge]) {
        if (source?.kind !== 'map') {
          broken(
            (source ?? merge).span,
            'A merge key (`<<`) takes the alias of a map, or a list of such aliases.',
          );
          continue;
        }
        for (const merged of source.entries) {
          if (!entries.has(merged.key.text)) entries.set(merged.key.text, { ...merged, merged: true });
        }
      }
    }
    const own = [...entries.values()];
    const flow = parsed.flow === true;
    const built: MapNode = {
      kind: 'map',
      span: extent(parsed.range, flow, own.filter((e) => !e.merged).map(endOfEntry)),
      flow,
      entries: own,
    };
    sizes.set(built, size);
    return built;
  }

  function entry(key: ScalarNode, value: Node | undefined, parsed: unknown): MapEntry {
    const base = { key, merged: false };
    if (!value) return base;
    return isAlias(parsed) ? { ...base, value, alias: rangeOf(parsed.range) } : { ...base, value };
  }

  function keyOf(pair: Pair): ScalarNode | undefined {
    const parsed = isAlias(pair.key) ? target(pair.key) : isScalar(pair.key) ? scalar(pair.key) : undefined;
    if (parsed?.kind === 'scalar') return parsed;
    const range = (pair.key as ParsedNode | null)?.range ?? (pair.value as ParsedNode | null)?.range;
    if (range)
      broken(
        span(range[0], Math.max(range[0], range[1])),
        'A key is missing here: a plain word before the colon.',
      );
    return undefined;
  }

  function list(parsed: YAMLSeq, depth: number): ListNode {
    let size = 1;
    const items = parsed.items.map((item): ListItem => {
      const value = node(item, depth + 1);
      size += value ? (sizes.get(value) ?? 1) : 1;
      const where = rangeOf((item as ParsedNode | null)?.range);
      if (!value) return { span: where };
      return isAlias(item) ? { value, alias: where, span: where } : { value, span: value.span };
    });
    const flow = parsed.flow === true;
    const built: ListNode = {
      kind: 'list',
      span: extent(
        parsed.range,
        flow,
        items.map((item) => item.span.end),
      ),
      flow,
      items,
    };
    sizes.set(built, size);
    return built;
  }

  /** A block collection's range runs to the next key's line: it ends with its last visible child instead. */
  function extent(range: readonly number[] | null | undefined, flow: boolean, ends: readonly number[]): Span {
    const whole = rangeOf(range);
    const last = flow ? whole.end : Math.max(whole.start, ...ends.slice(-1));
    return span(whole.start, Math.min(last, text.length));
  }

  /** A block text without the line break behind its last line. */
  function blockLines(range: readonly [number, number, number]): Span {
    const header = text.indexOf('\n', range[0]);
    const start = header < 0 || header >= range[1] ? range[1] : header + 1;
    let end = range[1];
    while (end > start && /\s/.test(text[end - 1] ?? '')) end--;
    return span(start, end);
  }
}

const styles: Readonly<Record<string, ScalarNode['style']>> = {
  PLAIN: 'plain',
  QUOTE_SINGLE: 'single-quoted',
  QUOTE_DOUBLE: 'double-quoted',
  BLOCK_LITERAL: 'block',
  BLOCK_FOLDED: 'block',
};

function rangeOf(range: readonly number[] | null | undefined): Span {
  return span(range?.[0] ?? 0, Math.max(range?.[0] ?? 0, range?.[1] ?? 0));
}

function endOfEntry(entry: MapEntry): number {
  return Math.max(entry.key.span.end, entry.alias?.end ?? entry.value?.span.end ?? 0);
}
