/**
 * The card of a rail: does it meet its need and by how much, its figures with their spread, and where they come from.
 */
import { benchWords } from '../analysis/bench-words';
import { pumpLosses } from '../analysis/losses';
import { isNegative } from '../analysis/sign';
import { spareAt, swingMissOf, swingNeedOf, weakestMoments } from '../analysis/swing-need';
import type { BoardAnalysis, RailResult } from '../analysis/types';
import { missOf } from '../analysis/window';
import { inMode, volts } from '../analysis/words';
import type { Band } from '../quantity/figure';
import { formatBand, formatDuration, formatPercent, formatQuantity } from '../quantity/write';
import type { Span } from '../text/span';
import type { Card } from './card';
import { voltsPicture } from './picture/volts';
import { railOrigins } from './rail-origins';

/** `span` is where the rail was pointed at: its name, or a reference to it. */
export function railCard(analysis: BoardAnalysis, result: RailResult, span: Span): Card {
  const { pump } = result;
  const card: Card = {
    span,
    title: `${result.rail.name} · ${kindOf(result)}`,
    ...verdict(result),
    head: ['', 'lowest', 'typical', 'highest', 'needs'],
    rows: rowsOf(result),
    origins: [...details(result), ...benchLines(analysis, result), ...railOrigins(analysis, result)],
  };
  if (pump === undefined) return card;
  return { ...card, picture: (theme) => voltsPicture(result, pump, theme), sizable: result.rail.name };
}

function kindOf({ rail }: RailResult): string {
  const { origin } = rail;
  switch (origin?.kind) {
    case 'supply':
      return `from supply ${origin.supply.name}`;
    case 'regulator':
      return origin.regulator.from ? `regulated from ${origin.regulator.from.name}` : 'regulated';
    case 'filter':
      return origin.filter.from ? `filtered from ${origin.filter.from.name}` : 'filtered';
    case 'pump': {
      const { topology = 'pump', input, drive } = origin.pump;
      const on = input && input.name !== 'ground' ? ` on ${input.name}` : '';
      const by = drive.length > 0 ? `, driven by ${drive.map(({ name }) => name).join(' and ')}` : '';
      return `${topology}${on}${by}`;
    }
    default:
      return 'rail';
  }
}

/** Less than this share of the window's edge is called close: parts differ by more than that from lot to lot. */
const closeShare = 0.02;

function verdict(result: RailResult): Pick<Card, 'answer' | 'state'> {
  const { voltage, rail, because } = result;
  if (voltage === null)
    return { answer: `Not computed: ${because ?? 'a figure is missing'}.`, state: 'neutral' };
  const reached = `${formatQuantity(voltage.typical, 'V')}${load(result)}`;
  const stalled = result.pump?.points.find((point) => point.loadCurrent < 0.99 * point.askedCurrent);
  if (stalled)
    return {
      answer: `Collapses to ${formatQuantity(stalled.voltage, 'V', 2)}${inMode(stalled.mode)}: it cannot carry its load.`,
      state: 'bad',
    };
  const miss = missOf(result, 'weak') ?? missOf(result, 'strong');
  if (miss) {
    const short = Math.abs(miss.limit) > Math.abs(miss.voltage) ? 'short of' : 'beyond';
    const edge = `${volts(miss.by)} ${short} ${formatQuantity(miss.limit, 'V')}`;
    return miss.corner
      ? {
          answer: `${reached}, but ${formatQuantity(miss.voltage, 'V')} at its worst corner, ${edge}.`,
          state: 'close',
        }
      : { answer: `${formatQuantity(miss.voltage, 'V')}${inMode(miss.mode)}, ${edge}.`, state: 'bad' };
  }
  const clipped = swingMissOf(result);
  if (clipped) {
    const edge = `${volts(clipped.by)} short of the ${formatQuantity(clipped.need.limit, 'V')} that its signal needs`;
    return clipped.corner
      ? {
          answer: `${reached}, but ${formatQuantity(clipped.voltage, 'V')} at the weakest moment of its worst corner, ${edge}.`,
          state: 'close',
        }
      : {
          answer: `${formatQuantity(clipped.voltage, 'V')} at its weakest moment${inMode(clipped.mode)}, ${edge}.`,
          state: 'bad',
        };
  }
  const needed = rail.needs?.voltage;
  const rippleState = ripple(result);
  if (rippleState !== undefined && rippleState.state !== 'good')
    return { answer: `${reached}, ${rippleState.words}.`, state: rippleState.state };
  const signal = swingNeedOf(result)?.limit;
  const edge = needed ? (isNegative(needed) ? needed.max : needed.min) : signal;
  if (edge === undefined || result.headroom === null) return { answer: `${reached}.`, state: 'neutral' };
  const state = result.headroom < closeShare * Math.abs(edge) ? 'close' : 'good';
  return { answer: `${reached}, ${volts(result.headroom)} to spare at its worst corner.`, state };
}

function ripple(result: RailResult): { words: string; state: Card['state'] } | undefined {
  const allowed = result.rail.needs?.ripple?.max;
  if (allowed === undefined || result.ripple === null) return undefined;
  const { typical, max } = result.ripple;
  if (typical > allowed)
    return {
      words: `but with ${formatQuantity(typical, 'V')} of ripple where ${formatQuantity(allowed, 'V')} are allowed`,
      state: 'bad',
    };
  if (max > allowed)
    return {
      words: `but with ${formatQuantity(max, 'V')} of ripple at a corner where ${formatQuantity(allowed, 'V')} are allowed`,
      state: 'close',
    };
  return { words: '', state: 'good' };
}

function load({ pump, current }: RailResult): string {
  const amps = pump?.heaviest.loadCurrent ?? current;
  if (amps === null) return '';
  return ` at ${formatQuantity(amps, 'A')}${inMode(pump?.heaviest.mode)}`;
}

function rowsOf(result: RailResult): readonly (readonly string[])[] {
  const { voltage, pump, rail, efficiency } = result;
  const rows: (readonly string[])[] = [];
  const needed = rail.needs?.voltage;
  if (voltage) rows.push(['voltage', ...three(voltage), needed ? formatBand(needed, 'V') : '']);
  const signal = swingRow(result);
  if (signal) rows.push(signal);
  if (pump && result.ripple) {
    const allowed = rail.needs?.ripple;
    rows.push(['ripple', ...three(result.ripple), allowed ? formatQuantity(allowed.max, 'V') : '']);
  }
  if (!pump) {
    if (result.current !== null) rows.push(['current', '', formatQuantity(result.current, 'A'), '', '']);
    if (efficiency !== null) rows.push(['efficiency', '', formatPercent(efficiency, 2), '', '']);
  }
  return rows;
}

/** The weakest moment against what a signal needs. */
function swingRow(result: RailResult): readonly string[] | undefined {
  const need = swingNeedOf(result);
  const moments = need && weakestMoments(result);
  if (!need || !moments) return undefined;
  const worst = moments.typical.reduce((a, b) =>
    spareAt(need, b.voltage) < spareAt(need, a.voltage) ? b : a,
  );
  const ends = [voltsOrLess(moments.corner.voltage), voltsOrLess(worst.voltage), ''];
  const sum = `${formatQuantity(need.swing.max, 'V')} + ${formatQuantity(need.headroom.max, 'V')}`;
  const from = `${formatQuantity(need.limit, 'V')} (${sum}${need.headroomGiven ? '' : ' assumed'})`;
  return ['weakest moment', ...(need.limit < 0 ? [...ends].reverse() : ends), from];
}

/** One line each under the picture, so that the answer, the table and the picture fit without scrolling. */
function details(result: RailResult): readonly string[] {
  const { pump, efficiency, modes, rail } = result;
  if (!pump) return [];
  const losses = rail.origin?.kind === 'pump' ? pumpLosses(rail.origin.pump, pump) : undefined;
  const limits = losses
    ? ` (slow limit ${formatQuantity(losses.slowOhm, 'ohm')}, fast limit ${formatQuantity(losses.fastOhm, 'ohm')})`
    : '';
  const share = efficiency === null ? '' : `; efficiency ${formatPercent(efficiency, 2)}`;
  const byMode = [...modes].flatMap(([mode, at]) =>
    at.voltage === null || at.current === null
      ? []
      : [`${mode} ${formatQuantity(at.voltage, 'V')} at ${formatQuantity(at.current, 'A')}`],
  );
  return [
    `Output resistance ${formatQuantity(pump.heaviest.outputResistance, 'ohm')}${limits}${share}.`,
    ...(byMode.length > 1 ? [`By mode: ${byMode.join(', ')}.`] : []),
    ...switching(result),
  ];
}

function benchLines(analysis: BoardAnalysis, { rail }: RailResult): readonly string[] {
  return analysis
    .bench()
    .filter((measured) => measured.rail?.name === rail.name)
    .map(benchWords)
    .flatMap((words) => (words === '' ? [] : [`Bench: ${words}.`]));
}

/** Coming up and running down, from empty capacitors and with everything off. */
function switching({ transients }: RailResult): readonly string[] {
  const course = transients?.();
  if (!course) return [];
  const peak = course.inrush && Math.max(...course.inrush);
  const up =
    course.startTime === null
      ? 'Its switch-on could not be followed'
      : `Comes up to 90 % in ${formatDuration(course.startTime)}, with up to ${formatQuantity(peak ?? 0, 'A')} at its drive`;
  const down =
    course.dischargeTime === null
      ? `nothing brings it below ${formatQuantity(course.dischargeLevel, 'V')} after switch-off`
      : `falls to ${formatQuantity(course.dischargeLevel, 'V')} in ${formatDuration(course.dischargeTime)} after switch-off`;
  return [`${up}; ${down}.`];
}

function three(band: Band): readonly string[] {
  return [band.min, band.typical, band.max].map(voltsOrLess);
}

/** A solver's rounding error is no ripple. */
function voltsOrLess(value: number): string {
  return value !== 0 && Math.abs(value) < 1e-6 ? 'below 1 µV' : formatQuantity(value, 'V');
}
