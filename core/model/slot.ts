/**
 * Maps of the file opened by their shape: unknown, missing and empty keys are reported here, once for all
 * sections; what is left are slots that typed readers take values from.
 */
import type { Row, Shape } from '../format';
import type { MapEntry, MapNode, Node } from '../syntax/node';
import { listNames } from '../text/closest';
import type { Span } from '../text/span';
import { type Context, guess, nameList, report, reportNotComputed } from './context';

/** A value of the file with everything that reading it needs. */
export interface Slot {
  readonly context: Context;
  readonly node: Node;
  readonly row: Row;
  readonly path: string;
  /** Where the value stands, or the alias that stands for it. */
  readonly span: Span;
  /** The key in front of it. */
  readonly keySpan: Span;
}

export interface Fields<K extends string = string> {
  readonly path: string;
  readonly span: Span;
  /** Spans of the known keys that were written. */
  readonly keys: ReadonlyMap<string, Span>;
  /** Undefined when the key is absent or empty (a finding says so where it matters). */
  at(key: K): Slot | undefined;
}

/** Reads the slot's map by `shape`; undefined when no map stands there. */
export function openMap<K extends string>(slot: Slot, shape: Shape<K>): Fields<K> | undefined {
  const { context, node, path } = slot;
  if (node.kind !== 'map') {
    const keys = Object.keys(shape.keys);
    const message = `${capital(shape.name)} stands here as a map: put keys such as ${listNames(keys, 4)} indented beneath, or in \`{ }\`.`;
    report(context, 'syntax', slot, message);
    return undefined;
  }
  const slots = new Map<string, Slot>();
  const keys = new Map<string, Span>();
  for (const entry of node.entries) {
    const key = entry.key.text;
    const row = rowOf(shape, key);
    const place = { path: join(path, key), span: entry.key.span };
    if (!row) {
      reportUnknownKey(context, shape, node, place);
      continue;
    }
    keys.set(key, entry.key.span);
    if (!row.computed) reportNotComputed(context, place, `\`${key}\``);
    const inner = row.computed ? context : { ...context, quiet: true };
    const value = slotOf(inner, entry, row, place.path);
    if (value) slots.set(key, value);
    else reportNoValue(context, place, key, row);
  }
  reportMissing(slot, shape, keys);
  return { path, span: node.span, keys, at: (key) => slots.get(key) };
}

export function slotOf(context: Context, entry: MapEntry, row: Row, path: string): Slot | undefined {
  if (!entry.value) return undefined;
  const span = entry.alias ?? entry.value.span;
  return { context, node: entry.value, row, path, span, keySpan: entry.key.span };
}

/** Names and positions as findings write them. */
export function join(path: string, step: string | number): string {
  if (typeof step === 'number') return `${path}[${step}]`;
  return path === '' ? step : `${path}.${step}`;
}

export function reportNoValue(
  context: Context,
  place: { readonly path: string; readonly span: Span },
  key: string,
  row: Row,
): void {
  const example = row.example === '' ? '' : ` For example \`${key}: ${row.example}\`.`;
  const inner = row.values.find((value) => value.kind === 'map');
  const choices = inner?.kind === 'map' ? inner.shape.exactlyOne : [];
  const needs = choices.length > 0 ? ` It needs one of ${listNames(choices)}.` : '';
  report(
    context,
    'missing-key',
    place,
    `\`${key}\` has no value yet: ${sentence(row.doc)}${needs}${example}`,
    {
      expected: row.doc,
    },
  );
}

function rowOf(shape: Shape, key: string): Row | undefined {
  return Object.hasOwn(shape.keys, key) ? shape.keys[key] : undefined;
}

function reportUnknownKey(
  context: Context,
  shape: Shape,
  map: MapNode,
  place: { readonly path: string; readonly span: Span },
): void {
  const written = context.text.slice(place.span.start, place.span.end);
  const known = Object.keys(shape.keys);
  const free = known.filter((key) => !map.entries.some((entry) => entry.key.text === key));
  const meant = guess(context, written, free);
  const cure = meant ? `did you mean \`${meant}\`?` : `there are ${listNames(known, 14)}.`;
  report(context, 'unknown-key', place, `\`${written}\` is no key of ${shape.name}: ${cure}`, {
    expected: nameList(known),
    actual: written,
    ...(meant && { fixes: [replacement(place.span, meant)] }),
  });
}

export function replacement(span: Span, text: string) {
  return { title: `Change to \`${text}\``, edits: [{ span, text }], preferred: true };
}

function reportMissing(slot: Slot, shape: Shape, keys: ReadonlyMap<string, Span>): void {
  const { context, path } = slot;
  const span = slot.keySpan;
  for (const [key, row] of Object.entries(shape.keys)) {
    if (!row.required || keys.has(key)) continue;
    const message = `\`${key}\` is missing in ${shape.name}: ${sentence(row.doc)} For example \`${key}: ${row.example}\`.`;
    report(context, 'missing-key', { path: join(path, key), span }, message, { expected: row.doc });
  }
  if (shape.exactlyOne.length === 0) return;
  const given = shape.exactlyOne.filter((key) => keys.has(key));
  if (given.length === 1) return;
  const choices = listNames(shape.exactlyOne);
  if (given.length === 0) {
    const message = `${capital(shape.name)} needs one of ${choices}.`;
    report(context, 'missing-key', { path, span }, message, { expected: shape.exactlyOne.join(' | ') });
    return;
  }
  const [first = '', second = ''] = given;
  const message = `${capital(shape.name)} has exactly one of ${choices}, but ${listNames(given, 8, ' and ')} stand here: delete all but one.`;
  report(context, 'duplicate-name', { path: join(path, second), span: keys.get(second) ?? span }, message, {
    expected: 'one of them',
    actual: given.join(', '),
    related: [{ span: keys.get(first) ?? span, message: `\`${first}\` stands here.` }],
  });
}

function capital(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}

/** Docs are sentences; inside one of ours they go on in small letters. */
function sentence(doc: string): string {
  const [first = '', second = ''] = doc;
  const acronym = second === second.toUpperCase() && /\p{L}/u.test(second);
  return acronym ? doc : first.toLowerCase() + doc.slice(1);
}
