/**
 * What a supply must charge when it is connected or the board starts: bulk capacitance against what the port allows,
 * and the current of the way up against its limit.
 */
import { type Attached, attachedTo } from '../analysis/attached';
import type { BoardAnalysis, SupplyResult } from '../analysis/types';
import { originWords } from '../analysis/words';
import { formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';

export const inrushSupply: Check = {
  code: 'inrush-supply',
  title: 'Inrush beyond what the supply allows',
  severity: 'warning',
  why: 'Empty capacitors pull a port down the moment it is connected: other devices on it fail, and a protected port switches off.',
  run: (analysis) =>
    [...analysis.supplies.values()].flatMap((supply) => [
      ...bulk(analysis, supply),
      ...startCurrent(analysis, supply),
    ]),
};

function bulk(analysis: BoardAnalysis, result: SupplyResult): readonly Finding[] {
  const { supply, voltage } = result;
  const allowed = supply.bulk ?? supply.standard?.data?.bulk;
  if (!allowed) return [];
  const attached = attachedTo(analysis.reading.board, result);
  const farads = attached.reduce((sum, each) => sum + each.farads, 0);
  if (!(farads > allowed.max * (1 + 1e-9))) return [];
  const most = formatQuantity(allowed.max, 'F');
  const all = formatQuantity(farads, 'F', 3);
  const volts = voltage?.typical ?? 0;
  const charge =
    volts > 0 ? ` (${formatQuantity(farads * volts, 'C', 3)} at ${formatQuantity(volts, 'V')})` : '';
  return [
    {
      code: 'inrush-supply',
      severity: 'warning',
      at: supply.bulk ? `${supply.path}.bulk` : supply.path,
      span: supply.bulk?.span ?? supply.standard?.ref?.span ?? supply.nameSpan,
      message: `${all}${charge} stand on ${supply.name} the moment it is connected: ${names(attached)}. It allows ${most}. Smaller reservoirs, a switch that starts slowly, or a resistor in front of them bring it down.`,
      expected: `at most ${most}`,
      actual: all,
      source: originWords(allowed.origin),
      related: [...new Set(attached.map(({ rail }) => rail))].map((rail) => ({
        span: rail.nameSpan,
        message: `${rail.name} is reached from ${supply.name} without a limit`,
      })),
    },
  ];
}

/** The largest few by name. */
function names(attached: readonly Attached[]): string {
  const sorted = [...attached].sort((a, b) => b.farads - a.farads);
  const shown = sorted.slice(0, 4).map(({ key, farads }) => `${key} ${formatQuantity(farads, 'F')}`);
  const rest = sorted.length - shown.length;
  return `${shown.join(', ')}${rest > 0 ? ` and ${rest} more` : ''}`;
}

function startCurrent(analysis: BoardAnalysis, result: SupplyResult): readonly Finding[] {
  const { supply, current, limit } = result;
  if (!current || !limit || current.max > limit.min) return [];
  const pumps = pumpsOn(analysis, supply.name);
  // A pump cannot draw more on its way than its open voltage over its resistance, once for each source.
  const bound = pumps.reduce((sum, { pump }) => {
    const { openCircuit, outputResistance, drives } = pump!.heaviest;
    return sum + (2 + drives.length) * Math.abs(openCircuit / Math.max(outputResistance, 1e-3));
  }, current.max);
  if (!(bound > limit.min)) return [];
  let starting = current.max;
  for (const { transients, pump } of pumps) {
    const course = transients?.();
    if (!course?.startTime) return [];
    const charge = [...course.railCharge.values()].reduce((sum, each) => sum + each, 0);
    const steady = [...pump!.heaviest.railCurrents.values()].reduce((sum, each) => sum + each, 0);
    starting += Math.max(0, charge / course.startTime - steady);
  }
  if (!(starting > limit.min * (1 + 1e-9))) return [];
  const most = formatQuantity(limit.min, 'A');
  const amps = formatQuantity(starting, 'A');
  return [
    {
      code: 'inrush-supply',
      severity: 'warning',
      at: supply.current ? `${supply.path}.current` : supply.path,
      span: supply.current?.span ?? supply.standard?.ref?.span ?? supply.nameSpan,
      message: `While its rails come up together the board draws ${amps} from ${supply.name} on average, above the ${most} it may give; steady it is ${formatQuantity(current.max, 'A')}. Start the pumps one after the other, or make their reservoirs smaller.`,
      expected: `at most ${most}`,
      actual: amps,
      source: originWords(limit.origin),
    },
  ];
}

/** Pumps whose current comes from the supply, past regulators and filters. */
function pumpsOn({ rails }: BoardAnalysis, supply: string) {
  const from = (name: string | undefined, left: number): boolean => {
    const origin = name === undefined ? undefined : rails.get(name)?.rail.origin;
    if (!origin || left === 0) return false;
    if (origin.kind === 'supply') return origin.supply.name === supply;
    if (origin.kind === 'regulator') return from(origin.regulator.from?.name, left - 1);
    if (origin.kind === 'filter') return from(origin.filter.from?.name, left - 1);
    return false;
  };
  return [...rails.values()].filter(
    ({ pump }) => pump && [...pump.heaviest.railCurrents.keys()].some((name) => from(name, rails.size)),
  );
}
