/**
 * Places that an editor can underline: a stretch without width is invisible.
 */
import { type Span, span } from './span';

/** The part of a stretch that can be underlined: inside the text, on one line, at least one character wide. */
export function visible(text: string, { start: from, end: to }: Span): Span {
  const start = Math.min(Math.max(from, 0), text.length);
  const lineBreak = text.slice(start, to).search(/[\r\n]/);
  const end = Math.min(lineBreak < 0 ? to : start + lineBreak, text.length);
  return end > start ? span(start, end) : besides(text, start);
}

/** A gap is shown at the character behind it on the line, else at the last one before it that is no blank. */
export function besides(text: string, at: number): Span {
  const next = text[at];
  if (next !== undefined && next !== '\n' && next !== '\r') return span(at, at + 1);
  let last = at;
  while (last > 0 && /\s/.test(text[last - 1] ?? '')) last--;
  return last > 0 ? span(last - 1, last) : span(0, Math.min(1, text.length));
}
