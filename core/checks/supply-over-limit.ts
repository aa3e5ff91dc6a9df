/**
 * More current out of a supply than it may give.
 */
import type { BoardAnalysis, SupplyResult } from '../analysis/types';
import { inMode, originWords } from '../analysis/words';
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

function judge(analysis: BoardAnalysis, { supply, modes, limit }: SupplyResult): readonly Finding[] {
  if (modes === null || limit === null) return [];
  const over = (amps: number) => amps > limit.min * (1 + 1e-9);
  const most = modes.reduce((a, b) => (b.most > a.most ? b : a));
  const typical = modes.reduce((a, b) => (b.typical > a.typical ? b : a));
  if (!over(most.most)) return [];
  const onlyAtCorner = !over(typical.typical);
  const { mode } = onlyAtCorner ? most : typical;
  const amps = onlyAtCorner ? most.most : typical.typical;
  const allowed = formatQuantity(limit.min, 'A');
  const corner = onlyAtCorner ? ' where everything takes most' : '';
  return [
    {
      code: 'supply-over-limit',
      severity: onlyAtCorner ? 'warning' : 'error',
      at: supply.current ? `${supply.path}.current` : supply.path,
      span:
        supply.current?.span ?? supply.standard?.ref?.span ?? supply.battery?.ref?.span ?? supply.nameSpan,
      message: `The board draws ${formatQuantity(amps, 'A')} from ${supply.name}${inMode(mode)}${corner}, ${formatPercent(amps / limit.min - 1, 2)} above the ${allowed} it may give. Shed ${formatQuantity(amps - limit.min, 'A')} or choose a stronger supply.`,
      expected: `at most ${allowed}`,
      actual: formatQuantity(amps, 'A'),
      source: originWords(limit.origin),
      related: [...analysis.rails.values()]
        .filter(({ rail }) => rail.origin?.kind === 'supply' && rail.origin.supply.name === supply.name)
        .map(({ rail }) => ({ span: rail.nameSpan, message: `${rail.name} is fed by ${supply.name}` })),
    },
  ];
}
