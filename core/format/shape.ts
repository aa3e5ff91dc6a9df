/**
 * How the file format is written down: shapes (a map with known keys), rows (one key) and values (what may stand
 * behind it). Parsing, "did you mean", hover, completion and the JSON schema all read the same tables.
 */
import type { Unit } from '../quantity/figure';

/** Bounds that a sensible figure keeps, in SI units. */
export interface Limits {
  /** The figure must be greater. */
  readonly above?: number;
  readonly least?: number;
  readonly most?: number;
  readonly whole?: true;
}

/** Sections whose entries other places refer to by name. */
export type NameSpace = 'supplies' | 'chips' | 'clocks' | 'drivers' | 'rails' | 'modes';

export type PartFamily = 'chips' | 'diodes' | 'transistors' | 'mosfets' | 'gates' | 'timers' | 'capacitors';

export interface Option {
  readonly name: string;
  readonly doc: string;
  readonly computed: boolean;
}

export type Value =
  | { readonly kind: 'quantity'; readonly unit: Unit; readonly limits: Limits; readonly percent: boolean }
  | { readonly kind: 'text' }
  | { readonly kind: 'choice'; readonly options: readonly Option[] }
  | { readonly kind: 'name'; readonly of: readonly NameSpace[]; readonly also: readonly string[] }
  /** `CHIP.PIN`. */
  | { readonly kind: 'pin' }
  /** A drive setting that the chip's part names. */
  | { readonly kind: 'strength' }
  /** A key of the catalogue or of `parts`. */
  | { readonly kind: 'part'; readonly family: PartFamily }
  /** A port standard or battery of the catalogue. */
  | { readonly kind: 'source'; readonly of: 'standards' | 'batteries' }
  | { readonly kind: 'finding' }
  | { readonly kind: 'map'; readonly shape: Shape }
  /** A map whose keys are names that the user gives, or modes. */
  | { readonly kind: 'table'; readonly entry: Row; readonly keys: 'own names' | 'modes' | 'pins' }
  | { readonly kind: 'list'; readonly of: Row };

export interface Row {
  /** Any one of these may stand behind the key. */
  readonly values: readonly Value[];
  /** One sentence for a hover or a completion. */
  readonly doc: string;
  /** A good value, as YAML on one line. */
  readonly example: string;
  readonly required: boolean;
  /** False: read and checked, but no number of the report follows from it yet. */
  readonly computed: boolean;
}

export interface Shape<K extends string = string> {
  /** What an entry of this shape is, with its article, for sentences: `a pump`. */
  readonly name: string;
  readonly doc: string;
  readonly keys: Readonly<Record<K, Row>>;
  /** Exactly one of these keys must stand in the map. */
  readonly exactlyOne: readonly string[];
}

export function shape<K extends string>(
  name: string,
  doc: string,
  keys: Readonly<Record<K, Row>>,
  exactlyOne: readonly NoInfer<K>[] = [],
): Shape<K> {
  return { name, doc, keys, exactlyOne };
}

export interface RowOptions {
  readonly required?: true;
  readonly computed?: false;
}

export function row(
  values: Value | readonly Value[],
  doc: string,
  example: string,
  options: RowOptions = {},
): Row {
  const list: readonly Value[] = 'kind' in values ? [values] : values;
  return {
    values: list,
    doc,
    example,
    required: options.required ?? false,
    computed: options.computed ?? true,
  };
}

export const positive: Limits = { above: 0 };
export const notNegative: Limits = { least: 0 };
export const share: Limits = { least: 0, most: 1 };

export function quantity(unit: Unit, limits: Limits = {}): Value {
  return { kind: 'quantity', unit, limits, percent: false };
}

/** A plain number that people write in percent. */
export function percent(limits: Limits = share): Value {
  return { kind: 'quantity', unit: '1', limits, percent: true };
}

export const text: Value = { kind: 'text' };

export function choice(...options: readonly Option[]): Value {
  return { kind: 'choice', options };
}

export function option(name: string, doc: string, computed = true): Option {
  return { name, doc, computed };
}

export function name(of: NameSpace | readonly NameSpace[], ...also: readonly string[]): Value {
  return { kind: 'name', of: typeof of === 'string' ? [of] : of, also };
}

export function part(family: PartFamily): Value {
  return { kind: 'part', family };
}

export function map(inner: Shape): Value {
  return { kind: 'map', shape: inner };
}

export function table(entry: Row, keys: 'own names' | 'modes' | 'pins' = 'own names'): Value {
  return { kind: 'table', entry, keys };
}

export function list(of: Row): Value {
  return { kind: 'list', of };
}
