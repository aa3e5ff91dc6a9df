/**
 * The card of a supply: what the board draws from it against what it may give, and how long it lasts.
 */
import type { BatteryLife } from '../analysis/battery';
import { batteryCaution, chargeWords, endWords, lifeOrigins, lifeWords } from '../analysis/battery-words';
import { type Gap, isGap } from '../analysis/gap';
import type { SupplyResult } from '../analysis/types';
import { originWords } from '../analysis/words';
import { formatBand, formatDuration, formatPercent, formatQuantity } from '../quantity/write';
import type { Span } from '../text/span';
import type { Card } from './card';

export function supplyCard(result: SupplyResult, span: Span): Card {
  const { supply, voltage, current, power, limit, use } = result;
  const entry = supply.standard?.data ?? supply.battery?.data;
  const found = result.life?.();
  const life = found && !isGap(found) ? found : undefined;
  const rows: (readonly string[])[] = [];
  if (voltage) rows.push(['voltage', formatBand(voltage, 'V')]);
  if (current) rows.push(['current', formatBand(current, 'A')]);
  if (limit) rows.push(['limit', formatQuantity(limit.min, 'A')]);
  if (power !== null) rows.push(['power', formatQuantity(power, 'W')]);
  if (life) rows.push(...lifeRows(life));
  return {
    span,
    title: `${supply.name} · ${entry?.title ?? 'supply'}`,
    answer: current
      ? `${formatQuantity(current.typical, 'A')} on average${use === null ? '' : `, ${formatPercent(use, 2)} of its limit at most`}${life ? `; lasts ${lifeWords(life.typical)}` : ''}.`
      : 'Its current is not computed.',
    state: worse(useState(use), lifeState(life)),
    head: ['', ''],
    rows,
    origins: [
      ...(entry ? [`Voltage: ${originWords(entry.voltage.origin)}.`] : []),
      ...(limit && !supply.current ? [`Limit: ${originWords(limit.origin)}.`] : []),
      ...lifeNotes(found),
    ],
  };
}

function lifeRows(life: BatteryLife): (readonly string[])[] {
  const { typical, least, supply } = life;
  return [
    ['lasts', lifeWords(typical)],
    ['until', endWords(life, typical)],
    ...(least ? [['at worst', lifeWords(least)]] : []),
    ...(supply.life ? [['needed', formatDuration(supply.life.min)]] : []),
    ['capacity', chargeWords(life, typical)],
    ...(typical.selfCurrent > 0
      ? [['self-discharge', `as ${formatQuantity(typical.selfCurrent, 'A')}`]]
      : []),
  ];
}

function lifeNotes(found: BatteryLife | Gap | undefined): readonly string[] {
  if (!found) return [];
  if (isGap(found)) return [`Its life is not computed: ${found.because}.`];
  const worst =
    'At worst: the smallest capacity, the most current, the highest resistance and self-discharge together.';
  return [...lifeOrigins(found), ...(found.least ? [worst] : []), batteryCaution(found)];
}

type State = Card['state'];

function useState(use: number | null): State {
  return use === null ? 'neutral' : use > 1 ? 'bad' : use > 0.8 ? 'close' : 'good';
}

function lifeState(life: BatteryLife | undefined): State {
  const needed = life?.supply.life?.min;
  if (life && !(life.typical.seconds > 0)) return 'bad';
  if (!life || needed === undefined) return 'neutral';
  if (life.typical.seconds < needed) return 'bad';
  return life.least && life.least.seconds < needed ? 'close' : 'good';
}

function worse(a: State, b: State): State {
  return (['bad', 'close', 'good'] as const).find((state) => a === state || b === state) ?? 'neutral';
}
