/**
 * Short ways to write figures of the catalogue with an honest origin. Data sheets mostly print one guaranteed
 * limit; the rules that turn such a limit into a band stand here once, so that every part uses the same ones.
 */
import { type Band, type Figure, figure, type Origin, type Unit } from '../quantity/figure';
import type { OpenPoint, ResistancePoint, TestPoint } from './part';

/** Share of a guaranteed output drop that a typical part shows at 25 degC, and the share of the best part. */
export const typicalShare = 0.5;
export const bestShare = 0.35;

export function dataSheet(note: string, conditions?: string): Origin {
  return conditions === undefined ? { kind: 'data sheet', note } : { kind: 'data sheet', note, conditions };
}

export function standard(note: string, conditions?: string): Origin {
  return conditions === undefined ? { kind: 'standard', note } : { kind: 'standard', note, conditions };
}

export function practice(note: string): Origin {
  return { kind: 'common practice', note };
}

export function derived(note: string): Origin {
  return { kind: 'derived', note };
}

/** Remembered, not read again for this catalogue: someone with the paper at hand should confirm it. */
export function memory(note: string, conditions?: string): Origin {
  return conditions === undefined
    ? { kind: 'from memory: confirm', note }
    : { kind: 'from memory: confirm', note, conditions };
}

export function band(min: number, typical: number, max: number, unit: Unit, origin: Origin): Figure {
  return figure({ min, typical, max }, unit, origin);
}

export function exact(value: number, unit: Unit, origin: Origin): Figure {
  return figure(value, unit, origin);
}

/**
 * A line of an output table for the low level.
 * `limitV`: the guaranteed largest voltage at `currentA` and `supplyV`; the rest of the band follows the shares.
 */
export function lowPoint(currentA: number, limitV: number, supplyV: number, origin: Origin): TestPoint {
  return pointFromDrops(currentA, supplyV, spread(limitV), 'low', origin);
}

/**
 * A line of an output table for the high level.
 * `limitV`: the guaranteed smallest voltage at `currentA` and `supplyV`, measured from ground.
 */
export function highPoint(currentA: number, limitV: number, supplyV: number, origin: Origin): TestPoint {
  return pointFromDrops(currentA, supplyV, spread(supplyV - limitV), 'high', origin);
}

/** As above where the data sheet prints the whole band of drops (V between the pin and its rail). */
export function pointFromDrops(
  currentA: number,
  supplyV: number,
  drop: Band,
  level: 'high' | 'low',
  origin: Origin,
): TestPoint {
  const voltage =
    level === 'low'
      ? drop
      : { min: supplyV - drop.max, typical: supplyV - drop.typical, max: supplyV - drop.min };
  return {
    current: exact(currentA, 'A', origin),
    voltage: figure(voltage, 'V', origin),
    supply: exact(supplyV, 'V', origin),
  };
}

/** Open voltages of a cell in equal steps of its charge, from full to empty. */
export function openCurve(volts: readonly number[], origin: Origin): readonly OpenPoint[] {
  const steps = volts.length - 1;
  return volts.map((value, k) => ({ left: (steps - k) / steps, volts: exact(value, 'V', origin) }));
}

/** Resistance of a cell by its charge left: `[left, min, typical, max]`, ohm, from full to empty. */
export function resistanceCurve(
  rows: readonly (readonly [left: number, min: number, typical: number, max: number])[],
  origin: Origin,
): readonly ResistancePoint[] {
  return rows.map(([left, min, typical, max]) => ({ left, ohms: band(min, typical, max, 'ohm', origin) }));
}

/** Milliampere-hours as the labels of cells print them, in coulomb. */
export function milliampereHours(min: number, typical: number, max: number, origin: Origin): Figure {
  return band(3.6 * min, 3.6 * typical, 3.6 * max, 'C', origin);
}

/** Origin of a printed limit whose typical value is filled in by the shares above. */
export function limitOf(sheet: Origin): Origin {
  const note = `${sheet.note}; the limit is the worst case, typical taken as half of the drop (common practice)`;
  return sheet.conditions === undefined
    ? { kind: sheet.kind, note }
    : { kind: sheet.kind, note, conditions: sheet.conditions };
}

function spread(limit: number): Band {
  return { min: bestShare * limit, typical: typicalShare * limit, max: limit };
}
