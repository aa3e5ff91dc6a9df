/**
 * Diodes of a pump against their reverse voltage rating.
 */
import { stressedParts } from '../analysis/pump-stress';
import { formatQuantity } from '../quantity/write';
import type { Check } from './check';
import { diodeFor } from './fixes';
import { worstByPath } from './worst-parts';

export const diodeReverse: Check = {
  code: 'diode-reverse',
  title: 'Diode beyond its reverse voltage',
  severity: 'error',
  why: 'A diode that breaks down once in each period heats up, leaks and pulls the pump down, and small ones fail.',
  run: (analysis) =>
    [...analysis.rails.values()].flatMap((result) =>
      worstByPath(
        stressedParts(result).diodes,
        ({ diode }) => diode.path,
        ({ highest }) => highest,
      ).flatMap(({ diode, figures, highest, highestAverage, highestPeak }) => {
        const rating = diode.data?.reverse;
        if (!rating || highest <= rating.min) return [];
        const limit = formatQuantity(rating.min, 'V');
        const typical = figures.reverse > rating.min;
        return [
          {
            code: 'diode-reverse' as const,
            severity: typical ? ('error' as const) : ('warning' as const),
            at: diode.path,
            span: diode.ref?.span ?? diode.span,
            message: `${diode.ref?.name ?? 'The diode'} of ${result.rail.name} blocks ${formatQuantity(highest, 'V')}${typical ? '' : ' at the strongest corner'}, more than the ${limit} it is rated for. Choose one of a higher class; twice the drive's swing is the usual rule between stages.`,
            expected: `at most ${limit}`,
            actual: formatQuantity(highest, 'V'),
            source: rating.origin.note ?? rating.origin.kind,
            fixes: diodeFor(analysis, diode, {
              reverse: highest,
              average: highestAverage,
              peak: highestPeak,
            }),
          },
        ];
      }),
    ),
};
