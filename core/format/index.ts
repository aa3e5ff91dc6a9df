/**
 * The language of board files as one table.
 */
export * from './board';
export * from './chip-data';
export * from './drivers';
export * from './lookup';
export * from './parts';
export * from './power';
export * from './rails';
export type { Limits, NameSpace, Option, PartFamily, Row, Shape, Value } from './shape';
export * from './stock';
