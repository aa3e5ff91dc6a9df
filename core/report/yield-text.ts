/**
 * A Monte Carlo run for a terminal: the yield of the board, of each rail, and what moves it.
 */
import type { RailYield, YieldResult } from '../analysis/yield-result';
import type { LedgerOptions } from './ledger';
import type { Paint, Palette } from './paint';
import { type Cell, tableLines } from './table';
import {
  becauseWords,
  boardWords,
  confidenceWords,
  headWords,
  leadingWords,
  spreadTables,
  type YieldTable,
  yieldTable,
} from './yield-words';

/** Ends in a line break. */
export function yieldText(result: YieldResult, { palette, width }: LedgerOptions): string {
  const paint = stateOf(result.outcome, palette).paint;
  const moves = leadingWords(result).map(({ rail, words }) => `  ${palette.strong(rail)}: ${words}`);
  const rails = yieldTable(result);
  const sections = [
    [
      `${palette.strong(`Yield of ${result.board ?? 'a board without a title'}`)}  ${palette.faint(result.file)}`,
      headWords(result),
      paint(boardWords(result)),
    ],
    [
      ...table(rails, palette, width, (row) => stateOf(result.rails[row]?.outcome ?? null, palette)),
      ...becauseWords(result.rails).map((line) => palette.faint(`  ${line}`)),
    ],
    ...spreadTables(result).map((spread) => table(spread, palette, width)),
    moves.length === 0 ? [] : [palette.heading('What the voltage goes with (correlation)'), ...moves],
    [palette.heading('How sure'), ...confidenceWords(result).map((line) => `  ${line}`)],
  ];
  return `${sections
    .filter((section) => section.length > 0)
    .map((section) => section.join('\n'))
    .join('\n\n')}\n`;
}

interface State {
  readonly mark: string;
  readonly paint: Paint;
}

function stateOf(outcome: RailYield['outcome'], palette: Palette): State {
  if (!outcome) return { mark: '', paint: palette.faint };
  if (outcome.missed + outcome.unsolved > 0) return { mark: '✗', paint: palette.bad };
  return { mark: '✓', paint: palette.good };
}

function table(
  { title, columns, rows }: YieldTable,
  palette: Palette,
  width: number,
  state?: (row: number) => State,
): readonly string[] {
  if (rows.length === 0) return [];
  const cells = rows.map((row, k): readonly Cell[] => {
    const { mark, paint } = state?.(k) ?? { mark: '', paint: palette.strong };
    return [
      { text: mark, paint },
      ...row.map((text, c) => (c === 0 ? { text, paint: palette.strong } : { text })),
    ];
  });
  const all = [{ head: '', align: 'left' } as const, ...columns];
  return [palette.heading(title), ...tableLines(all, cells, palette.faint, width)];
}
