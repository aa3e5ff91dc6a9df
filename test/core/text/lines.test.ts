/**
 * Lines and columns as the Language Server Protocol counts them (3.17, "Position": UTF-16 code units, lines end at
 * LF, CR LF or CR), but 1-based.
 */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { stripBom } from '../../../core/text/bom';
import { lineIndex } from '../../../core/text/lines';

describe('positions', () => {
  test('in all kinds of line ends', () => {
    const lines = lineIndex('ab\ncd\r\nef\rg');
    expect([0, 2, 3, 5, 7, 10, 11].map((offset) => lines.position(offset))).toEqual([
      { line: 1, column: 1 },
      { line: 1, column: 3 },
      { line: 2, column: 1 },
      { line: 2, column: 3 },
      { line: 3, column: 1 },
      { line: 4, column: 1 },
      { line: 4, column: 2 },
    ]);
    expect(lines.lineCount).toBe(4);
    expect(lines.lineSpan(2)).toEqual({ start: 3, end: 5 });
    expect(lines.lineSpan(4)).toEqual({ start: 10, end: 11 });
  });
  test('a letter outside the basic plane takes two columns', () => {
    expect(lineIndex('a😀b').position(3)).toEqual({ line: 1, column: 4 });
  });
  test('outside the text go to its ends', () => {
    const lines = lineIndex('ab\nc');
    expect(lines.position(99)).toEqual({ line: 2, column: 2 });
    expect(lines.position(-1)).toEqual({ line: 1, column: 1 });
    expect(lines.offset({ line: 9, column: 1 })).toBe(4);
    expect(lines.offset({ line: 1, column: 99 })).toBe(2);
  });
  test('and offsets are inverse', () => {
    const text = fc.string({ unit: fc.constantFrom('a', '\n', '\r\n', '\r', '😀', 'µ') });
    fc.assert(
      fc.property(text, (written) => {
        const lines = lineIndex(written);
        for (let offset = 0; offset <= written.length; offset++) {
          // Between CR and LF there is no position of its own.
          if (written[offset - 1] === '\r' && written[offset] === '\n') continue;
          expect(lines.offset(lines.position(offset))).toBe(offset);
        }
      }),
    );
  });
});

test('a byte-order mark is no part of the text', () => {
  expect(stripBom('\ufeffboard: x')).toBe('board: x');
  expect(stripBom('board: \ufeffx')).toBe('board: \ufeffx');
});
