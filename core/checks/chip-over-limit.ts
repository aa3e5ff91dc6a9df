/**
 * All pins of a chip together above what its supply pins may carry for them.
 */
import type { ChipResult } from '../analysis/types';
import { originWords } from '../analysis/words';
import type { Figure } from '../quantity/figure';
import { formatPercent, formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';

export const chipOverLimit: Check = {
  code: 'chip-over-limit',
  title: 'Chip above the sum of its pin currents',
  severity: 'error',
  why: 'The current of every pin passes the supply pins of the chip, which have a limit of their own.',
  run: (analysis) =>
    [...analysis.chips.values()].flatMap((chip) => [
      ...judge(chip, 'source', chip.sourceTotal, chip.sourceMost, chip.data?.total.source),
      ...judge(chip, 'sink', chip.sinkTotal, chip.sinkMost, chip.data?.total.sink),
    ]),
};

function judge(
  { chip }: ChipResult,
  way: 'source' | 'sink',
  typical: number,
  most: number,
  limit: Figure | undefined,
): readonly Finding[] {
  if (limit === undefined || !(Math.max(typical, most) > limit.min * (1 + 1e-9))) return [];
  const onlyAtCorner = !(typical > limit.min * (1 + 1e-9));
  const amps = onlyAtCorner ? most : typical;
  const allowed = formatQuantity(limit.min, 'A');
  return [
    {
      code: 'chip-over-limit',
      severity: onlyAtCorner ? 'warning' : 'error',
      at: chip.path,
      span: chip.part?.ref?.span ?? chip.nameSpan,
      message: `All pins of ${chip.name} together ${way} ${formatQuantity(amps, 'A')}${onlyAtCorner ? ' where each carries most' : ''}, ${formatPercent(amps / limit.min - 1, 2)} above the ${allowed} that the chip may carry. Take loads off its pins or drive the pump through a driver stage of its own.`,
      expected: `at most ${allowed}`,
      actual: formatQuantity(amps, 'A'),
      source: originWords(limit.origin),
      related: [...chip.pins.values()].map((pin) => ({
        span: pin.nameSpan,
        message: `${pin.name} is one of them`,
      })),
    },
  ];
}
