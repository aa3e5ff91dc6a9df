/**
 * The card of a catalogue entry, or of one of the file's own: every figure with its band and its origin.
 */
import { deference } from '../analysis/battery-words';
import { originWords } from '../analysis/words';
import type { OpenPoint, PartEntry, ResistancePoint, TestPoint } from '../catalog/part';
import type { Figure } from '../quantity/figure';
import { formatBand, formatPercent, formatQuantity } from '../quantity/write';
import type { Span } from '../text/span';
import type { Card } from './card';

/** `setting` names one drive setting of a chip whose figures are meant. */
export function partCard(part: PartEntry, span: Span): Card {
  const figures = figuresOf(part, '');
  const notes = [...new Set(figures.map(({ origin }) => origin))];
  const few = notes.length <= mostNotes;
  const mark = (origin: string) => `${notes.indexOf(origin) + 1}`;
  return {
    span,
    title: `${part.key} · ${part.title}`,
    answer: `${part.title}.`,
    state: 'neutral',
    head: ['', 'value', 'from'],
    rows: figures
      .slice(0, mostRows)
      .map(({ name, value, origin }) => [name, value, few ? mark(origin) : origin]),
    origins: [
      ...(few ? notes.map((note, k) => `${k + 1}: ${note}.`) : []),
      `Entry: ${part.source}.`,
      ...('caution' in part ? [`Caution: ${part.caution} ${deference}`] : []),
      ...(figures.length > mostRows ? [`${figures.length - mostRows} more figures are left out here.`] : []),
    ],
  };
}

/** A hover is read at a glance. */
const mostRows = 14;
const mostNotes = 6;

interface Line {
  readonly name: string;
  readonly value: string;
  readonly origin: string;
}

function figuresOf(data: object, prefix: string): readonly Line[] {
  return Object.entries(data).flatMap(([key, value]): readonly Line[] => {
    const name = `${prefix}${hyphened(key)}`;
    if (isFigure(value)) return [lineOf(name, value)];
    if (isCurve(value)) return [curveOf(name, value)];
    if (Array.isArray(value))
      return value.flatMap((item) => (isTestPoint(item) ? [pointOf(name, item)] : []));
    // Settings and single pins repeat the common figures; the pin's own card shows them.
    if (key === 'strengths' || key === 'pin' || typeof value !== 'object' || value === null) return [];
    return figuresOf(value, key === 'pins' ? '' : `${name} `);
  });
}

function lineOf(key: string, figure: Figure): Line {
  // The one figure whose name does not say that it counts over a time.
  const name = key === 'self-discharge' ? `${key} a year` : key;
  const value =
    figure.unit === '1' && shares.has(name) ? bandInPercent(figure) : formatBand(figure, figure.unit);
  return { name, value, origin: originWords(figure.origin) };
}

const shares: ReadonlySet<string> = new Set([
  'tolerance',
  'temperature',
  'loss',
  'usable',
  'self-discharge a year',
]);

function bandInPercent({ min, typical, max }: Figure): string {
  if (min === max) return formatPercent(min);
  // A tolerance is about nothing; a share has a typical value worth naming.
  const usual = min > 0 ? `, typically ${formatPercent(typical)}` : '';
  return `${formatPercent(min)} to ${formatPercent(max)}${usual}`;
}

function pointOf(name: string, { current, voltage, supply }: TestPoint): Line {
  return {
    name: `${name} at ${formatQuantity(current.typical, 'A')}, ${formatQuantity(supply.typical, 'V')}`,
    value: formatBand(voltage, 'V'),
    origin: originWords(voltage.origin),
  };
}

type CurvePoint = OpenPoint | ResistancePoint;

/** All of a curve on one line: `4.2, 4.06 .. 3 V` at 100, 90 .. 0 %. */
function curveOf(name: string, points: readonly CurvePoint[]): Line {
  const figures = points.map((point) => ('volts' in point ? point.volts : point.ohms));
  const lefts = points.map(({ left }) => `${Math.round(100 * left)}`);
  const few = lefts.length <= 5 ? lefts.join(', ') : `${lefts[0]}, ${lefts[1]} .. ${lefts.at(-1)}`;
  return {
    name: `${name} at ${few} % left`,
    value: figures.map(({ typical, unit }) => formatQuantity(typical, unit)).join(', '),
    origin: originWords(figures[0]!.origin),
  };
}

function isCurve(value: unknown): value is readonly CurvePoint[] {
  if (!Array.isArray(value) || value.length === 0) return false;
  return value.every(
    (point) =>
      typeof point === 'object' && point !== null && 'left' in point && ('volts' in point || 'ohms' in point),
  );
}

/** As the file would write the key: `highResistance` is `high-resistance`. */
function hyphened(key: string): string {
  return key.replace(/[A-Z]/g, (letter) => `-${letter.toLowerCase()}`);
}

function isFigure(value: unknown): value is Figure {
  return (
    typeof value === 'object' && value !== null && 'unit' in value && 'typical' in value && 'origin' in value
  );
}

function isTestPoint(value: unknown): value is TestPoint {
  return (
    typeof value === 'object' &&
    value !== null &&
    'current' in value &&
    'voltage' in value &&
    'supply' in value
  );
}
