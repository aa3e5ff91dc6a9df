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
  // Of a text without its closing quote the parser leaves out the last character.
  const written = source.slice(inner.start, quoted && !closed ? inner.end - 1 : inner.end);
  const offsets = written === decoded ? undefined : alignment(written, decoded, style);
  const place = (offset: number): number => {
    const clamped = Math.min(Math.max(offset, 0), decoded.length);
    return Math.min(inner.start + (offsets ? (offsets[clamped] ?? written.length) : clamped), inner.end);
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
      return span(first, end > start ? Math.max(first, Math.min(endOf(end), inner.end)) : first);
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
  if (style === 'double-quoted') {
    const offsets = escapedOffsets(written);
    // A broken escape is decoded by other rules: the loose way below still finds most of it.
    if (offsets.length === decoded.length + 1) return offsets;
  }
  return looseOffsets(written, decoded, style);
}

/** Without escapes, decoding changes blanks and doubled quotes only: other characters follow in their order. */
function looseOffsets(written: string, decoded: string, style: ScalarNode['style']): number[] {
  const offsets: number[] = [];
  let at = 0;
  for (const wanted of decoded.split('')) {
    if (isBlank(wanted)) {
      offsets.push(at);
      if (isBlank(written[at] ?? '')) at += written.startsWith('\r\n', at) ? 2 : 1;
      continue;
    }
    while (isBlank(written[at] ?? '')) at++;
    offsets.push(at);
    at += style === 'single-quoted' && written.startsWith("''", at) ? 2 : 1;
  }
  offsets.push(at);
  return offsets.map((offset) => Math.min(offset, written.length));
}

/** The places of what a double-quoted text decodes to, by the rules of YAML 1.2.2, chapter 7.3.1. */
function escapedOffsets(written: string): number[] {
  const offsets: number[] = [];
  for (let at = 0; at < written.length; ) {
    const lineEnd = match(/\\\r?\n[ \t]*/y, written, at);
    const blanks = match(/(?:[ \t]|\r?\n)+/y, written, at);
    if (lineEnd) {
      at += lineEnd.length;
    } else if (written[at] === '\\') {
      const length = escapeLength(written, at);
      const code = length === 10 ? Number.parseInt(written.slice(at + 2, at + 10), 16) : 0;
      offsets.push(...(code > 0xffff ? [at, at] : [at]));
      at += length;
    } else if (blanks) {
      const breaks = blanks.split('\n').length - 1;
      // A line break folds into a blank, several into one less; other blanks stay.
      const length = breaks === 0 ? blanks.length : Math.max(1, breaks - 1);
      for (let i = 0; i < length; i++) offsets.push(breaks === 0 ? at + i : at);
      at += blanks.length;
    } else {
      offsets.push(at++);
    }
  }
  return [...offsets, written.length];
}

function match(pattern: RegExp, text: string, at: number): string | undefined {
  pattern.lastIndex = at;
  return pattern.exec(text)?.[0];
}

function isBlank(character: string): boolean {
  return character === ' ' || character === '\t' || character === '\n' || character === '\r';
}

function escapeLength(text: string, at: number): number {
  const kind = text[at + 1];
  return kind === 'x' ? 4 : kind === 'u' ? 6 : kind === 'U' ? 10 : 2;
}
