/**
 * What stands at an offset: the key path that leads there, also on a half-typed line and on a blank one, where
 * the column tells which map is meant.
 */
import type { Span } from '../text/span';
import { span, touches } from '../text/span';
import type { ListNode, MapEntry, MapNode, Node } from './node';

export interface Place {
  /** Keys and list positions from the root. */
  readonly path: readonly (string | number)[];
  /** On a key, on a value (also one that is not written yet), or between entries of the map at `path`. */
  readonly on: 'key' | 'value' | 'between';
  readonly span: Span;
  /** The value at `path`, when there is one. */
  readonly node?: Node;
  readonly entry?: MapEntry;
}

export function locate(text: string, root: Node | undefined, offset: number): Place {
  const here = span(offset, offset);
  if (!root) return { path: [], on: 'between', span: here };
  return within(root, []);

  function within(node: Node, path: readonly (string | number)[]): Place {
    if (node.kind === 'scalar') return { path, on: 'value', span: node.span, node };
    return node.kind === 'map' ? inMap(node, path) : inList(node, path);
  }

  function inMap(map: MapNode, path: readonly (string | number)[]): Place {
    const between: Place = { path, on: 'between', span: here, node: map };
    const own = map.entries.filter((entry) => !entry.merged);
    const onKey = own.find((entry) => touches(entry.key.span, offset));
    if (onKey)
      return {
        path: [...path, onKey.key.text],
        on: 'key',
        span: onKey.key.span,
        entry: onKey,
        ...valued(onKey),
      };
    const entry = own.findLast((candidate) => candidate.key.span.end < offset);
    if (!entry) return between;
    const inner = [...path, entry.key.text];
    if (entry.alias && touches(entry.alias, offset)) {
      return { path: inner, on: 'value', span: entry.alias, entry, ...valued(entry) };
    }
    const value = entry.alias ? undefined : entry.value;
    if (value && touches(value.span, offset)) return withEntry(within(value, inner), entry, inner);
    if (map.flow) {
      const gap = text.slice(value ? value.span.end : entry.key.span.end, offset);
      return value || gap.includes(',') ? between : { path: inner, on: 'value', span: here, entry };
    }
    const sameLine = !text.slice(entry.key.span.end, offset).includes('\n');
    if (!value) return sameLine || deeper(entry) ? { path: inner, on: 'value', span: here, entry } : between;
    if (value.kind !== 'scalar' && deeper(entry)) return within(value, inner);
    return between;
  }

  function inList(list: ListNode, path: readonly (string | number)[]): Place {
    const at = list.items.findLastIndex((item) => item.span.start <= offset);
    const item = list.items[at];
    if (!item) return { path, on: 'between', span: here, node: list };
    const inner = [...path, at];
    if (item.alias)
      return { path: inner, on: 'value', span: item.alias, ...(item.value && { node: item.value }) };
    if (!item.value) return { path: inner, on: 'value', span: here };
    const inside = touches(item.value.span, offset) || (!list.flow && item.value.kind !== 'scalar');
    return inside ? within(item.value, inner) : { path, on: 'between', span: here, node: list };
  }

  /** True when the cursor's column lies to the right of the entry's key: the line belongs to its value. */
  function deeper(entry: MapEntry): boolean {
    return column(offset) > column(entry.key.span.start);
  }

  function column(position: number): number {
    return position - (text.lastIndexOf('\n', position - 1) + 1);
  }
}

function valued(entry: MapEntry): { node: Node } | Record<string, never> {
  return entry.value ? { node: entry.value } : {};
}

function withEntry(place: Place, entry: MapEntry, path: readonly (string | number)[]): Place {
  return place.entry === undefined && place.path.length === path.length ? { ...place, entry } : place;
}
