/**
 * Half-open ranges in a text, in UTF-16 code units, as every editor counts them.
 */

/** `[start, end)` in UTF-16 code units from the beginning of the text, a byte-order mark not counted. */
export interface Span {
  readonly start: number;
  readonly end: number;
}

export function span(start: number, end: number): Span {
  return { start, end };
}

/** True also at the end position, so that a cursor just behind a word is on it. */
export function touches(range: Span, offset: number): boolean {
  return offset >= range.start && offset <= range.end;
}

export function covers(outer: Span, inner: Span): boolean {
  return outer.start <= inner.start && inner.end <= outer.end;
}
