/**
 * "Did you mean". Distances from the textbook examples of the edit distance (V. I. Levenshtein, 1966) and of its
 * variant with swaps (F. J. Damerau, 1964); from memory: confirm.
 */
import { expect, test } from 'vitest';
import { closest, editDistance, listNames } from '../../../core/text/closest';

test('distances', () => {
  expect(editDistance('kitten', 'sitting')).toBe(3);
  expect(editDistance('saturday', 'sunday')).toBe(3);
  expect(editDistance('teh', 'the')).toBe(1);
  expect(editDistance('', 'abc')).toBe(3);
  expect(editDistance('same', 'same')).toBe(0);
});

test('the nearest name, when one is near', () => {
  expect(closest('curent', ['current', 'capacity'])).toBe('current');
  expect(closest('flyign', ['flying', 'drive'])).toBe('flying');
  expect(closest('V3', ['v3', 'v6'])).toBe('v3');
  expect(closest('v3a', ['vbat', 'v3', 'v6'])).toBe('v3');
  expect(closest('whatever', ['current', 'capacity'])).toBeUndefined();
  expect(closest('x', [])).toBeUndefined();
});

test('names in a sentence are cut', () => {
  expect(listNames(['a', 'b'])).toBe('`a`, `b`');
  expect(listNames(['a', 'b', 'c'], 2)).toBe('`a`, `b`, and 1 more');
});
