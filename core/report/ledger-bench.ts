/**
 * The ledger's table of bench entries: what was measured, what is predicted at the same load, and what would explain
 * the difference.
 */

import { bandWords, benchLoad, deviationWords, explanationWords } from '../analysis/bench-words';
import type { BenchResult, BoardAnalysis } from '../analysis/types';
import { formatBand, formatQuantity } from '../quantity/write';
import type { Palette } from './paint';
import { type Cell, type Column, tableLines } from './table';

const columns: readonly Column[] = [
  { head: '', align: 'left' },
  { head: 'rail', align: 'left' },
  { head: 'load', align: 'right' },
  { head: '', align: 'left' },
  { head: 'measured', align: 'right' },
  { head: 'predicted', align: 'right' },
  { head: 'deviation', align: 'left' },
  { head: 'verdict', align: 'left' },
];

export function benchSection(analysis: BoardAnalysis, palette: Palette, width: number): readonly string[] {
  const results = analysis.bench();
  if (results.length === 0) return [];
  const rows = results.flatMap((result) => rowsOf(result, palette));
  const notes = results.flatMap((result) => notesOf(result).map((note) => palette.faint(`  ${note}`)));
  return [palette.heading('Bench'), ...tableLines(columns, rows, palette.faint, width), ...notes];
}

/** One row for the voltage and one for the ripple, as far as they were measured. */
function rowsOf(result: BenchResult, palette: Palette): readonly (readonly Cell[])[] {
  const { point } = result;
  const rail: Cell = { text: point.rail?.name ?? '?', paint: palette.strong };
  return (['voltage', 'ripple'] as const).flatMap((target) => {
    const figure = point[target];
    if (!figure) return [];
    const comparison = result[target];
    const first = target === 'voltage' || !point.voltage;
    const inside = comparison?.outside === 0;
    const paint = comparison ? (inside ? palette.good : palette.close) : palette.faint;
    return [
      [
        { text: comparison ? (inside ? '✓' : '!') : '', paint },
        first ? rail : { text: '' },
        { text: first ? (benchLoad(result) ?? '?') : '' },
        { text: target === 'ripple' ? 'ripple' : '', paint: palette.faint },
        { text: formatQuantity(figure.typical, 'V') },
        { text: comparison ? formatBand(comparison.predicted, 'V') : '?' },
        { text: comparison ? deviationWords(comparison).replace(' prediction', '') : '' },
        { text: comparison ? bandWords(comparison) : 'not compared', paint },
      ],
    ];
  });
}

/** Lines beneath the table, as long as they need to be. */
function notesOf(result: BenchResult): readonly string[] {
  const { point, because, explanation } = result;
  const name = `${point.rail?.name ?? '?'} at ${benchLoad(result) ?? '?'}`;
  if (because !== undefined) return [`${name} is not compared: ${because}`];
  return explanationWords(explanation?.() ?? nothing).map((sentence) => `${name}: ${sentence}`);
}

const nothing = { moves: [], together: false, all: null, beyond: [] };
