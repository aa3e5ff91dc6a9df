/**
 * The ledger's table of supplies: what the board draws from each, over its modes, against what it may give.
 */
import { chargeWords, endWords, lifeWords } from '../analysis/battery-words';
import { isGap } from '../analysis/gap';
import type { BoardAnalysis, SupplyResult } from '../analysis/types';
import { formatBand, formatDuration, formatQuantity } from '../quantity/write';
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
  return [
    palette.heading('Supplies'),
    ...tableLines(columns, rows, palette.faint, width),
    ...results.flatMap((result) => lifeLines(result, palette)),
  ];
}

/** How long a battery lasts, what ends it and where its charge comes from: too many words for a column. */
function lifeLines({ supply, life }: SupplyResult, palette: Palette): readonly string[] {
  const found = life?.();
  if (!found) return [];
  const name = palette.strong(supply.name);
  if (isGap(found))
    return [palette.faint(`  how long ${supply.name} lasts is not computed: ${found.because}`)];
  const { typical, least } = found;
  const needed = supply.life?.min ?? 0;
  const paint =
    typical.seconds < needed
      ? palette.bad
      : (least?.seconds ?? needed) < needed
        ? palette.close
        : palette.good;
  const worst = least && lifeWords(least) !== lifeWords(typical) ? `, ${lifeWords(least)} at worst` : '';
  const wanted = supply.life ? `, ${formatDuration(supply.life.min)} needed` : '';
  return [
    `  ${name} lasts ${paint(lifeWords(typical))}${worst}${wanted}`,
    palette.faint(`    until ${endWords(found, typical)}`),
    palette.faint(`    ${chargeWords(found, typical)}`),
  ];
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
