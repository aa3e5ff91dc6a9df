/**
 * A ceramic that keeps less than half of its value at its own direct voltage.
 */
import { stressedParts } from '../analysis/pump-stress';
import { formatPercent, formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';
import { rateFor } from './fixes';
import { worstByPath } from './worst-parts';

/** Share of the value below which a smaller part of a better kind would serve as well (common practice, no source). */
const leastLeft = 0.5;

export const capacitorDerated: Check = {
  code: 'capacitor-derated',
  title: 'Capacitor that loses most of its value',
  severity: 'warning',
  why: 'A class 2 ceramic loses value under direct voltage; the board then has a fraction of the capacitance that stands in the parts list.',
  run: (analysis) =>
    [...analysis.rails.values()].flatMap((result) =>
      worstByPath(
        stressedParts(result).capacitors,
        ({ capacitor }) => capacitor.path,
        ({ figures }) => -figures.effective,
      ).flatMap(({ capacitor, figures }): Finding[] => {
        const { value, rated, kind } = capacitor;
        if (!value || !rated || !kind.data?.bias) return [];
        const left = figures.effective / value.typical;
        if (left >= leastLeft) return [];
        const volts = Math.abs(figures.average);
        return [
          {
            code: 'capacitor-derated',
            severity: 'warning',
            at: capacitor.path,
            span: capacitor.span,
            message: `${figures.key} keeps ${formatQuantity(figures.effective, 'F', 2)}, ${formatPercent(left, 2)} of its ${formatQuantity(value.typical, 'F')}, under the ${formatQuantity(volts, 'V')} across it. A rating of ${formatQuantity(2 * rated.typical, 'V')}, a larger case or a kind that keeps its value (\`c0g\`, \`film\`) holds more.`,
            expected: `at least ${formatPercent(leastLeft)} of the value`,
            actual: formatPercent(left, 2),
            source: kind.data.bias[0]?.left.origin.note ?? 'curve of the kind',
            fixes: rateFor(capacitor, 2 * rated.typical),
          },
        ];
      }),
    ),
};
