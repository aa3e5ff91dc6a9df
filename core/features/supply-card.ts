/**
 * The card of a supply: what the board draws from it against what it may give.
 */
import type { SupplyResult } from '../analysis/types';
import { originWords } from '../analysis/words';
import { formatBand, formatPercent, formatQuantity } from '../quantity/write';
import type { Span } from '../text/span';
import type { Card } from './card';

export function supplyCard(result: SupplyResult, span: Span): Card {
  const { supply, voltage, current, power, limit, use } = result;
  const entry = supply.standard?.data ?? supply.battery?.data;
  const rows: (readonly string[])[] = [];
  if (voltage) rows.push(['voltage', formatBand(voltage, 'V')]);
  if (current) rows.push(['current', formatBand(current, 'A')]);
  if (limit) rows.push(['limit', formatQuantity(limit.min, 'A')]);
  if (power !== null) rows.push(['power', formatQuantity(power, 'W')]);
  return {
    span,
    title: `${supply.name} · ${entry?.title ?? 'supply'}`,
    answer: current
      ? `${formatQuantity(current.typical, 'A')} on average${use === null ? '' : `, ${formatPercent(use, 2)} of its limit at most`}.`
      : 'Its current is not computed.',
    state: use === null ? 'neutral' : use > 1 ? 'bad' : use > 0.8 ? 'close' : 'good',
    head: ['', ''],
    rows,
    origins: [
      ...(entry ? [`Voltage: ${originWords(entry.voltage.origin)}.`] : []),
      ...(limit && !supply.current ? [`Limit: ${originWords(limit.origin)}.`] : []),
    ],
  };
}
