/**
 * More steady current than the data sheet guarantees the pin's levels for: it survives, but its voltage is no
 * longer what the computation of the rail rests on.
 */
import type { BoardAnalysis, PinResult } from '../analysis/types';
import { originWords } from '../analysis/words';
import { formatPercent, formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';
import { excessOver } from './pin-current';
import { drivenRails, pinPlace } from './pin-place';

export const pinOverRecommended: Check = {
  code: 'pin-over-recommended',
  title: 'Pin above the current its levels hold for',
  severity: 'warning',
  why: 'Above the current of the data sheet’s output table nobody promises the pin’s voltage, and the rail that hangs on it inherits the doubt.',
  run: (analysis) => [...analysis.pins.values()].flatMap((pin) => judge(analysis, pin)),
};

function judge(analysis: BoardAnalysis, pin: PinResult): readonly Finding[] {
  const { recommended, absolute } = pin.data;
  const excess = recommended && excessOver(pin, recommended.min);
  if (!recommended || !excess) return [];
  // The graver finding about the same current says it already.
  if (absolute && excessOver(pin, absolute.min)?.onlyAtCorner === excess.onlyAtCorner) return [];
  const { current } = excess;
  const most = formatQuantity(recommended.min, 'A');
  const over = formatPercent(current.amps / recommended.min - 1, 2);
  return [
    {
      code: 'pin-over-recommended',
      severity: excess.onlyAtCorner ? 'information' : 'warning',
      ...pinPlace(analysis, pin),
      message: `${pin.key} carries ${excess.words}, ${over} above the ${most} up to which its levels are specified. ${cure(pin, current.amps)}`,
      expected: `at most ${most}`,
      actual: `${formatQuantity(current.amps, 'A')} ${current.what}`,
      source: originWords(recommended.origin),
      related: drivenRails(analysis, pin),
    },
  ];
}

function cure(pin: PinResult, amps: number): string {
  const chip = pin.chip.part?.data;
  const settings = chip?.pin[pin.name]?.strengths ?? chip?.pins.strengths ?? {};
  const enough = Object.entries(settings).find(([, data]) => (data.recommended?.min ?? 0) >= amps);
  if (enough !== undefined) return `Its ${enough[0]} drive setting covers that.`;
  return 'A lighter load, pins in parallel or a driver stage brings it back.';
}
