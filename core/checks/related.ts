/** Second places that findings about rails point to. */
import { loadAmps } from '../analysis/load-current';
import type { RailResult } from '../analysis/types';
import type { Rail } from '../model/board';
import { formatQuantity } from '../quantity/write';
import type { Related } from './finding';

/** The load that draws most at the rail's typical voltage. */
export function largestLoad(result: RailResult): readonly Related[] {
  const volts = Math.abs(result.voltage?.typical ?? Number.NaN);
  const loads = [...result.rail.loads.values()]
    .map((load) => ({ load, current: loadAmps(load, 'max', () => volts) }))
    .filter(({ current }) => current > 0)
    .sort((a, b) => b.current - a.current);
  const first = loads[0];
  if (first === undefined) return [];
  const words = loads.length === 1 ? 'The load' : 'Largest load';
  return [
    {
      span: first.load.nameSpan,
      message: `${words}: ${first.load.name}, ${formatQuantity(first.current, 'A')}`,
    },
  ];
}

/** Where the rail itself is described, for a finding whose own place is elsewhere. */
export function railHere(rail: Rail, message: string): Related {
  return { span: rail.nameSpan, message };
}
