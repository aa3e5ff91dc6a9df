/** Of the parts that one entry of the file stands for, the one that bears most. */

/** One of `list` for each place in the file: the largest by `size`. */
export function worstByPath<T>(
  list: readonly T[],
  path: (item: T) => string,
  size: (item: T) => number,
): readonly T[] {
  const worst = new Map<string, T>();
  for (const item of list) {
    const known = worst.get(path(item));
    if (known === undefined || size(item) > size(known)) worst.set(path(item), item);
  }
  return [...worst.values()];
}
