/**
 * The pins of one port or supply pin together above what the data sheet allows for that group.
 */
import type { GroupResult } from '../analysis/types';
import { originWords } from '../analysis/words';
import type { Figure } from '../quantity/figure';
import { formatPercent, formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';

export const groupOverLimit: Check = {
  code: 'group-over-limit',
  title: 'Port above the sum its pins may carry',
  severity: 'error',
  why: 'Pins share bond wires and supply rails inside the chip; each may be within its own limit while their sum is not.',
  run: (analysis) =>
    [...analysis.groups.values()].flatMap((group) => [
      ...judge(group, 'source', group.source, group.sourceMost, group.sourceLimit),
      ...judge(group, 'sink', group.sink, group.sinkMost, group.sinkLimit),
    ]),
};

function judge(
  group: GroupResult,
  way: 'source' | 'sink',
  typical: number,
  most: number,
  limit: Figure | null,
): readonly Finding[] {
  if (limit === null || !(Math.max(typical, most) > limit.min * (1 + 1e-9))) return [];
  const onlyAtCorner = !(typical > limit.min * (1 + 1e-9));
  const amps = onlyAtCorner ? most : typical;
  const allowed = formatQuantity(limit.min, 'A');
  return [
    {
      code: 'group-over-limit',
      severity: onlyAtCorner ? 'warning' : 'error',
      at: `${group.chip.path}.pins`,
      span: group.chip.keys.get('pins') ?? group.chip.nameSpan,
      message: `The pins of ${group.key} together ${way} ${formatQuantity(amps, 'A')}${onlyAtCorner ? ' where each carries most' : ''}, ${formatPercent(amps / limit.min - 1, 2)} above the ${allowed} allowed for them. Move a load to a pin of another group, or lighten it.`,
      expected: `at most ${allowed}`,
      actual: formatQuantity(amps, 'A'),
      source: originWords(limit.origin),
      related: group.pins.flatMap((name) => {
        const pin = group.chip.pins.get(name);
        return pin ? [{ span: pin.nameSpan, message: `${name} belongs to ${group.key}` }] : [];
      }),
    },
  ];
}
