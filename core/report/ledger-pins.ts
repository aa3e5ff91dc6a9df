/**
 * The ledger's table of pins, port groups and chips: worst mode, typical values, against the data sheet.
 */
import type { BoardAnalysis, PinResult } from '../analysis/types';
import { formatPercent, formatQuantity } from '../quantity/write';
import { useBar } from './bar';
import type { Palette } from './paint';
import { type Cell, type Column, tableLines } from './table';

const columns: readonly Column[] = [
  { head: 'pin', align: 'left' },
  { head: 'source', align: 'right' },
  { head: 'sink', align: 'right' },
  { head: 'rms', align: 'right' },
  { head: 'peak', align: 'right' },
  { head: 'limit', align: 'right' },
  { head: 'use', align: 'right' },
  { head: '', align: 'left', spare: 2 },
  { head: 'drives', align: 'left', spare: 1 },
];

export function pinSection(analysis: BoardAnalysis, palette: Palette, width: number): readonly string[] {
  const rows = [
    ...[...analysis.pins.values()].map((pin) => pinRow(pin, palette)),
    // A group limits one way or both; the other way is no business of it.
    ...[...analysis.groups.values()].map(({ key, source, sink, sourceLimit, sinkLimit, use }) =>
      sumRow(
        key,
        sourceLimit === null ? null : source,
        sinkLimit === null ? null : sink,
        use,
        limitOf(sourceLimit, sinkLimit),
        palette,
      ),
    ),
    ...[...analysis.chips.values()]
      .filter((chip) => chip.sourceTotal > 0 || chip.sinkTotal > 0)
      .map(({ chip, data, sourceTotal, sinkTotal, use }) =>
        sumRow(
          `${chip.name}, all pins`,
          sourceTotal,
          sinkTotal,
          use,
          limitOf(data?.total.source, data?.total.sink),
          palette,
        ),
      ),
  ];
  if (rows.length === 0) return [];
  return [palette.heading('Pins'), ...tableLines(columns, rows, palette.faint, width)];
}

function pinRow(pin: PinResult, palette: Palette): readonly Cell[] {
  const peak = pin.peakSource === null ? null : Math.max(pin.peakSource, pin.peakSink ?? 0);
  return [
    { text: pin.key, paint: palette.strong },
    amps(pin.sourceAverage),
    amps(pin.sinkAverage),
    amps(pin.rms),
    amps(peak),
    amps(pin.limit?.typical ?? null),
    ...useCells(pin.use, palette),
    { text: pin.drives.join(', '), paint: palette.faint },
  ];
}

function sumRow(
  name: string,
  source: number | null,
  sink: number | null,
  use: number | null,
  limit: number | null,
  palette: Palette,
): readonly Cell[] {
  return [
    { text: name },
    amps(source),
    amps(sink),
    { text: '' },
    { text: '' },
    amps(limit),
    ...useCells(use, palette),
    { text: '' },
  ];
}

interface Limit {
  readonly typical: number;
}

function limitOf(source: Limit | null | undefined, sink: Limit | null | undefined): number | null {
  return source?.typical ?? sink?.typical ?? null;
}

function amps(value: number | null): Cell {
  return { text: value === null ? '' : formatQuantity(value, 'A') };
}

/** Percent and bar, in one colour. */
export function useCells(use: number | null, palette: Palette): readonly Cell[] {
  if (use === null) return [{ text: '' }, { text: '' }];
  const paint = use > 1 ? palette.bad : use > 0.8 ? palette.close : palette.good;
  return [
    { text: formatPercent(use, 2), paint },
    { text: useBar(use), paint },
  ];
}
