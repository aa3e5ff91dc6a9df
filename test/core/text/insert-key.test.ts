import { describe, expect, it } from 'vitest';
import { applyEdits } from '../../../core/text/edit';
import { insertAfter, insertFirst } from '../../../core/text/insert-key';
import type { Span } from '../../../core/text/span';

/** Spans of words in a text, each where it first stands. */
function spans(text: string, ...words: string[]): Span[] {
  return words.map((word) => {
    const start = text.indexOf(word);
    return { start, end: start + word.length };
  });
}

describe('a new key', () => {
  it('goes behind a value in braces, and before the first key', () => {
    const text = 'pump: { # why\n  topology: doubler, diode: d1 } # end\n';
    const keys = spans(text, 'topology', 'diode');
    const [value] = spans(text, 'd1');
    expect(applyEdits(text, [insertAfter(text, keys, value!, 'series', '47 ohm')!])).toBe(
      'pump: { # why\n  topology: doubler, diode: d1, series: 47 ohm } # end\n',
    );
    expect(applyEdits(text, [insertFirst(text, keys, 'series', '47 ohm')!])).toBe(
      'pump: { # why\n  series: 47 ohm, topology: doubler, diode: d1 } # end\n',
    );
  });

  it('goes on a line of its own in a block, indented as the others, comments left where they are', () => {
    const text =
      'pump:\n    # { not a brace\n    topology: doubler # up\n    diode: d1 # cheap\r\n  # next\n';
    const keys = spans(text, 'topology', 'diode');
    const [value] = spans(text, 'd1');
    expect(applyEdits(text, [insertAfter(text, keys, value!, 'series', '47 ohm')!])).toBe(
      'pump:\n    # { not a brace\n    topology: doubler # up\n    diode: d1 # cheap\n    series: 47 ohm\r\n  # next\n',
    );
    expect(applyEdits(text, [insertFirst(text, keys, 'series', '47 ohm')!])).toContain(
      '    series: 47 ohm\n    topology: doubler # up\n',
    );
  });

  it('has no place in a map without keys', () => {
    expect(insertFirst('{}', [], 'a', 'b')).toBeUndefined();
  });
});
