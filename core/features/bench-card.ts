/**
 * The card of a bench entry: is it inside the predicted band, by how much it is off, and what would explain that.
 */
import { benchLoad, benchWords, explanationWords } from '../analysis/bench-words';
import type { BenchComparison, BenchResult, BoardAnalysis } from '../analysis/types';
import { inMode } from '../analysis/words';
import { formatPercent, formatQuantity } from '../quantity/write';
import { touches } from '../text/span';
import type { Card } from './card';

/** The entry that holds the offset. */
export function benchAt(analysis: BoardAnalysis, offset: number): BenchResult | undefined {
  const { bench } = analysis.reading.board;
  const index = bench.findIndex(({ span }) => touches(span, offset));
  return index < 0 ? undefined : analysis.bench()[index];
}

export function benchCard(result: BenchResult): Card {
  const { point, rail, inside, mode } = result;
  const load = benchLoad(result);
  const words = benchWords(result);
  return {
    span: point.span,
    title: `${point.path} · ${point.rail?.name ?? 'rail'}${load === undefined ? '' : ` with ${load}`}`,
    answer: words === '' ? 'Nothing was measured yet.' : `${words}.`,
    state: inside === null ? 'neutral' : inside ? 'good' : 'bad',
    ...tableOf(result),
    origins: [
      ...(result.explanation ? explanationWords(result.explanation()) : []),
      ...causes(result),
      ...(result.predicted && rail
        ? [
            `Predicted with this load in place of all loads of ${rail.name}, the rest of the board typical${inMode(mode)}.`,
          ]
        : []),
      ...(point.note === undefined ? [] : [`Note: ${point.note}`]),
    ],
  };
}

function tableOf({ point, voltage, ripple }: BenchResult): Pick<Card, 'head' | 'rows'> {
  const row = (name: string, comparison: BenchComparison | null, measured: number | undefined) => {
    if (!comparison || measured === undefined) return [];
    const { predicted, deviation } = comparison;
    const volts = [measured, predicted.min, predicted.typical, predicted.max, deviation];
    const share = predicted.typical === 0 ? '' : formatPercent(deviation / Math.abs(predicted.typical), 2);
    return [[name, ...volts.map((value) => formatQuantity(value, 'V')), share]];
  };
  const rows = [
    ...row('voltage', voltage, point.voltage?.typical),
    ...row('ripple', ripple, point.ripple?.typical),
  ];
  return rows.length === 0
    ? { head: [], rows: [] }
    : { head: ['', 'measured', 'lowest', 'predicted', 'highest', 'off', ''], rows };
}

/** What to look at on the bench when tolerances do not explain it. */
function causes(result: BenchResult): readonly string[] {
  return (['voltage', 'ripple'] as const).flatMap((target) => {
    const list = result.causes?.(target) ?? [];
    return list.length === 0 ? [] : [`Usual for such a ${target} (common practice): ${list.join('; ')}.`];
  });
}
