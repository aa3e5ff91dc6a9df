/**
 * A new key in a map of the file: after a value that stands there already or before the first key, in the map's own
 * style, so that layout and comments stay.
 */
import type { TextEdit } from './edit';
import type { Span } from './span';

/** Puts `key: value` behind the entry whose value ends at `after`. `keys` are the map's keys by where they stand. */
export function insertAfter(
  text: string,
  keys: Iterable<Span>,
  after: Span,
  key: string,
  value: string,
): TextEdit | undefined {
  const first = firstOf(keys);
  if (!first) return undefined;
  if (isFlow(text, first.start)) return insertion(after.end, `, ${key}: ${value}`);
  const end = lineEnd(text, after.end);
  return insertion(end, `\n${indentOf(text, first.start)}${key}: ${value}`);
}

/** Puts `key: value` in front of the map's first key. */
export function insertFirst(
  text: string,
  keys: Iterable<Span>,
  key: string,
  value: string,
): TextEdit | undefined {
  const first = firstOf(keys);
  if (!first) return undefined;
  if (isFlow(text, first.start)) return insertion(first.start, `${key}: ${value}, `);
  return insertion(first.start, `${key}: ${value}\n${indentOf(text, first.start)}`);
}

function firstOf(keys: Iterable<Span>): Span | undefined {
  let first: Span | undefined;
  for (const span of keys) if (!first || span.start < first.start) first = span;
  return first;
}

function insertion(offset: number, text: string): TextEdit {
  return { span: { start: offset, end: offset }, text };
}

/** True when the map is written in braces: the last thing before its first key, comments aside, is one. */
function isFlow(text: string, offset: number): boolean {
  const lines = text.slice(0, offset).split('\n');
  for (let k = lines.length - 1; k >= 0; k--) {
    const plain = lines[k]!.replace(/(^|\s)#.*$/, '').trimEnd();
    if (plain !== '') return plain.endsWith('{');
  }
  return false;
}

/** Spaces up to the key, also where a list's dash stands before it. */
function indentOf(text: string, offset: number): string {
  const start = text.lastIndexOf('\n', offset - 1) + 1;
  return ' '.repeat(offset - start);
}

/** End of the line, before its break; a comment at its end stays with the line. */
function lineEnd(text: string, offset: number): number {
  const next = text.indexOf('\n', offset);
  const end = next < 0 ? text.length : next;
  return text[end - 1] === '\r' ? end - 1 : end;
}
