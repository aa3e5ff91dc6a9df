/**
 * Diodes of a pump against their average and repeated peak current ratings.
 */
import { stressedParts } from '../analysis/pump-stress';
import { inMode } from '../analysis/words';
import { formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';
import { diodeFor } from './fixes';
import { worstByPath } from './worst-parts';

export const diodeCurrent: Check = {
  code: 'diode-current',
  title: 'Diode beyond its current rating',
  severity: 'error',
  why: 'The average current heats a diode, and each charging pulse must stay within what its bond and junction bear.',
  run: (analysis) =>
    [...analysis.rails.values()].flatMap((result) =>
      worstByPath(
        stressedParts(result).diodes,
        ({ diode }) => diode.path,
        ({ highestPeak }) => highestPeak,
      ).flatMap(({ diode, figures, highest, highestAverage, highestPeak }): Finding[] => {
        const name = diode.ref?.name ?? 'The diode';
        const mode = inMode(result.pump?.heaviest.mode);
        return (['average', 'peak'] as const).flatMap((kind): Finding[] => {
          const rating = diode.data?.[kind];
          const most = kind === 'peak' ? highestPeak : highestAverage;
          if (!rating || most <= rating.min) return [];
          const limit = formatQuantity(rating.min, 'A');
          const typical = figures[kind] > rating.min;
          const amps = formatQuantity(typical ? figures[kind] : most, 'A');
          return [
            {
              code: 'diode-current',
              severity: typical ? 'error' : 'warning',
              at: diode.path,
              span: diode.ref?.span ?? diode.span,
              message: `${name} of ${result.rail.name} carries ${amps} ${kind === 'peak' ? 'at the peak of each pulse' : 'on average'}${typical ? mode : ' at its strongest corner'}, more than the ${limit} it is rated for. A larger diode${kind === 'peak' ? ' or a series resistor at the drive' : ''} cures it.`,
              expected: `at most ${limit}`,
              actual: amps,
              source: rating.origin.note ?? rating.origin.kind,
              fixes: diodeFor(analysis, diode, {
                reverse: highest,
                average: highestAverage,
                peak: highestPeak,
              }),
            },
          ];
        });
      }),
    ),
};
