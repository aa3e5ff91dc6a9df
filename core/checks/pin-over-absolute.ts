/**
 * More steady current than a pin survives: average or rms above the absolute maximum rating.
 */
import type { BoardAnalysis, PinResult } from '../analysis/types';
import { originWords } from '../analysis/words';
import { formatPercent, formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';
import { excessOver } from './pin-current';
import { drivenRails, pinPlace } from './pin-place';

export const pinOverAbsolute: Check = {
  code: 'pin-over-absolute',
  title: 'Pin above its absolute maximum',
  severity: 'error',
  why: 'Absolute maximum ratings are survival limits; a pin held above them ages or fails, and takes the chip with it.',
  run: (analysis) => [...analysis.pins.values()].flatMap((pin) => judge(analysis, pin)),
};

function judge(analysis: BoardAnalysis, pin: PinResult): readonly Finding[] {
  const limit = pin.data.absolute;
  const excess = limit && excessOver(pin, limit.min);
  if (!limit || !excess) return [];
  const { current } = excess;
  const most = formatQuantity(limit.min, 'A');
  const over = formatPercent(current.amps / limit.min - 1, 2);
  const pins = Math.ceil(current.amps / limit.min);
  return [
    {
      code: 'pin-over-absolute',
      severity: excess.onlyAtCorner ? 'warning' : 'error',
      ...pinPlace(analysis, pin),
      message: `${pin.key} carries ${excess.words}, ${over} above its absolute maximum of ${most}. A lighter load, at least ${pins} pins in parallel or a driver stage takes it off the pin.`,
      expected: `at most ${most}`,
      actual: `${formatQuantity(current.amps, 'A')} ${current.what}`,
      source: originWords(limit.origin),
      related: drivenRails(analysis, pin),
    },
  ];
}
