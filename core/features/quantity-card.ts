/**
 * The card of a quantity in the file: what it was read as, and what a part's own tolerance makes of it.
 */
import type { BoardAnalysis } from '../analysis/types';
import { schemaAt } from '../format';
import type { Capacitor } from '../model/board';
import type { ReadQuantity } from '../model/context';
import type { Figure } from '../quantity/figure';
import { unitFacts } from '../quantity/units';
import { formatBand, formatDuration, formatPercent, formatQuantity } from '../quantity/write';
import type { Card } from './card';

export function quantityCard(analysis: BoardAnalysis, quantity: ReadQuantity): Card {
  const { figure, span, path, expression } = quantity;
  const written = analysis.text.slice(span.start, span.end).trim();
  const schema = schemaAt(analysis.reading.nodeAt(span.start).path);
  const doc = schema?.row?.doc.replace(/`/g, '');
  return {
    span,
    title: `${path} · ${whatOf(figure)}`,
    answer: `${whole(figure)}${expression ? ', the value of the expression' : ''}.`,
    state: 'neutral',
    ...tableOf(quantity, written),
    origins: [
      ...(isWindow(path) || figure.min === figure.max ? [] : [middle(figure)]),
      ...kindTolerance(analysis, figure),
      ...(doc === undefined ? [] : [doc]),
    ],
  };
}

function tableOf({ figure, path }: ReadQuantity, written: string): Pick<Card, 'head' | 'rows'> {
  const { min, typical, max } = figure;
  if (min === max) return { head: ['', ''], rows: [['read from', written]] };
  const values = isWindow(path) ? [min, max] : [min, typical, max];
  const head = isWindow(path) ? ['', 'lowest', 'highest'] : ['', 'lowest', 'typical', 'highest'];
  return { head, rows: [[written, ...values.map((value) => one(value, figure))]] };
}

/** What a rail needs is a window, in which typical has no meaning. */
function isWindow(path: string): boolean {
  return /\.needs\.[^.]+$/.test(path);
}

function isShare({ unit, max }: Figure): boolean {
  return unit === '1' && max <= 1;
}

function whatOf(figure: Figure): string {
  return isShare(figure) ? 'share' : unitFacts[figure.unit].what.replace(/^an? /, '');
}

function whole(figure: Figure): string {
  const { min, max } = figure;
  if (isLong(figure) && min === max) return formatDuration(min);
  if (!isShare(figure)) return formatBand(figure, figure.unit);
  return min === max ? formatPercent(min) : `${formatPercent(min)} to ${formatPercent(max)}`;
}

/** Hours and days are not counted in seconds. */
function isLong({ unit, min }: Figure): boolean {
  return unit === 's' && min >= 120;
}

function one(value: number, figure: Figure): string {
  if (isLong(figure)) return formatDuration(value);
  return isShare(figure) ? formatPercent(value) : formatQuantity(value, figure.unit);
}

function middle({ min, typical, max }: Figure): string {
  const centred = Math.abs(typical - (min + max) / 2) < 1e-9 * Math.abs(max - min);
  return centred ? 'Typical is the middle; the corners take the ends.' : 'The corners take the ends.';
}

/** A capacitor's value without a tolerance of its own takes that of its kind. */
function kindTolerance(analysis: BoardAnalysis, { span }: Figure): readonly string[] {
  const owner = capacitors(analysis).find(({ value }) => value?.span?.start === span?.start);
  const tolerance = owner?.kind.data?.tolerance;
  if (!owner || !tolerance || owner.toleranceGiven) return [];
  const name = owner.kind.ref?.name ?? owner.kind.data?.key ?? '';
  const assumed = owner.kind.assumed ? ', which is assumed' : '';
  return [
    `The corners take ${formatPercent(tolerance.min)} to +${formatPercent(tolerance.max)} of kind ${name}${assumed}.`,
  ];
}

function capacitors({ rails }: BoardAnalysis): readonly Capacitor[] {
  return [...rails.values()].flatMap(({ rail: { origin } }) => {
    if (origin?.kind !== 'pump') return [];
    const { flying, smoothing, reservoir } = origin.pump;
    return [...flying, ...smoothing, ...(reservoir ? [reservoir] : [])];
  });
}
