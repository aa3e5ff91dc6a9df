/**
 * The ledger's table of rails: what each reaches over tolerance and temperature, against what it needs.
 */

import { swingMissOf, swingNeedOf } from '../analysis/swing-need';
import type { BoardAnalysis, RailResult } from '../analysis/types';
import { missOf } from '../analysis/window';
import { formatPercent, formatQuantity } from '../quantity/write';
import { windowStrip } from './bar';
import type { Paint, Palette } from './paint';
import { type Cell, type Column, tableLines } from './table';

const columns: readonly Column[] = [
  { head: '', align: 'left' },
  { head: 'rail', align: 'left' },
  { head: 'low V', align: 'right' },
  { head: 'typ V', align: 'right' },
  { head: 'high V', align: 'right' },
  { head: 'needs V', align: 'left' },
  { head: '[window]', align: 'left', spare: 2 },
  { head: 'spare', align: 'right' },
  { head: 'ripple', align: 'right' },
  { head: 'load', align: 'right' },
  { head: 'eff.', align: 'right', spare: 1 },
  { head: 'from', align: 'left', spare: 3 },
];

export function railSection(analysis: BoardAnalysis, palette: Palette, width: number): readonly string[] {
  const results = [...analysis.rails.values()];
  if (results.length === 0) return [];
  const rows = results.map((result) => rowOf(result, palette));
  const because = results.flatMap(({ rail, voltage, because: reason }) =>
    voltage === null && reason !== undefined
      ? [palette.faint(`  ${rail.name} is not computed: ${reason}`)]
      : [],
  );
  return [palette.heading('Rails'), ...tableLines(columns, rows, palette.faint, width), ...because];
}

function rowOf(result: RailResult, palette: Palette): readonly Cell[] {
  const { rail, voltage, ripple, headroom, efficiency, pump } = result;
  const needed = rail.needs?.voltage;
  const state = stateOf(result);
  const paint = { good: palette.good, close: palette.close, bad: palette.bad, neutral: palette.faint }[state];
  const mark = { good: '✓', close: '!', bad: '✗', neutral: '' }[state];
  const current = pump?.heaviest.loadCurrent ?? result.current;
  const rippleAllowed = rail.needs?.ripple?.max;
  const noisy = ripple && rippleAllowed !== undefined && ripple.max > rippleAllowed;
  return [
    { text: mark, paint },
    { text: rail.name, paint: palette.strong },
    ...(voltage === null ? [empty, { text: '?', paint: palette.faint }, empty] : three(voltage)),
    { text: needed ? windowWords(needed) : signalWords(result) },
    needed && voltage && needed.min < needed.max ? { text: windowStrip(needed, voltage), paint } : empty,
    headroom === null ? empty : { text: formatQuantity(headroom, 'V', 2), paint },
    ripple === null || pump === undefined
      ? empty
      : {
          text: formatQuantity(pump.heaviest.ripple, 'V', 2),
          ...(noisy ? { paint: noisyPaint(pump.heaviest.ripple > rippleAllowed, palette) } : {}),
        },
    { text: current === null ? '' : formatQuantity(current, 'A') },
    { text: efficiency === null ? '' : formatPercent(efficiency, 2) },
    { text: fromOf(result), paint: palette.faint },
  ];
}

const empty: Cell = { text: '' };

function noisyPaint(typical: boolean, palette: Palette): Paint {
  return typical ? palette.bad : palette.close;
}

function three({ min, typical, max }: { min: number; typical: number; max: number }): readonly Cell[] {
  const [low, middle, high] = [min, typical, max].map(plainVolts);
  // A band without width says the same thing three times.
  if (min === max) return [empty, { text: middle ?? '' }, empty];
  return [{ text: low ?? '' }, { text: middle ?? '' }, { text: high ?? '' }];
}

/** Three digits and always as many of them, so that the points of a column stand beneath each other. */
function plainVolts(value: number): string {
  return Math.abs(value) < 1000 ? value.toPrecision(3) : String(Math.round(value));
}

/** One figure asks for at least that much, in magnitude. */
function windowWords({ min, max }: { min: number; max: number }): string {
  const short = (value: number) => String(Number(value.toPrecision(4)));
  if (min === max) return min < 0 ? `<= ${short(min)}` : `>= ${short(min)}`;
  return `${short(min)}..${short(max)}`;
}

/** A rail without a window but with a signal must hold that much at every moment. */
function signalWords(result: RailResult): string {
  const limit = swingNeedOf(result)?.limit;
  return limit === undefined ? '' : windowWords({ min: limit, max: limit });
}

type State = 'good' | 'close' | 'bad' | 'neutral';

function stateOf(result: RailResult): State {
  const { needs } = result.rail;
  if (result.pump?.points.some((point) => point.loadCurrent < 0.99 * point.askedCurrent)) return 'bad';
  const misses = [missOf(result, 'weak'), missOf(result, 'strong'), swingMissOf(result)].filter(
    (miss) => miss !== undefined,
  );
  const allowed = needs?.ripple?.max ?? Number.POSITIVE_INFINITY;
  const { typical = 0, max = 0 } = result.ripple ?? {};
  if (misses.some((miss) => miss.corner === undefined) || typical > allowed) return 'bad';
  if (misses.length > 0 || max > allowed) return 'close';
  return result.voltage && (needs?.voltage || needs?.ripple || needs?.swing) ? 'good' : 'neutral';
}

function fromOf({ rail: { origin } }: RailResult): string {
  switch (origin?.kind) {
    case 'supply':
      return `supply ${origin.supply.name}`;
    case 'regulator':
      return `regulator on ${origin.regulator.from?.name ?? '?'}`;
    case 'filter':
      return `filter on ${origin.filter.from?.name ?? '?'}`;
    case 'pump': {
      const { topology = 'pump', input } = origin.pump;
      return input && input.name !== 'ground' ? `${topology} on ${input.name}` : topology;
    }
    default:
      return '';
  }
}
