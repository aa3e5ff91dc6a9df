/**
 * The card of a quantity in the file: what it was read as.
 */
import type { BoardAnalysis } from '../analysis/types';
import { schemaAt } from '../format';
import type { ReadQuantity } from '../model/context';
import type { Figure } from '../quantity/figure';
import { unitFacts } from '../quantity/units';
import { formatBand, formatPercent, formatQuantity } from '../quantity/write';
import type { Card } from './card';

export function quantityCard(analysis: BoardAnalysis, quantity: ReadQuantity): Card {
  const { figure, span, path, expression } = quantity;
  const place = analysis.reading.nodeAt(span.start);
  const written = analysis.text.slice(span.start, span.end).trim();
  const schema = schemaAt(place.path);
  const { what } = unitFacts[figure.unit];
  const banded = figure.min !== figure.max;
  return {
    span,
    title: `${path} · ${what.replace(/^an? /, '')}`,
    answer: `${wholeValue(figure)}${expression ? ', the value of the expression' : ''}.`,
    state: 'neutral',
    head: banded ? ['lowest', 'typical', 'highest'] : ['', ''],
    rows: banded
      ? [[figure.min, figure.typical, figure.max].map((value) => one(value, figure))]
      : [['read from', written]],
    origins: [
      ...(banded ? [`Read from ${written}.`] : []),
      ...(figure.min === figure.max ? [] : middle(figure)),
      ...(schema?.row ? [schema.row.doc] : []),
    ],
  };
}

function wholeValue(figure: Figure): string {
  return figure.unit === '1' && figure.max <= 1 && figure.min !== figure.max
    ? `${formatPercent(figure.min)} to ${formatPercent(figure.max)}`
    : figure.unit === '1' && figure.max <= 1
      ? formatPercent(figure.typical)
      : formatBand(figure, figure.unit);
}

function one(value: number, figure: Figure): string {
  return figure.unit === '1' && figure.max <= 1 ? formatPercent(value) : formatQuantity(value, figure.unit);
}

function middle({ min, typical, max, unit }: Figure): readonly string[] {
  const centre = (min + max) / 2;
  return Math.abs(typical - centre) < 1e-9 * Math.abs(max - min)
    ? [`Typical is the middle, ${formatQuantity(typical, unit)}; the corners take the ends.`]
    : ['The corners take the ends.'];
}
