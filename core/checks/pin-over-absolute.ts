/**
 * More steady current than a pin survives: average or rms above the absolute maximum rating.
 */
import type { BoardAnalysis, PinResult } from '../analysis/types';
import { originWords } from '../analysis/words';
import { formatPercent, formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';
import { currentWords, steadyCurrent } from './pin-current';
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
  const current = steadyCurrent(pin);
  if (limit === undefined || current === undefined || !(current.amps > limit.min * (1 + 1e-9))) return [];
  const most = formatQuantity(limit.min, 'A');
  const over = formatPercent(current.amps / limit.min - 1, 2);
  const pins = Math.ceil(current.amps / limit.min);
  return [
    {
      code: 'pin-over-absolute',
      severity: 'error',
      ...pinPlace(analysis, pin),
      message: `${pin.key} carries ${currentWords(pin, current)}, ${over} above its absolute maximum of ${most}. A lighter load, at least ${pins} pins in parallel or a driver stage takes it off the pin.`,
      expected: `at most ${most}`,
      actual: `${formatQuantity(current.amps, 'A')} ${current.what}`,
      source: originWords(limit.origin),
      related: drivenRails(analysis, pin),
    },
  ];
}
