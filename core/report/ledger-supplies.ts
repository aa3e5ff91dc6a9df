/**
 * The ledger's table of supplies: what the board draws from each, over its modes, against what it may give.
 */
import type { BoardAnalysis, SupplyResult } from '../analysis/types';
import { formatBand, formatQuantity } from '../quantity/write';
import { useCells } from './ledger-pins';
import type { Palette } from './paint';
import { type Cell, type Column, tableLines } from './table';

const columns: readonly Column[] = [
  { head: 'supply', align: 'left' },
  { head: 'voltage', align: 'right' },
  { head: 'least', align: 'right', spare: 1 },
  { head: 'average', align: 'right' },
  { head: 'most', align: 'right' },
  { head: 'limit', align: 'right' },
  { head: 'use', align: 'right' },
  { head: '', align: 'left', spare: 2 },
  { head: 'power', align: 'right' },
];

export function supplySection(analysis: BoardAnalysis, palette: Palette, width: number): readonly string[] {
  const results = [...analysis.supplies.values()];
  if (results.length === 0) return [];
  const rows = results.map((result) => rowOf(result, palette));
  return [palette.heading('Supplies'), ...tableLines(columns, rows, palette.faint, width)];
}

function rowOf(
  { supply, voltage, current, limit, use, power }: SupplyResult,
  palette: Palette,
): readonly Cell[] {
  const moves = current !== null && current.min !== current.max;
  return [
    { text: supply.name, paint: palette.strong },
    { text: voltage ? formatBand(voltage, 'V') : '' },
    { text: moves ? formatQuantity(current.min, 'A') : '' },
    { text: current ? formatQuantity(current.typical, 'A') : '?' },
    { text: moves ? formatQuantity(current.max, 'A') : '' },
    { text: limit ? formatQuantity(limit.min, 'A') : '' },
    ...useCells(use, palette),
    { text: power === null ? '' : formatQuantity(power, 'W') },
  ];
}
