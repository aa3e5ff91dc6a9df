/**
 * Tables of named entries, and lists: the two ways in which a file repeats something.
 */
import type { Value } from '../format';
import type { Span } from '../text/span';
import { span } from '../text/span';
import type { Entry } from './board';
import { report, reportNotComputed } from './context';
import { type Fields, join, reportNoValue, type Slot, slotOf } from './slot';

/** A named entry; `slot` is absent while nothing stands behind the name. */
export interface Named {
  readonly name: string;
  readonly nameSpan: Span;
  readonly span: Span;
  readonly path: string;
  readonly slot?: Slot;
}

export interface TableOptions {
  /** Entries without a value are meant as such: a pin that is only named. */
  readonly emptyIsFine?: boolean;
  /** What an entry is called in findings: `driver`. */
  readonly what?: string;
}

export function tableOf(slot: Slot | undefined, options: TableOptions = {}): Named[] {
  const table = slot?.row.values.find((value): value is Value & { kind: 'table' } => value.kind === 'table');
  if (!slot || !table) return [];
  const { context, node } = slot;
  if (node.kind !== 'map') {
    const example = slot.row.example === '' ? '' : `, for example \`${slot.row.example}\``;
    report(context, 'syntax', slot, `Entries with names stand here${example}.`);
    return [];
  }
  return node.entries.map((entry) => {
    const name = entry.key.text;
    const place = { path: join(slot.path, name), span: entry.key.span };
    const computed = table.entry.computed;
    if (!computed) reportNotComputed(context, place, `${options.what ? `${options.what} ` : ''}\`${name}\``);
    const inner = computed ? context : { ...context, quiet: true };
    const value = slotOf(inner, entry, table.entry, place.path);
    if (!value && !options.emptyIsFine) reportNoValue(context, place, name, table.entry);
    const end = Math.max(entry.key.span.end, value?.span.end ?? 0);
    const named = { name, nameSpan: entry.key.span, span: span(entry.key.span.start, end), path: place.path };
    return value ? { ...named, slot: value } : named;
  });
}

/** The items of a list; a single value counts as a list of one where `single` allows it. */
export function listOf(slot: Slot | undefined, single = false): Slot[] {
  const list = slot?.row.values.find((value): value is Value & { kind: 'list' } => value.kind === 'list');
  if (!slot || !list) return [];
  const { context, node } = slot;
  if (node.kind !== 'list') {
    if (single) return [slot];
    report(context, 'syntax', slot, `A list stands here, for example \`${slot.row.example}\`.`);
    return [];
  }
  return node.items.flatMap((item, index) => {
    const path = join(slot.path, index);
    if (!item.value) {
      const example = list.of.example === '' ? '.' : `, for example \`${list.of.example}\`.`;
      report(
        context,
        'missing-key',
        { path, span: visibleGap(slot, item.span) },
        `An item of the list is empty${example}`,
      );
      return [];
    }
    const { computed } = list.of;
    if (!computed)
      reportNotComputed(context, { path, span: firstLine(context.text, item.span) }, 'This entry');
    const inner = computed ? context : { ...context, quiet: true };
    return [
      {
        context: inner,
        node: item.value,
        row: list.of,
        path,
        span: item.span,
        keySpan: firstLine(context.text, item.span),
      },
    ];
  });
}

/** The part of an entry that every section has. */
export function entryBase(named: Named, fields: Fields | undefined): Entry {
  const { name, nameSpan, path } = named;
  return { name, nameSpan, span: named.span, path, keys: fields?.keys ?? new Map() };
}

/** A mark for a whole map in a list: its first line, so that not half a screen is underlined. */
function firstLine(text: string, whole: Span): Span {
  const end = text.slice(whole.start, whole.end).search(/[\r\n]/);
  return end < 0 ? whole : span(whole.start, whole.start + end);
}

function visibleGap(slot: Slot, gap: Span): Span {
  return gap.end > gap.start ? gap : slot.keySpan;
}
