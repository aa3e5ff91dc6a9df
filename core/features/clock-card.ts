/**
 * The card of a clock: its square wave, and which pumps it lifts.
 */
import type { BoardAnalysis, ClockResult } from '../analysis/types';
import { formatBand, formatPercent, formatQuantity } from '../quantity/write';
import type { Span } from '../text/span';
import type { Card } from './card';

export function clockCard(analysis: BoardAnalysis, result: ClockResult, span: Span): Card {
  const { clock, frequency, duty, high, low } = result;
  const pin = clock.pin && `${clock.pin.chip}.${clock.pin.pin}`;
  const rails = [...analysis.rails.values()]
    .filter(
      ({ rail }) =>
        rail.origin?.kind === 'pump' && rail.origin.pump.drive.some(({ name }) => name === clock.name),
    )
    .map(({ rail }) => rail.name);
  const levels =
    high === null || low === null ? '' : `, from ${formatQuantity(low, 'V')} to ${formatQuantity(high, 'V')}`;
  const period = frequency ? formatQuantity(1 / frequency.typical, 's') : '';
  return {
    span,
    title: `${clock.name} · clock${pin ? ` on ${pin}` : ''}`,
    answer: frequency
      ? `${formatBand(frequency, 'Hz')}${duty ? `, ${formatPercent(duty.typical)} high` : ''}${levels}.`
      : 'Its frequency is not computed.',
    state: 'neutral',
    head: ['', ''],
    rows: [
      ['period', period],
      ['lifts', rails.length > 0 ? rails.join(', ') : 'no pump'],
    ].filter(([, value]) => value !== ''),
    origins: [
      ...(clock.frequency ? ['Frequency and duty as the file gives them.'] : []),
      ...(levels === '' || !pin ? [] : [`Levels without load: ground and the rail of ${clock.pin?.chip}.`]),
    ],
  };
}
