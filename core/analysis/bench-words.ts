/**
 * Sentences about bench entries that the rule, the cards and the ledger share.
 */
import { formatBand, formatPercent, formatQuantity } from '../quantity/write';
import { reads } from './bench-compare';
import type { Target } from './pump-corners';
import type { BenchComparison, BenchExplanation, BenchMove, BenchResult } from './types';
import { volts } from './words';

/** `2 mA`, `4.7 kohm`; undefined when it could not be read. */
export function benchLoad({ point: { load } }: BenchResult): string | undefined {
  return load && (load.typical === 0 ? 'no load' : formatBand(load, load.unit));
}

/** `41 mV below prediction`; a negative rail is short of it or beyond it. */
export function deviationWords(comparison: BenchComparison): string {
  const { deviation, predicted } = comparison;
  if (reads(comparison, predicted.typical)) return 'as predicted';
  return `${volts(deviation)} ${sideWords(comparison, predicted.typical)} prediction`;
}

/** `below`, `above`, and for negative values `short of`, `beyond`. */
export function sideWords({ measured, predicted }: BenchComparison, edge: number): string {
  const more = measured.typical > edge;
  if (predicted.typical >= 0) return more ? 'above' : 'below';
  return more ? 'short of' : 'beyond';
}

export function bandWords({ outside }: BenchComparison): string {
  return outside === 0 ? 'inside the band' : `${volts(outside)} outside the band`;
}

/** `5.62 V at 2 mA, 41 mV below prediction, inside the band`. */
export function benchWords(result: BenchResult): string {
  const { voltage, ripple, because, point } = result;
  const load = benchLoad(result);
  const at = load === undefined ? '' : load === 'no load' ? ' without load' : ` at ${load}`;
  const one = (target: Target, comparison: BenchComparison | null) => {
    const figure = point[target];
    if (!figure) return [];
    const read = `${target === 'ripple' ? 'ripple ' : ''}${formatQuantity(figure.typical, 'V')}`;
    const place = target === 'voltage' || !point.voltage ? at : '';
    return comparison
      ? [`${read}${place}, ${deviationWords(comparison)}, ${bandWords(comparison)}`]
      : [`${read}${place}, not compared`];
  };
  const words = [...one('voltage', voltage), ...one('ripple', ripple)].join('; ');
  return because === undefined ? words : `${words}: ${because}`;
}

/** `flying capacitor at 820 nF instead of 1 µF`. */
export function moveWords({ label, value, typical, unit }: BenchMove): string {
  return `${label} at ${formatQuantity(value, unit)} instead of ${formatQuantity(typical, unit)}`;
}

/** One sentence for each thing that is known; empty where there is nothing to explain. */
export function explanationWords(explanation: BenchExplanation): readonly string[] {
  const { moves, together, all } = explanation;
  const sentences: string[] = [];
  if (moves.length > 0)
    sentences.push(
      together
        ? `Within tolerance two together would explain it: ${moves.map(moveWords).join(' and ')}.`
        : `Within tolerance this would explain ${explained(moves)}: ${moves.map(moveWords).join('; or ')}.`,
    );
  if (all !== null)
    sentences.push(
      `No two quantities would explain it; all of them at ${formatPercent(all, 2)} of the way to their corner would.`,
    );
  return [...sentences, ...beyondWords(explanation, 'voltage'), ...beyondWords(explanation, 'ripple')];
}

function explained([first]: readonly BenchMove[]): string {
  return first?.both ? 'voltage and ripple' : `the ${first?.explains}`;
}

/** What would have to leave its tolerance, one sentence or none. */
export function beyondWords({ beyond }: BenchExplanation, target: Target): readonly string[] {
  const moves = beyond.filter(({ explains }) => explains === target);
  if (moves.length === 0) return [];
  const words = moves.map(({ label, value, typical, unit, end, both }) => {
    const limit =
      end === typical
        ? ` instead of ${formatQuantity(typical, unit)}`
        : `, where its tolerance ends at ${formatQuantity(end, unit)}`;
    const too = both ? ` (then the ${target === 'voltage' ? 'ripple' : 'voltage'} fits too)` : '';
    return `${label} at ${formatQuantity(value, unit)}${limit}${too}`;
  });
  return [`One quantity alone would explain the ${target}: ${words.join('; or ')}.`];
}
