/**
 * More steady current than the data sheet guarantees the pin's levels for: it survives, but its voltage is no
 * longer what the computation of the rail rests on.
 */
import type { BoardAnalysis, PinResult } from '../analysis/types';
import { originWords } from '../analysis/words';
import { formatPercent, formatQuantity } from '../quantity/write';
import { insertAfter, insertFirst } from '../text/insert-key';
import type { Check } from './check';
import type { Finding, Fix } from './finding';
import { replaceWith } from './fixes';
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
      fixes: strengthen(analysis, pin, current.amps),
    },
  ];
}

/** The weakest drive setting that covers the current. */
function enough(pin: PinResult, amps: number): string | undefined {
  const chip = pin.chip.part?.data;
  const settings = chip?.pin[pin.name]?.strengths ?? chip?.pins.strengths ?? {};
  return Object.entries(settings).find(([, data]) => (data.recommended?.min ?? 0) >= amps)?.[0];
}

function strengthen({ text }: BoardAnalysis, pin: PinResult, amps: number): readonly Fix[] {
  const setting = enough(pin, amps);
  if (setting === undefined) return [];
  const title = `Set ${pin.key} to ${setting}`;
  const listed = pin.chip.pins.get(pin.name);
  if (listed?.strength) return replaceWith(title, listed.strength.span, setting);
  const edit = listed
    ? insertFirst(text, listed.keys.values(), 'strength', setting)
    : pin.chip.pins.size > 0
      ? insertFirst(
          text,
          [...pin.chip.pins.values()].map(({ nameSpan }) => nameSpan),
          pin.name,
          `{ strength: ${setting} }`,
        )
      : pin.chip.part?.ref &&
        insertAfter(
          text,
          pin.chip.keys.values(),
          pin.chip.part.ref.span,
          'pins',
          `{ ${pin.name}: { strength: ${setting} } }`,
        );
  return edit ? [{ title, edits: [edit], preferred: true }] : [];
}

function cure(pin: PinResult, amps: number): string {
  const setting = enough(pin, amps);
  if (setting !== undefined) return `Its ${setting} drive setting covers that.`;
  return 'A lighter load, pins in parallel or a driver stage brings it back.';
}
