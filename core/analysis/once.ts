/**
 * For what costs too much to compute unasked: the value of the first call for all further ones.
 */
export function once<T>(compute: () => T): () => T {
  let known: { readonly value: T } | undefined;
  return () => {
    known ??= { value: compute() };
    return known.value;
  };
}
