/**
 * The unit table: every spelling that a file may use, what it means in SI, and the dimension of each unit.
 * To add a spelling, add it to a row here.
 */
import type { Unit } from './figure';
import { prefixes } from './prefix';

/** Powers of volt, ampere, second and kelvin: all that circuits need. */
export type Dimension = readonly [volt: number, ampere: number, second: number, kelvin: number];

export interface UnitFact {
  readonly unit: Unit;
  /** What a figure in this unit is called in a sentence. */
  readonly what: string;
  readonly example: string;
  readonly dimension: Dimension;
}

export const unitFacts: Readonly<Record<Unit, UnitFact>> = {
  V: { unit: 'V', what: 'a voltage', example: '3.3 V', dimension: [1, 0, 0, 0] },
  A: { unit: 'A', what: 'a current', example: '20 mA', dimension: [0, 1, 0, 0] },
  ohm: { unit: 'ohm', what: 'a resistance', example: '4.7 kohm', dimension: [1, -1, 0, 0] },
  F: { unit: 'F', what: 'a capacitance', example: '10 uF', dimension: [-1, 1, 1, 0] },
  H: { unit: 'H', what: 'an inductance', example: '10 uH', dimension: [1, -1, 1, 0] },
  Hz: { unit: 'Hz', what: 'a frequency', example: '100 kHz', dimension: [0, 0, -1, 0] },
  s: { unit: 's', what: 'a time', example: '5 ms', dimension: [0, 0, 1, 0] },
  K: { unit: 'K', what: 'a temperature', example: '-20..45 degC', dimension: [0, 0, 0, 1] },
  W: { unit: 'W', what: 'a power', example: '10 mW', dimension: [1, 1, 0, 0] },
  C: { unit: 'C', what: 'a charge', example: '1200 mAh', dimension: [0, 1, 1, 0] },
  'K/W': { unit: 'K/W', what: 'a thermal resistance', example: '200 K/W', dimension: [-1, -1, 0, 1] },
  S: { unit: 'S', what: 'a conductance', example: '10 mS', dimension: [-1, 1, 0, 0] },
  '1': { unit: '1', what: 'a plain number', example: '1.05', dimension: [0, 0, 0, 0] },
};

/** value in SI = (number * 10^exponent) * factor + offset */
export interface Spelling {
  readonly unit: Unit;
  readonly exponent: number;
  readonly factor: number;
  readonly offset: number;
}

interface Row {
  readonly symbols: readonly string[];
  readonly unit: Unit;
  readonly prefixed: boolean;
  readonly exponent?: number;
  readonly factor?: number;
  readonly offset?: number;
}

/** Ice point: BIPM SI brochure, 9th edition, 2.3.1 (from memory: confirm). */
const icePointK = 273.15;

const rows: readonly Row[] = [
  { symbols: ['V'], unit: 'V', prefixed: true },
  { symbols: ['A'], unit: 'A', prefixed: true },
  // Greek capital omega U+03A9 and the ohm sign U+2126 look the same and are both typed.
  { symbols: ['ohm', '\u03a9', '\u2126', 'Ohm', 'ohms', 'R'], unit: 'ohm', prefixed: true },
  { symbols: ['F'], unit: 'F', prefixed: true },
  { symbols: ['H'], unit: 'H', prefixed: true },
  { symbols: ['Hz'], unit: 'Hz', prefixed: true },
  { symbols: ['s'], unit: 's', prefixed: true },
  { symbols: ['min'], unit: 's', prefixed: false, factor: 60 },
  { symbols: ['h'], unit: 's', prefixed: false, factor: 3600 },
  // The day of the SI brochure, 86 400 s; months and years have no one length.
  { symbols: ['d', 'day', 'days'], unit: 's', prefixed: false, factor: 86_400 },
  { symbols: ['K'], unit: 'K', prefixed: true },
  { symbols: ['degC', '\u00b0C', '\u2103'], unit: 'K', prefixed: false, offset: icePointK },
  { symbols: ['W'], unit: 'W', prefixed: true },
  { symbols: ['C'], unit: 'C', prefixed: true },
  { symbols: ['Ah'], unit: 'C', prefixed: true, factor: 3600 },
  { symbols: ['K/W', 'degC/W', '\u00b0C/W'], unit: 'K/W', prefixed: false },
  { symbols: ['S'], unit: 'S', prefixed: true },
  { symbols: ['%'], unit: '1', prefixed: false, exponent: -2 },
  { symbols: ['ppm'], unit: '1', prefixed: false, exponent: -6 },
];

/** Every spelling, prefixed ones included. */
export const spellings: ReadonlyMap<string, Spelling> = new Map(
  rows.flatMap((row) =>
    row.symbols.flatMap((symbol) =>
      prefixes
        .filter((prefix) => row.prefixed || prefix.exponent === 0)
        .flatMap((prefix) =>
          prefix.symbols.map((letter): [string, Spelling] => [
            letter + symbol,
            {
              unit: row.unit,
              exponent: (row.exponent ?? 0) + prefix.exponent,
              factor: row.factor ?? 1,
              offset: row.offset ?? 0,
            },
          ]),
        ),
    ),
  ),
);

/** The right spelling of a unit that differs only in case or in a long word: `khz`, `Kohm`, `microfarad`. */
export function suggestSpelling(written: string, wanted: Unit): string | undefined {
  const lower = written.toLowerCase();
  const named = longNames.find(([name]) => lower.endsWith(name) || lower.endsWith(`${name}s`));
  const prefix = longPrefixes.find(([name]) => lower.startsWith(name));
  const middle = written.slice(prefix?.[0].length ?? 0, named ? lower.lastIndexOf(named[0]) : undefined);
  const short = (prefix?.[1] ?? '') + middle + (named?.[1] ?? '');
  const alike = [...spellings].filter(
    ([spelling, { unit }]) => unit === wanted && spelling.toLowerCase() === short.toLowerCase(),
  );
  // `MHZ` may be milli or mega by its letters alone: the one that changes fewest letters is meant.
  const kept = (spelling: string) => [...spelling].filter((letter, index) => letter === short[index]).length;
  return alike.map(([spelling]) => spelling).sort((a, b) => kept(b) - kept(a))[0];
}

const longPrefixes: readonly (readonly [string, string])[] = [
  ['pico', 'p'],
  ['nano', 'n'],
  ['micro', 'u'],
  ['milli', 'm'],
  ['kilo', 'k'],
  ['mega', 'M'],
  ['giga', 'G'],
];

const longNames: readonly (readonly [string, string])[] = [
  ['volt', 'V'],
  ['ampere', 'A'],
  ['amp', 'A'],
  ['farad', 'F'],
  ['henry', 'H'],
  ['hertz', 'Hz'],
  ['second', 's'],
  ['sec', 's'],
  ['minute', 'min'],
  ['hour', 'h'],
  ['watt', 'W'],
  ['kelvin', 'K'],
  ['celsius', 'degC'],
];
