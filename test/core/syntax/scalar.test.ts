/**
 * From decoded text back to the file, through every YAML 1.2 scalar style (YAML 1.2.2, chapters 7.3 and 8.1; the
 * examples follow its rules for escapes and folding).
 */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { parseText } from '../../../core/syntax/parse';
import { checkWord, scalarsOf } from '../../support/check-span';

describe('a word leads back to its place', () => {
  test.each([
    ['plain', 'a: 3.3 «V»', 'V'],
    ['plain with a comment', 'a: 3.3 «V» # typical', 'V'],
    ['in a flow map', 'a: { b: 1 mA, c: 3.3 «V» }', 'V'],
    ['in a flow list', 'a: [1 mA, 3.3 «V»]', 'V'],
    ['single-quoted', "a: '3.3 «V»'", 'V'],
    ['behind a doubled quote', "a: 'it''s «V»'", 'V'],
    ['a doubled quote itself', "a: 'it«''»s'", "'"],
    ['double-quoted', 'a: "3.3 «V»"', 'V'],
    ['behind an escape', 'a: "1 \\u00b5«A»"', 'A'],
    ['an escape itself', 'a: "1 «\\u00b5»A"', '\u00b5'],
    ['an escape of two units', 'a: "«\\U0001F600» V"', '😀'],
    ['behind an escape of two units', 'a: "\\U0001F600 «V»"', 'V'],
    ['behind an escaped quote', 'a: "\\"x\\" «V»"', 'V'],
    ['a hexadecimal escape', 'a: "«\\xb5»A"', '\u00b5'],
    ['behind non-ASCII text', 'a: 😀 µΩ «V»', 'V'],
    ['folded plain', 'a: 3.3\n   «V»', 'V'],
    ['folded with CR LF', 'a: 3.3\r\n   «V»', 'V'],
    ['folded in double quotes', 'a: "3.3\n   «V»"', 'V'],
    ['behind an escaped line end', 'a: "3.3 \\\n   «V»"', 'V'],
    ['behind an empty line', "a: '3.3\n\n   «V»'", 'V'],
    ['literal block', 'a: |\n  3.3\n  «V»\n', 'V'],
    ['folded block', 'a: >-\n  3.3\n  «V»\nb: 1', 'V'],
    ['a key', '«key»: 1', 'key'],
    ['a quoted key', '"«key»": 1', 'key'],
    ['after CR LF lines', 'x: 1\r\ny: 2\r\na: 3.3 «V»\r\n', 'V'],
  ])('%s', (_, marked, word) => checkWord(marked, word));
});

test('quotes are part of the span and not of the inner span', () => {
  const [, value] = scalarsOf('a: "x y"');
  expect(value).toMatchObject({
    span: { start: 3, end: 8 },
    inner: { start: 4, end: 7 },
    style: 'double-quoted',
  });
});

test('numbers, truth values and null stay text', () => {
  const texts = scalarsOf('a: [010, 0x1F, .inf, 1e999, yes, null, ~, 12:30, 1_000]').map(({ text }) => text);
  expect(texts.slice(1)).toEqual(['010', '0x1F', '.inf', '1e999', 'yes', 'null', '~', '12:30', '1_000']);
});

test('every stretch of every scalar lies inside it, and single characters lead back to themselves', () => {
  const letters = fc.constantFrom(
    'a',
    'b',
    ' ',
    '\n',
    "''",
    '\\n',
    '\\u00b5',
    'Ω',
    '😀',
    '\\\n',
    '\t',
    '\r\n',
    '"',
    ':',
  );
  const body = fc.string({ unit: letters, maxLength: 20 });
  const quote = fc.constantFrom('', "'", '"', '|\n ', '>-\n ');
  fc.assert(
    fc.property(body, quote, (text, open) => {
      const source = `k: ${open}${text.replaceAll('\n', '\n ')}${open.length === 1 ? open : ''}\n`;
      // Where a quote is not closed the parser drops and folds as it likes: only the bounds hold there.
      const sound = parseText(source).issues.length === 0;
      for (const scalar of scalarsOf(source)) {
        for (let at = 0; at < scalar.text.length; at++) {
          const { start, end } = scalar.locate({ start: at, end: at + 1 });
          expect(start).toBeGreaterThanOrEqual(scalar.span.start);
          expect(end).toBeLessThanOrEqual(Math.max(scalar.span.end, scalar.inner.end));
          expect(start).toBeLessThanOrEqual(end);
          // Letters that no style escapes or folds stand in the file as they are.
          const letter = scalar.text[at] ?? '';
          if (sound && /[abΩ]/.test(letter)) expect(source.slice(start, end)).toBe(letter);
        }
      }
    }),
    { numRuns: 2000 },
  );
});

test('the tree of a text that is one word', () => {
  expect(parseText('vo').root).toMatchObject({ kind: 'scalar', text: 'vo' });
});
