/**
 * Chips whose rail leaves the range that they work in.
 */
import { formatBand, formatQuantity } from '../quantity/write';
import type { Check } from './check';

export const chipVoltage: Check = {
  code: 'chip-voltage',
  title: 'Chip outside its supply range',
  severity: 'error',
  why: 'Below its range a chip may run wild without a reset, above it may be destroyed.',
  run: (analysis) =>
    [...analysis.chips.values()].flatMap(({ chip, data, voltage }) => {
      const range = data?.supply;
      if (!range || !voltage || !chip.rail) return [];
      const low = voltage.min < range.min;
      const high = voltage.max > range.max;
      if (!low && !high) return [];
      const always = voltage.typical < range.min || voltage.typical > range.max;
      const shown = formatQuantity(always ? voltage.typical : low ? voltage.min : voltage.max, 'V');
      return [
        {
          code: 'chip-voltage' as const,
          severity: always ? ('error' as const) : ('warning' as const),
          at: `${chip.path}.rail`,
          span: chip.rail.span,
          message: `${chip.name} gets ${shown} from ${chip.rail.name}${always ? '' : ' at a corner'} and works from ${formatQuantity(range.min, 'V')} to ${formatQuantity(range.max, 'V')}. Put it on another rail or narrow this one (${formatBand(voltage, 'V')}).`,
          expected: `${formatQuantity(range.min, 'V')} to ${formatQuantity(range.max, 'V')}`,
          actual: shown,
          source: range.origin.note ?? range.origin.kind,
        },
      ];
    }),
};
