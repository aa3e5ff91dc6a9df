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
}

/**
 * Lines without trailing blanks; columns in which every cell is empty are left out, their heads too. Cells paint
 * their own text only, so that colour never covers padding.
 */
export function tableLines(
  columns: readonly Column[],
  rows: readonly (readonly Cell[])[],
  headPaint: Paint,
  indent = '  ',
): readonly string[] {
  const used = columns
    .map((column, k) => ({ column, k }))
    .filter(({ k }) => rows.some((row) => textOf(row, k) !== ''));
  const width = ({ column, k }: { column: Column; k: number }) =>
    Math.max(visible(column.head), ...rows.map((row) => visible(textOf(row, k))));
  const widths = used.map(width);
  const line = (cellAt: (k: number, column: Column) => Cell) =>
    (
      indent +
      used
        .map(({ column, k }, place) => {
          const { text, paint } = cellAt(k, column);
          const padding = ' '.repeat(Math.max(0, (widths[place] ?? 0) - visible(text)));
          const painted = paint === undefined ? text : paint(text);
          return column.align === 'right' ? padding + painted : painted + padding;
        })
        .join('  ')
    ).trimEnd();
  return [
    line((_, column) => ({ text: column.head, paint: headPaint })),
    ...rows.map((row) => line((k) => row[k] ?? { text: '' })),
  ];
}

function textOf(row: readonly Cell[], k: number): string {
  return row[k]?.text ?? '';
}

/** Columns on the screen; what the ledger prints has no wide characters but names from the file may have marks. */
function visible(text: string): number {
  return [...text.normalize('NFC')].length;
}
