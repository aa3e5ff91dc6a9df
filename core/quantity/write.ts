/**
 * Writes figures for people: engineering notation with an SI prefix and three significant digits, never an
 * exponent. What is written here can be read back.
 */
import type { Band, Unit } from './figure';

/** Prefixes that the trade uses for each unit; capacitances stay in microfarad above a thousand. */
const writtenPrefixes: Readonly<Record<Unit, string>> = {
  V: 'nµm k',
  A: 'fpnµm ',
  ohm: 'm kMGT',
  F: 'fpnµ',
  H: 'nµm ',
  Hz: 'm kMG',
  s: 'pnµm ',
  K: ' ',
  W: 'pnµm k',
  C: 'fpnµm ',
  'K/W': ' ',
  S: 'nµm k',
  '1': ' ',
};

const exponents: Readonly<Record<string, number>> = {
  f: -15,
  p: -12,
  n: -9,
  µ: -6,
  m: -3,
  ' ': 0,
  k: 3,
  M: 6,
  G: 9,
  T: 12,
};

/**
 * `value` in SI units. Temperatures come out in degC, charges from 3.6 C upward in mAh or Ah.
 * `formatQuantity(4700, 'ohm')` is `4.7 kohm`.
 */
export function formatQuantity(value: number, unit: Unit, digits = 3): string {
  const scale = scaleFor(value, unit, digits);
  return `${scaled(value, scale, digits)}${scale.symbol}`;
}

/** `7.9..8.43..8.8 V`; one figure when the band has no width, two when typical is the middle. */
export function formatBand(band: Band, unit: Unit, digits = 3): string {
  const largest = Math.max(Math.abs(band.min), Math.abs(band.max));
  const scale = scaleFor(unit === 'K' ? band.typical : largest, unit, digits);
  const [min = '', typical = '', max = ''] = [band.min, band.typical, band.max].map((value) =>
    scaled(value, scale, digits),
  );
  if (min === max) return `${typical}${scale.symbol}`;
  const middle = scaled((band.min + band.max) / 2, scale, digits);
  const figures = typical === middle ? [min, max] : [min, typical, max];
  return `${figures.join('..')}${scale.symbol}`;
}

/** A share as percent: `0.52` is `52 %`. */
export function formatPercent(share: number, digits = 3): string {
  return `${rounded(share * 100, digits)} %`;
}

/** A span of time in the unit that people count it in: `3.2 ms`, `14 h`, `74.2 days`, `5.1 years`. */
export function formatDuration(seconds: number, digits = 3): string {
  const size = Math.abs(seconds);
  if (size < 120) return formatQuantity(seconds, 's', digits);
  if (size < 7200) return `${rounded(seconds / 60, digits)} min`;
  if (size < 48 * 3600) return `${rounded(seconds / 3600, digits)} h`;
  if (size < 2 * 365.25 * 86400) return `${rounded(seconds / 86400, digits)} days`;
  return `${rounded(seconds / (365.25 * 86400), digits)} years`;
}

interface Scale {
  readonly exponent: number;
  readonly factor: number;
  readonly offset: number;
  /** Blank and unit, ready to append. */
  readonly symbol: string;
}

function scaleFor(value: number, unit: Unit, digits: number): Scale {
  if (unit === '1') return { exponent: 0, factor: 1, offset: 0, symbol: '' };
  if (unit === 'K') return { exponent: 0, factor: 1, offset: -273.15, symbol: ' degC' };
  const inAmpereHours = unit === 'C' && Math.abs(value) >= 3.6;
  const factor = inAmpereHours ? 1 / 3600 : 1;
  const letters = inAmpereHours ? 'm ' : writtenPrefixes[unit];
  // A battery of 1200 mAh is never called 1.2 Ah on its label; from 10 Ah on it is.
  const turn = inAmpereHours ? 10_000 : 1000;
  const size = Math.abs(roundTo(value * factor, digits));
  let chosen = value === 0 || !Number.isFinite(value) ? ' ' : (letters[0] ?? ' ');
  for (const letter of Number.isFinite(value) ? letters : '') {
    const step = 10 ** (exponents[letter] ?? 0);
    const start = inAmpereHours && letter === ' ' ? turn / 1000 : 1;
    if (size >= step * start * (1 - 1e-12)) chosen = letter;
  }
  const prefix = chosen === ' ' ? '' : chosen;
  const exponent = exponents[chosen] ?? 0;
  return { exponent, factor, offset: 0, symbol: ` ${prefix}${inAmpereHours ? 'Ah' : unit}` };
}

function scaled(value: number, scale: Scale, digits: number): string {
  const shown = (value * scale.factor + scale.offset) / 10 ** scale.exponent;
  // Degrees count from the ice point, so that digits after the first decimal are never meant.
  return scale.offset === 0 ? rounded(shown, digits) : String(Number(shown.toFixed(1)) + 0);
}

function rounded(value: number, digits: number): string {
  if (!Number.isFinite(value)) return Number.isNaN(value) ? '?' : value > 0 ? '∞' : '-∞';
  const short = roundTo(value, digits);
  const text = String(short);
  if (!text.includes('e')) return Object.is(short, -0) ? '0' : text;
  return Math.abs(short) < 1 ? short.toFixed(20).replace(/\.?0+$/, '') : BigInt(Math.round(short)).toString();
}

function roundTo(value: number, digits: number): number {
  return Number.isFinite(value) ? Number(value.toPrecision(digits)) : value;
}
