/**
 * Decoded text of a YAML scalar together with the place of each of its characters in the file.
 */
import type { Span } from '../text/span';
import { span } from '../text/span';
import type { ScalarNode } from './node';

/** `source` is the file's text; `range` covers the scalar with its quotes; `decoded` is the parser's reading. */
export function scalarNode(
  source: string,
  range: Span,
  style: ScalarNode['style'],
  decoded: string,
): ScalarNode {
  const quoted = style === 'single-quoted' || style === 'double-quoted';
  const closed = quoted && range.end - range.start > 1 && source[range.end - 1] === source[range.start];
  const inner = quoted ? span(range.start + 1, closed ? range.end - 1 : range.end) : range;
  const written = source.slice(inner.start, inner.end);
  const offsets = written === decoded ? undefined : alignment(written, decoded, style);
  const place = (offset: number): number => {
    const clamped = Math.min(Math.max(offset, 0), decoded.length);
    return inner.start + (offsets ? (offsets[clamped] ?? written.length) : clamped);
  };
  return {
    kind: 'scalar',
    span: range,
    inner,
    text: decoded,
    style,
    locate({ start, end }) {
      const first = place(start);
      // The end follows the last character, not the place of the next one: escapes and line ends lie between.
      return span(first, end > start ? Math.max(first, endOf(end)) : first);
    },
  };

  function endOf(end: number): number {
    if (!offsets || end > decoded.length) return place(end);
    const last = place(end - 1);
    return style === 'double-quoted' && source[last] === '\\'
      ? last + escapeLength(source, last)
      : last + (style === 'single-quoted' && source[last] === "'" ? 2 : 1);
  }
}

/** For each character of `decoded`, and its end, the offset in `written`. */
function alignment(written: string, decoded: string, style: ScalarNode['style']): number[] {
  const offsets: number[] = [];
  let at = 0;
  for (let i = 0; i < decoded.length; i++) {
    const wanted = decoded[i] ?? '';
    if (isBlank(wanted)) {
      offsets.push(at);
      if (isBlank(written[at] ?? '')) at += written.startsWith('\r\n', at) ? 2 : 1;
      else if (style === 'double-quoted' && written[at] === '\\') at += escapeLength(written, at);
      continue;
    }
    at = skipFolding(written, at, style);
    offsets.push(at);
    if (style === 'double-quoted' && written[at] === '\\') {
      const length = escapeLength(written, at);
      // One escape may stand for a pair of code units.
      const pair =
        /[\ud800-\udbff]/.test(wanted) && /^\\[xuU]/.test(written.slice(at, at + 2)) && length === 10;
      if (pair) {
        offsets.push(at);
        i++;
      }
      at += length;
    } else {
      at += style === 'single-quoted' && written.startsWith("''", at) ? 2 : 1;
    }
  }
  offsets.push(Math.min(at, written.length));
  return offsets.map((offset) => Math.min(offset, written.length));
}

function skipFolding(written: string, start: number, style: ScalarNode['style']): number {
  let at = start;
  for (;;) {
    if (isBlank(written[at] ?? '')) at++;
    else if (style === 'double-quoted' && /^\\\r?\n/.test(written.slice(at, at + 3))) at += 2;
    else return at;
  }
}

function isBlank(character: string): boolean {
  return character === ' ' || character === '\t' || character === '\n' || character === '\r';
}

function escapeLength(text: string, at: number): number {
  const kind = text[at + 1];
  return kind === 'x' ? 4 : kind === 'u' ? 6 : kind === 'U' ? 10 : 2;
}
