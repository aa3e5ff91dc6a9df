/**
 * A regulator whose junction gets too hot at the hottest ambient.
 */
import { inMode } from '../analysis/words';
import { formatQuantity } from '../quantity/write';
import type { Check } from './check';

/** Junction limit of most regulators (common practice, no source), K. */
const hottest = 273.15 + 125;

export const regulatorHot: Check = {
  code: 'regulator-hot',
  title: 'Regulator too hot',
  severity: 'error',
  why: 'A linear regulator turns the whole difference between input and output into heat, and shuts down or ages fast above its limit.',
  run: (analysis) =>
    [...analysis.regulators.values()].flatMap(({ rail, regulator, junction, heat, mode }) => {
      if (junction === null || heat === null || junction <= hottest) return [];
      const limit = formatQuantity(hottest, 'K');
      const most = (hottest - analysis.reading.board.ambient.max) / (regulator.thermal?.max ?? Number.NaN);
      return [
        {
          code: 'regulator-hot' as const,
          severity: 'error' as const,
          at: `${rail.path}.regulator`,
          span: regulator.thermal?.span ?? rail.nameSpan,
          message: `${rail.name}: the regulator turns ${formatQuantity(heat, 'W')} into heat${inMode(mode)} and reaches ${formatQuantity(junction, 'K')} at the hottest ambient, above ${limit}. It may lose ${formatQuantity(Math.max(most, 0), 'W', 2)}: a lower input, a lighter load, a better cooled package or a switching regulator.`,
          expected: `at most ${limit}`,
          actual: formatQuantity(junction, 'K'),
          source: 'ambient plus heat times thermal resistance; limit common practice, no source',
        },
      ];
    }),
};
