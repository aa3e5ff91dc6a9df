/**
 * A regulator that must deliver more than it can.
 */
import { inMode } from '../analysis/words';
import { formatPercent, formatQuantity } from '../quantity/write';
import type { Check } from './check';

export const regulatorOverLimit: Check = {
  code: 'regulator-over-limit',
  title: 'Regulator over its current limit',
  severity: 'error',
  why: 'Beyond its limit a regulator folds back or shuts down, and the whole rail with it.',
  run: (analysis) =>
    [...analysis.regulators.values()].flatMap(({ rail, regulator, current, mode }) => {
      const { limit } = regulator;
      if (!limit || current <= limit.min) return [];
      const most = formatQuantity(limit.min, 'A');
      return [
        {
          code: 'regulator-over-limit' as const,
          severity: 'error' as const,
          at: `${rail.path}.regulator.limit`,
          span: limit.span ?? rail.nameSpan,
          message: `${rail.name} must deliver ${formatQuantity(current, 'A')}${inMode(mode)}, ${formatPercent(current / limit.min - 1, 2)} above the ${most} of its regulator. Choose a larger one or move loads to another rail.`,
          expected: `at most ${most}`,
          actual: formatQuantity(current, 'A'),
          source: 'limit of this regulator',
        },
      ];
    }),
};
