/**
 * Small pictures of plain characters: how much of a limit is used, and where a rail sits in its window.
 */
import type { Band } from '../quantity/figure';

/** `██████░░░░` of `width`; more than the limit fills it and ends in `▶`. */
export function useBar(use: number, width = 10): string {
  if (!Number.isFinite(use)) return '';
  if (use > 1) return `${'█'.repeat(width - 1)}▶`;
  const filled = Math.round(Math.max(0, use) * width);
  return '█'.repeat(filled) + '░'.repeat(width - filled);
}

/**
 * `··[──●──]··`: the needed window in brackets, the rail's band as a line and its typical value as a point, from
 * the smaller to the larger number.
 */
export function windowStrip(window: Band, rail: Band, width = 13): string {
  const span = Math.max(window.max - window.min, Number.MIN_VALUE);
  // The window takes the middle half; a rail far outside runs to the edge.
  const from = window.min - span / 2;
  const place = (value: number) =>
    Math.min(width - 1, Math.max(0, Math.round(((value - from) / (2 * span)) * (width - 1))));
  const cells = Array.from({ length: width }, () => '·');
  for (let k = place(rail.min); k <= place(rail.max); k++) cells[k] = '─';
  cells[place(window.min)] = '[';
  cells[place(window.max)] = ']';
  cells[place(rail.typical)] = '●';
  return cells.join('');
}
