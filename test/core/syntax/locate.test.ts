/**
 * What stands at the cursor, marked `$0`, also where the text is not finished.
 */
import { expect, test } from 'vitest';
import { locate } from '../../../core/syntax/locate';
import { parseText } from '../../../core/syntax/parse';

function placeIn(marked: string): string {
  const offset = marked.indexOf('$0');
  const text = marked.replace('$0', '');
  const { path, on } = locate(text, parseText(text).root, offset);
  return `${on} ${path.join('/')}`;
}

test.each([
  ['on a key', 'rails:\n  v$03: { supply: p }\n', 'key rails/v3'],
  ['behind a key', 'rails:\n  v3$0: { supply: p }\n', 'key rails/v3'],
  ['on a value', 'rails:\n  v3: { supply: p$0 }\n', 'value rails/v3/supply'],
  ['on a missing value', 'rails:\n  v3:\n    supply: $0\n', 'value rails/v3/supply'],
  ['on a missing value of a flow map', 'rails:\n  v3: { supply: $0 }\n', 'value rails/v3/supply'],
  ['between entries of a flow map', 'rails:\n  v3: { supply: p, $0 }\n', 'between rails/v3'],
  ['on a blank line inside a map', 'rails:\n  v3:\n    supply: p\n    $0\n', 'between rails/v3'],
  ['on a blank line of the outer map', 'rails:\n  v3:\n    supply: p\n  $0\n', 'between rails'],
  ['on a blank line of the file', 'rails:\n  v3:\n    supply: p\n$0\n', 'between '],
  ['under a key without a value', 'rails:\n  v3:\n    $0\n', 'value rails/v3'],
  ['on a half-typed key', 'rails:\n  v3:\n    supply: p\n    lo$0\n', 'key rails/v3/lo'],
  ['in a list', 'a: [x, y$0]\n', 'value a/1'],
  ['in a map in a list', 'bench:\n  - rail: v$06\n', 'value bench/0/rail'],
  ['on an empty item', 'include:\n  - a\n  - $0\n', 'value include/1'],
  ['on an alias', 'a: &x { b: 1 }\nc: *x$0\n', 'value c'],
  ['in an empty file', '$0', 'between '],
  ['in a comment behind a map', 'a:\n  b: 1\n# no$0te\nc: 2\n', 'between a'],
])('%s', (_, marked, place) => expect(placeIn(marked)).toBe(place));
