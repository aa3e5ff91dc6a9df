/**
 * More current out of a supply than it may give.
 */
import type { BoardAnalysis, SupplyResult } from '../analysis/types';
import { originWords } from '../analysis/words';
import { formatPercent, formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';

export const supplyOverLimit: Check = {
  code: 'supply-over-limit',
  title: 'Supply above its limit',
  severity: 'error',
  why: 'A port may switch off and a battery sags or trips its protection when the board asks for more than it may give.',
  run: (analysis) => [...analysis.supplies.values()].flatMap((supply) => judge(analysis, supply)),
};

function judge(analysis: BoardAnalysis, { supply, current, limit }: SupplyResult): readonly Finding[] {
  if (current === null || limit === null || !(current.max > limit.min * (1 + 1e-9))) return [];
  const most = formatQuantity(limit.min, 'A');
  const always = current.min > limit.min;
  const modes = analysis.reading.board.modes.size > 0 && !always ? ' in its heaviest mode' : '';
  return [
    {
      code: 'supply-over-limit',
      severity: 'error',
      at: supply.current ? `${supply.path}.current` : supply.path,
      span:
        supply.current?.span ?? supply.standard?.ref?.span ?? supply.battery?.ref?.span ?? supply.nameSpan,
      message: `The board draws ${formatQuantity(current.max, 'A')} from ${supply.name}${modes}, ${formatPercent(current.max / limit.min - 1, 2)} above the ${most} it may give. Shed ${formatQuantity(current.max - limit.min, 'A')} or choose a stronger supply.`,
      expected: `at most ${most}`,
      actual: formatQuantity(current.max, 'A'),
      source: originWords(limit.origin),
      related: [...analysis.rails.values()]
        .filter(({ rail }) => rail.origin?.kind === 'supply' && rail.origin.supply.name === supply.name)
        .map(({ rail }) => ({ span: rail.nameSpan, message: `${rail.name} is fed by ${supply.name}` })),
    },
  ];
}
