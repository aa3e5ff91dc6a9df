/**
 * Columns of a terminal table: widths from the plain text, colour put on afterwards, two blanks between columns.
 */
import type { Paint } from './paint';

export interface Cell {
  readonly text: string;
  readonly paint?: Paint;
}

export interface Column {
  readonly head: string;
  readonly align: 'left' | 'right';
  /** Left out when the table is too wide, the largest number first; without one it stays. */
  readonly spare?: number;
}

/**
 * Lines without trailing blanks; columns in which every cell is empty are left out, their heads too, and spare ones
 * until the table fits into `width` characters. Cells paint their own text only, so that colour never covers padding.
 */
export function tableLines(
  columns: readonly Column[],
  rows: readonly (readonly Cell[])[],
  headPaint: Paint,
  width: number,
): readonly string[] {
  const measured = columns
    .map((column, place) => ({
      ...column,
      place,
      width: Math.max(visible(column.head), ...rows.map((row) => visible(textOf(row, place)))),
    }))
    .filter(({ place }) => rows.some((row) => textOf(row, place) !== ''));
  const shown = fitting(measured, width);
  const line = (cellAt: (column: Measured) => Cell) =>
    `${indent}${shown.map((column) => padded(cellAt(column), column)).join(gap)}`.trimEnd();
  return [
    line(({ head }) => ({ text: head, paint: headPaint })),
    ...rows.map((row) => line(({ place }) => row[place] ?? { text: '' })),
  ];
}

const indent = '  ';
const gap = '  ';

interface Measured extends Column {
  readonly place: number;
  readonly width: number;
}

function fitting(columns: readonly Measured[], width: number): readonly Measured[] {
  const total = columns.reduce((sum, column) => sum + column.width + gap.length, indent.length - gap.length);
  const droppable = columns.filter(({ spare }) => spare !== undefined);
  if (total <= width || droppable.length === 0) return columns;
  const first = droppable.reduce((a, b) => ((b.spare ?? 0) > (a.spare ?? 0) ? b : a));
  return fitting(
    columns.filter((column) => column !== first),
    width,
  );
}

function padded({ text, paint }: Cell, { width, align }: Measured): string {
  const padding = ' '.repeat(Math.max(0, width - visible(text)));
  const painted = paint === undefined ? text : paint(text);
  return align === 'right' ? padding + painted : painted + padding;
}

function textOf(row: readonly Cell[], k: number): string {
  return row[k]?.text ?? '';
}

/** Columns on the screen; what the ledger prints has no wide characters but names from the file may have marks. */
function visible(text: string): number {
  return [...text.normalize('NFC')].length;
}
