/**
 * Loads outside the voltage that they work at.
 */
import type { RailResult } from '../analysis/types';
import type { Load } from '../model/board';
import { formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';

export const loadVoltage: Check = {
  code: 'load-voltage',
  title: 'Load outside its supply range',
  severity: 'error',
  why: 'Below its least voltage a part stops working as its data sheet says, above its highest it may be destroyed.',
  run: (analysis) =>
    [...analysis.rails.values()].flatMap((result) =>
      [...result.rail.loads.values()].flatMap((load) => [
        ...outside(result, load, 'least'),
        ...outside(result, load, 'most'),
      ]),
    ),
};

function outside({ rail, voltage }: RailResult, load: Load, edge: 'least' | 'most'): Finding[] {
  const limit = load[edge];
  if (!limit || !voltage) return [];
  // A negative rail is judged by its magnitude.
  const ends = [Math.abs(voltage.min), Math.abs(voltage.max)];
  const extreme = edge === 'least' ? Math.min(...ends) : Math.max(...ends);
  const typical = Math.abs(voltage.typical);
  const bound = Math.abs(limit.typical);
  const misses = (volts: number) => (edge === 'least' ? volts < bound : volts > bound);
  if (!misses(extreme)) return [];
  const always = misses(typical);
  const shown = formatQuantity(always ? typical : extreme, 'V');
  const words = edge === 'least' ? 'less than the' : 'more than the';
  return [
    {
      code: 'load-voltage',
      severity: always ? 'error' : 'warning',
      at: `${load.path}.${edge}`,
      span: limit.span ?? load.nameSpan,
      message: `${load.name} gets ${shown} from ${rail.name}${always ? '' : ' at a corner'}, ${words} ${formatQuantity(bound, 'V')} that it ${edge === 'least' ? 'needs' : 'bears'}. Move it to another rail or change this one.`,
      expected: `${edge === 'least' ? 'at least' : 'at most'} ${formatQuantity(bound, 'V')}`,
      actual: shown,
      source: `${edge} of this load`,
      related: [{ span: rail.nameSpan, message: `${rail.name} feeds it` }],
    },
  ];
}
