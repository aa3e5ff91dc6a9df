/**
 * Letter codes of IEC 60062: the letter stands for the decimal mark and the multiplier (`4k7`, `R47`, `100n`),
 * a second letter may give the tolerance (`4k7J`). All values here are from memory: confirm.
 * Inductors and voltages (`3V3`) written the same way are common practice.
 */
import type { Band, Unit } from './figure';
import { exactly } from './figure';
import { scaleDecimal } from './prefix';

/** Exponents of ten behind each letter, by the field's unit. */
export const codeLetters: Partial<Readonly<Record<Unit, Readonly<Record<string, number>>>>> = {
  ohm: { L: -3, R: 0, k: 3, K: 3, M: 6, G: 9, T: 12 },
  F: { p: -12, n: -9, u: -6, '\u00b5': -6, '\u03bc': -6, m: -3, F: 0 },
  H: { n: -9, u: -6, '\u00b5': -6, '\u03bc': -6, m: -3, H: 0 },
  V: { V: 0 },
};

/** Percent below and above the nominal value. */
export const toleranceLetters: Readonly<Record<string, readonly [below: number, above: number]>> = {
  E: [0.005, 0.005],
  L: [0.01, 0.01],
  P: [0.02, 0.02],
  W: [0.05, 0.05],
  B: [0.1, 0.1],
  C: [0.25, 0.25],
  D: [0.5, 0.5],
  F: [1, 1],
  G: [2, 2],
  J: [5, 5],
  K: [10, 10],
  M: [20, 20],
  N: [30, 30],
  Q: [10, 30],
  T: [10, 50],
  S: [20, 50],
  Z: [20, 80],
};

/** Below 10 pF the same letters count in picofarad. */
export const smallCapacitorLetters: Readonly<Record<string, number>> = {
  B: 0.1,
  C: 0.25,
  D: 0.5,
  F: 1,
  G: 2,
};

export interface LetterCode {
  readonly band: Band;
  readonly toleranceGiven: boolean;
  /** The same value as number, prefix and unit would be clearer: the last letter may be a unit or a tolerance. */
  readonly ambiguous: boolean;
}

/** Reads a whole word; undefined when it is no letter code of this unit. */
export function readLetterCode(word: string, unit: Unit): LetterCode | undefined {
  const letters = codeLetters[unit];
  const parts = /^(\d*)(\D)(\d*)([A-Z]?)$/u.exec(word);
  if (!letters || !parts) return undefined;
  const [, whole = '', letter = '', fraction = '', tolerance = ''] = parts;
  const exponent = Object.hasOwn(letters, letter) ? letters[letter] : undefined;
  if (exponent === undefined || whole + fraction === '') return undefined;
  const value = scaleDecimal(`${whole || '0'}.${fraction || '0'}`, exponent);
  if (!Number.isFinite(value)) return undefined;
  if (tolerance === '') return { band: exactly(value), toleranceGiven: false, ambiguous: false };
  const band = withTolerance(value, tolerance, unit);
  return band && { band, toleranceGiven: true, ambiguous: tolerance === unit };
}

function withTolerance(value: number, letter: string, unit: Unit): Band | undefined {
  if (unit === 'F' && value < 10e-12 && Object.hasOwn(smallCapacitorLetters, letter)) {
    const deviation = (smallCapacitorLetters[letter] ?? 0) * 1e-12;
    return { min: value - deviation, typical: value, max: value + deviation };
  }
  const share = Object.hasOwn(toleranceLetters, letter) ? toleranceLetters[letter] : undefined;
  if (!share) return undefined;
  return { min: value * (1 - share[0] / 100), typical: value, max: value * (1 + share[1] / 100) };
}
