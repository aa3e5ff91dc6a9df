/**
 * Places in a text: the marked stretch of the source, from a stretch of what the parser decoded.
 */
import { expect } from 'vitest';
import type { Node, ScalarNode } from '../../core/syntax/node';
import { parseText } from '../../core/syntax/parse';

/** All scalars of the text, keys included, in the order of the file. */
export function scalarsOf(text: string): ScalarNode[] {
  const visit = (node: Node | undefined): ScalarNode[] => {
    if (!node) return [];
    if (node.kind === 'scalar') return [node];
    if (node.kind === 'list') return node.items.flatMap((item) => visit(item.value));
    return node.entries.flatMap((entry) => [entry.key, ...visit(entry.value)]);
  };
  return visit(parseText(text).root);
}

/**
 * `marked` holds «guillemets» around the source of the word. The scalar whose decoded text contains `word` must
 * lead back to exactly that place.
 */
export function checkWord(marked: string, word: string): void {
  const start = marked.indexOf('«');
  const end = marked.indexOf('»') - 1;
  const text = marked.replace(/[«»]/g, '');
  const scalar = scalarsOf(text).find((candidate) => candidate.text.includes(word));
  if (!scalar) throw new Error(`no scalar holds ${word}`);
  const at = scalar.text.indexOf(word);
  expect(scalar.locate({ start: at, end: at + word.length })).toEqual({ start, end });
}
