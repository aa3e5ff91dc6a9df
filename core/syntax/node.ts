/**
 * The tree that the rest of the core reads: maps, lists and scalars with exact places, whatever the YAML style.
 * Every scalar is text; what `010` or `null` means is for the reader of a field to say.
 */
import type { Span } from '../text/span';

export type Node = MapNode | ListNode | ScalarNode;

export interface ScalarNode {
  readonly kind: 'scalar';
  /** As it stands in the file, quotes included. */
  readonly span: Span;
  /** Without quotes; of a block text, its lines. */
  readonly inner: Span;
  readonly text: string;
  readonly style: 'plain' | 'single-quoted' | 'double-quoted' | 'block';
  /** Where a stretch of `text` stands in the file, through quotes, escapes and folded lines. */
  locate(stretch: Span): Span;
}

export interface MapEntry {
  readonly key: ScalarNode;
  /** Absent when nothing, or nothing readable, stands behind the key. */
  readonly value?: Node;
  /** Where an alias stands in place of the value; the value's own spans are those of the anchored node. */
  readonly alias?: Span;
  /** True when the entry came through a merge key (`<<`). */
  readonly merged: boolean;
}

export interface MapNode {
  readonly kind: 'map';
  readonly span: Span;
  readonly flow: boolean;
  /** In the order of the file, the first of two equal keys only; merged entries last. */
  readonly entries: readonly MapEntry[];
}

export interface ListNode {
  readonly kind: 'list';
  readonly span: Span;
  readonly flow: boolean;
  readonly items: readonly ListItem[];
}

export interface ListItem {
  readonly value?: Node;
  readonly alias?: Span;
  /** The value, or the place where it should stand. */
  readonly span: Span;
}

export interface SyntaxIssue {
  readonly kind: 'broken' | 'warning' | 'duplicate-key';
  readonly span: Span;
  readonly message: string;
  readonly related?: { readonly span: Span; readonly message: string };
}

export interface SyntaxTree {
  readonly root?: Node;
  readonly issues: readonly SyntaxIssue[];
}

export function entryOf(map: MapNode, key: string): MapEntry | undefined {
  return map.entries.find((entry) => entry.key.text === key);
}
