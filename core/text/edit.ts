/**
 * Changes to a text as data: the smallest spans that change, so that comments and layout survive.
 */
import type { Span } from './span';

/** Replace `span` by `text`; an empty span inserts. */
export interface TextEdit {
  readonly span: Span;
  readonly text: string;
}

/**
 * The text after all edits, whose spans refer to the text before and may not overlap.
 * Throws RangeError when two edits overlap: that is a fault of the caller, never of the user's text.
 */
export function applyEdits(text: string, edits: readonly TextEdit[]): string {
  const sorted = [...edits].sort((a, b) => a.span.start - b.span.start || a.span.end - b.span.end);
  let result = '';
  let position = 0;
  for (const edit of sorted) {
    if (edit.span.start < position) throw new RangeError('edits overlap');
    result += text.slice(position, edit.span.start) + edit.text;
    position = edit.span.end;
  }
  return result + text.slice(position);
}
