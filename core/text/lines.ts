/**
 * Offsets to lines and back. Lines end at LF, CR LF or a lone CR, as editors split them; columns count
 * UTF-16 code units.
 */
import type { Span } from './span';

/** Both 1-based. */
export interface LinePosition {
  readonly line: number;
  readonly column: number;
}

export interface LineIndex {
  readonly lineCount: number;
  /** Offsets outside the text are taken to its nearest end. */
  position(offset: number): LinePosition;
  /** Lines and columns outside the text are taken to the nearest place inside it. */
  offset(position: LinePosition): number;
  /** The line without its line break; `line` is 1-based. */
  lineSpan(line: number): Span;
}

export function lineIndex(text: string): LineIndex {
  const starts = lineStarts(text);
  const clampLine = (line: number) => Math.min(Math.max(Math.trunc(line) || 1, 1), starts.length);

  function lineSpan(line: number): Span {
    const index = clampLine(line) - 1;
    const start = starts[index] ?? 0;
    let end = starts[index + 1] ?? text.length;
    if (index + 1 < starts.length) {
      end -= text[end - 1] === '\n' && text[end - 2] === '\r' ? 2 : 1;
    }
    return { start, end };
  }

  return {
    lineCount: starts.length,
    lineSpan,
    position(offset) {
      const inside = Math.min(Math.max(offset, 0), text.length);
      let low = 0;
      let high = starts.length - 1;
      while (low < high) {
        const middle = (low + high + 1) >> 1;
        if ((starts[middle] ?? 0) <= inside) low = middle;
        else high = middle - 1;
      }
      return { line: low + 1, column: inside - (starts[low] ?? 0) + 1 };
    },
    offset({ line, column }) {
      if (line > starts.length) return text.length;
      const { start, end } = lineSpan(line);
      return Math.min(start + Math.max(column - 1, 0), end);
    },
  };
}

function lineStarts(text: string): number[] {
  const starts = [0];
  for (let i = 0; i < text.length; i++) {
    const code = text.charCodeAt(i);
    if (code === 10 || (code === 13 && text.charCodeAt(i + 1) !== 10)) starts.push(i + 1);
  }
  return starts;
}
