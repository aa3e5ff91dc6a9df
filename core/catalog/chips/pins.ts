/** Lists of pin names without typing each. */

/** `pinRange('PC', 0, 2)` is `['PC0', 'PC1', 'PC2']`. */
export function pinRange(prefix: string, first: number, last: number): readonly string[] {
  return Array.from({ length: last - first + 1 }, (_, i) => `${prefix}${first + i}`);
}
