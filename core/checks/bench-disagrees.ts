/**
 * A bench measurement that no tolerance of the board explains.
 */
import { benchLoad, beyondWords, sideWords } from '../analysis/bench-words';
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
  const causes = result.causes?.(target) ?? [];
  const beyond = result.explanation ? beyondWords(result.explanation(), target) : [];
  const usual = `No tolerance explains it; usual on a bench (common practice): ${causes.join('; ')}.`;
  return causes.length === 0 ? beyond : [usual, ...beyond];
}
