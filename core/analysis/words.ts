/**
 * Phrases about computed results that checks and cards share, so that a number is never worded in two ways.
 */
import type { Origin } from '../quantity/figure';
import { formatQuantity } from '../quantity/write';
import type { CornerEnd, CornerSetting } from './types';

/**
 * `lowest ambient (-20 degC), highest mcu.GP15 high resistance (75 ohm)`: the most influential settings, with
 * `mainly` before them where others are left out; empty when nothing has a band.
 */
export function cornerWords(end: CornerEnd, most = 3): string {
  const shown = end.settings.slice(0, most).map(settingWords).join(', ');
  return end.settings.length > most ? `mainly ${shown}` : shown;
}

export function settingWords({ label, value, unit, end }: CornerSetting): string {
  return `${end} ${label} (${formatQuantity(value, unit)})`;
}

/** A small difference of voltages, written so that it never reads as zero: `82 mV`, `0.37 V`. */
export function volts(difference: number): string {
  const size = Math.abs(difference);
  return size >= 0.1 && size < 1 ? `${Number(size.toFixed(2))} V` : formatQuantity(size, 'V', 2);
}

/** ` in mode active`, or nothing on a board without modes. */
export function inMode(mode: string | undefined): string {
  return mode === undefined ? '' : ` in mode ${mode}`;
}

/** Where a figure comes from, on one line. */
export function originWords({ kind, note, conditions }: Origin): string {
  return [kind, note, conditions].filter((part) => part !== undefined && part !== '').join('; ');
}
