/**
 * SI prefixes that occur in the trade, as powers of ten.
 * Source: BIPM, The International System of Units (SI), 9th edition, table 7 (from memory: confirm).
 */

export interface Prefix {
  /** First spelling is the one that is written. */
  readonly symbols: readonly string[];
  readonly exponent: number;
}

/** The micro sign U+00B5, the Greek letter U+03BC and a plain u are one prefix. */
export const prefixes: readonly Prefix[] = [
  { symbols: ['f'], exponent: -15 },
  { symbols: ['p'], exponent: -12 },
  { symbols: ['n'], exponent: -9 },
  { symbols: ['\u00b5', '\u03bc', 'u'], exponent: -6 },
  { symbols: ['m'], exponent: -3 },
  { symbols: [''], exponent: 0 },
  { symbols: ['k'], exponent: 3 },
  { symbols: ['M'], exponent: 6 },
  { symbols: ['G'], exponent: 9 },
  { symbols: ['T'], exponent: 12 },
];

/**
 * `digits` (a plain decimal, perhaps with its own exponent) times a power of ten, rounded once: going through
 * text makes `0.1 µ` the same double as `100 n`.
 */
export function scaleDecimal(digits: string, exponent: number): number {
  const [mantissa = '', own = '0'] = digits.toLowerCase().split('e');
  return Number(`${mantissa}e${Number(own) + exponent}`);
}
