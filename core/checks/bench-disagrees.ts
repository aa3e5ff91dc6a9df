/**
 * A bench measurement that no tolerance of the board explains.
 */
import { usualCauses } from '../analysis/bench-causes';
import { benchLoad, explanationWords, sideWords } from '../analysis/bench-words';
import type { BenchComparison, BenchResult } from '../analysis/types';
import { inMode, volts } from '../analysis/words';
import { formatBand, formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';

export const benchDisagrees: Check = {
  code: 'bench-disagrees',
  title: 'Measurement outside the prediction',
  severity: 'warning',
  why: 'When the bench and the prediction part, one of them is wrong about the board, and nothing built on either can be trusted until it is known which.',
  run: (analysis) =>
    analysis
      .bench()
      .flatMap((result) => (['voltage', 'ripple'] as const).flatMap((target) => toFinding(result, target))),
};

function toFinding(result: BenchResult, target: 'voltage' | 'ripple'): readonly Finding[] {
  const comparison = result[target];
  const { point, rail, mode } = result;
  const figure = point[target];
  if (!comparison || !figure || !rail || comparison.outside === 0) return [];
  const read = formatBand(figure, 'V');
  const load = benchLoad(result);
  const what = target === 'ripple' ? `ripple of ${rail.name}` : rail.name;
  const predicted = formatBand(comparison.predicted, 'V');
  return [
    {
      code: 'bench-disagrees',
      severity: 'warning',
      at: `${point.path}.${target}`,
      span: figure.span ?? point.span,
      message: [
        `${what}: measured ${read} with ${load}, ${edgeWords(comparison)}; ${formatQuantity(comparison.predicted.typical, 'V')} is predicted at that load${inMode(mode)}.`,
        ...reasons(result, target),
      ].join(' '),
      expected: predicted,
      actual: read,
      source: 'prediction at the load of the measurement, over tolerance and temperature',
    },
  ];
}

/** `0.23 V below the 5.44 V of its lowest corner`. */
function edgeWords(comparison: BenchComparison): string {
  const { outside, predicted } = comparison;
  const edge = outside > 0 ? predicted.max : predicted.min;
  const which = outside > 0 ? 'highest' : 'lowest';
  const corner = predicted.min === predicted.max ? ' without tolerance' : ` of the ${which} corner`;
  return `${volts(outside)} ${sideWords(comparison, edge)} the ${formatQuantity(edge, 'V')}${corner}`;
}

function reasons(result: BenchResult, target: 'voltage' | 'ripple'): readonly string[] {
  const causes = usualCauses(result, target);
  const turned = causes.length === 1;
  const beyond = turned ? [] : explanationWords({ ...none, beyond: beyondOf(result, target) });
  if (causes.length === 0) return beyond;
  const lead = turned ? 'Look for ' : 'No tolerance explains it; usual on a bench (common practice) are ';
  return [`${lead}${listed(causes)}.`, ...beyond];
}

const none = { moves: [], together: false, all: null, beyond: [] };

function beyondOf({ explanation }: BenchResult, target: 'voltage' | 'ripple') {
  return (explanation?.().beyond ?? []).filter(({ brings }) => brings === target || brings === 'both');
}

function listed(causes: readonly string[]): string {
  return causes.length < 2 ? causes.join('') : `${causes.slice(0, -1).join(', ')}, or ${causes.at(-1)}`;
}
