/**
 * Capacitors of a pump against their rated voltage and the usual derating.
 */
import { stressedParts } from '../analysis/pump-stress';
import { formatPercent, formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';
import { rateFor } from './fixes';
import { worstByPath } from './worst-parts';

/** Share of the rating that is used at most (common practice, no source): solid tantalum fails shorted. */
const usable = (kind: string) => (kind === 'tantalum' ? 0.5 : kind === 'aluminium' ? 0.8 : 1);

export const capacitorRating: Check = {
  code: 'capacitor-rating',
  title: 'Capacitor beyond its rated voltage',
  severity: 'error',
  why: 'Over its rating a capacitor fails, electrolytic and tantalum ones with heat and smoke.',
  run: (analysis) =>
    [...analysis.rails.values()].flatMap((result) =>
      worstByPath(
        stressedParts(result).capacitors,
        ({ capacitor }) => capacitor.path,
        ({ highest }) => highest,
      ).flatMap(({ capacitor, figures, highest }): Finding[] => {
        const { rated, kind } = capacitor;
        if (!rated) return [];
        const share = usable(kind.data?.key ?? '');
        const allowed = share * rated.min;
        if (highest <= allowed) return [];
        const over = figures.voltage > rated.min;
        const stands = formatQuantity(highest, 'V');
        const reason =
          highest > rated.min
            ? `above the ${formatQuantity(rated.min, 'V')} it is rated for`
            : `above ${formatPercent(share)} of its ${formatQuantity(rated.min, 'V')}, the usual derating of this kind`;
        return [
          {
            code: 'capacitor-rating',
            severity: over ? 'error' : 'warning',
            at: `${capacitor.path}.rated`,
            span: rated.span ?? capacitor.span,
            message: `${figures.key} bears ${stands} at the strongest corner, ${reason}. Choose a rating of ${formatQuantity(highest / share, 'V', 2)} or more.`,
            expected: `at most ${formatQuantity(allowed, 'V')}`,
            actual: stands,
            source: 'rating of the file; derating common practice, no source',
            fixes: rateFor(capacitor, highest / share),
          },
        ];
      }),
    ),
};
