/**
 * The card of a chip on the board: its current and the sum of its pins against what the data sheet allows.
 */
import type { ChipResult } from '../analysis/types';
import { originWords } from '../analysis/words';
import { formatBand, formatPercent, formatQuantity } from '../quantity/write';
import type { Span } from '../text/span';
import type { Card } from './card';

export function chipCard(result: ChipResult, span: Span): Card {
  const { chip, data, voltage, current, sourceTotal, sinkTotal, use } = result;
  const rows: (readonly string[])[] = [];
  if (voltage)
    rows.push(['supply', formatBand(voltage, 'V'), data?.supply ? formatBand(data.supply, 'V') : '']);
  if (current) rows.push(['current', formatBand(current, 'A'), '']);
  const limit = (side: 'source' | 'sink') =>
    data?.total[side] ? formatQuantity(data.total[side].min, 'A') : '';
  rows.push(['all pins out', formatQuantity(sourceTotal, 'A'), limit('source')]);
  rows.push(['all pins in', formatQuantity(sinkTotal, 'A'), limit('sink')]);
  const total = data?.total.source ?? data?.total.sink;
  return {
    span,
    title: `${chip.name} · ${data?.title ?? 'chip'}`,
    answer: current
      ? `${formatQuantity(current.typical, 'A')} on average${use === null ? '' : `; its pins use ${formatPercent(use, 2)} of what the chip may carry`}.`
      : 'Its current is not computed.',
    state: use === null ? 'neutral' : use > 1 ? 'bad' : use > 0.8 ? 'close' : 'good',
    head: ['', '', 'data sheet'],
    rows,
    origins: [
      ...(data ? [`${data.source}.`] : []),
      ...(total ? [`Sum of the pins: ${originWords(total.origin)}.`] : []),
      ...(chip.draws.length === 0 && data?.draws ? [`Own current: ${originWords(data.draws.origin)}.`] : []),
    ],
  };
}
