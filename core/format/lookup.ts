/**
 * Finding the row of the table that a key path of a file leads to: for hovers and completion.
 */
import { boardShape } from './board';
import type { Row, Shape, Value } from './shape';

export interface Schema {
  /** The row of the last step; absent at the root. */
  readonly row?: Row;
  /** Keys that may stand in the map at the path, when it is a map with known keys. */
  readonly shape?: Shape;
  /** True when the keys of the map at the path are names that the user gives. */
  readonly table: boolean;
}

/** `path` as a syntax tree's place gives it; undefined when the path leads outside the language. */
export function schemaAt(path: readonly (string | number)[]): Schema | undefined {
  let row: Row | undefined;
  let values: readonly Value[] = [{ kind: 'map', shape: boardShape }];
  for (const step of path) {
    const next = values.map((value) => under(value, step)).find((found) => found !== undefined);
    if (!next) return undefined;
    row = next;
    values = next.values;
  }
  const inner = values.find((value) => value.kind === 'map');
  const table = values.some((value) => value.kind === 'table');
  return { ...(row && { row }), ...(inner?.kind === 'map' && { shape: inner.shape }), table };
}

function under(value: Value, step: string | number): Row | undefined {
  if (typeof step === 'number') return value.kind === 'list' ? value.of : undefined;
  if (value.kind === 'table') return value.entry;
  if (value.kind !== 'map' || !Object.hasOwn(value.shape.keys, step)) return undefined;
  return value.shape.keys[step];
}
