/**
 * The card of a capacitor of a pump: what it keeps of its value where it works, what it bears, and which terminal is
 * the positive one.
 */
import { sideWords } from '../analysis/polarity';
import { type StressedCapacitor, stressedParts } from '../analysis/pump-stress';
import type { BoardAnalysis, RailResult } from '../analysis/types';
import { originWords } from '../analysis/words';
import type { Capacitor } from '../model/board';
import type { ReadQuantity } from '../model/context';
import { formatPercent, formatQuantity } from '../quantity/write';
import type { Place } from '../syntax/locate';
import { type Span, touches } from '../text/span';
import type { Card } from './card';

/** On the key in front of a capacitor, on a bare value, or between the keys of its entry. */
export function capacitorCardAt(
  analysis: BoardAnalysis,
  place: Place,
  quantity: ReadQuantity | undefined,
  offset: number,
): Card | undefined {
  const path = place.path.join('.');
  const onColumn = place.on === 'key' && /^rails\..*\.pump\.(flying|smoothing|reservoir)$/.test(path);
  if (place.on === 'key' && !onColumn) return undefined;
  const meant = ({ capacitor }: StressedCapacitor) =>
    onColumn
      ? capacitor.path === path || capacitor.path.startsWith(`${path}[`)
      : touches(capacitor.span, offset) && (!quantity || quantity.path === capacitor.path);
  for (const result of analysis.rails.values()) {
    const parts = stressedParts(result).capacitors.filter(meant);
    if (parts.length > 0) return capacitorCard(result, parts, onColumn ? place.span : undefined);
  }
  return undefined;
}

/** `parts`: the places that the entry stands for, one or one in each stage. */
function capacitorCard(result: RailResult, parts: readonly StressedCapacitor[], span?: Span): Card {
  const [first] = parts as readonly [StressedCapacitor];
  const { capacitor } = first;
  const kind = capacitor.kind.data;
  const named =
    parts.length === 1 ? first.figures.key : `${first.figures.key} to ${parts.at(-1)!.figures.key}`;
  return {
    span: span ?? capacitor.span,
    title: `${named} · ${kind?.title ?? 'capacitor'}`,
    answer: `${leftWords(capacitor, parts)}${plusWords(first)}`,
    state: stateOf(parts),
    head: ['', 'works as', 'bears', 'at most', 'current'],
    rows: parts.map(({ figures, highest }) => [
      figures.key.slice(result.rail.name.length + 1),
      formatQuantity(figures.effective, 'F', 3),
      formatQuantity(Math.abs(figures.average), 'V', 3),
      formatQuantity(highest, 'V', 3),
      `${formatQuantity(figures.rmsCurrent, 'A', 3)} rms`,
    ]),
    origins: originsOf(capacitor),
  };
}

function leftWords({ value }: Capacitor, parts: readonly StressedCapacitor[]): string {
  const least = parts.reduce((a, b) => (b.figures.effective < a.figures.effective ? b : a)).figures;
  const share = value ? least.effective / value.typical : 1;
  const works = formatQuantity(least.effective, 'F', 3);
  if (Math.abs(share - 1) < 5e-3) return `Works with its whole ${works}`;
  return `Works as ${works}, ${formatPercent(share, 2)} of its value`;
}

function plusWords({ capacitor, figures }: StressedCapacitor): string {
  if (!capacitor.kind.data?.polarised) return '.';
  const plus = sideWords(figures.key, figures.average >= 0 ? 'diodes' : 'away');
  return `; positive terminal at ${plus}.`;
}

function stateOf(parts: readonly StressedCapacitor[]): Card['state'] {
  const rated = parts[0]?.capacitor.rated?.min;
  if (rated === undefined) return 'neutral';
  const use = Math.max(...parts.map(({ highest }) => highest)) / rated;
  return use > 1 ? 'bad' : use > 0.8 ? 'close' : 'good';
}

function originsOf({ kind, rated, esr }: Capacitor): readonly string[] {
  const bias = kind.data?.bias?.[0]?.left.origin;
  return [
    ...(rated
      ? []
      : ['No rated voltage is written: what direct voltage leaves of the value is not counted.']),
    ...(bias && rated ? [`Value under direct voltage: ${originWords(bias)}.`] : []),
    ...(esr
      ? [`Series resistance ${formatQuantity(esr.typical, 'ohm', 2)}: ${originWords(esr.origin)}.`]
      : []),
    ...(kind.assumed ? ['Its kind is assumed.'] : []),
    ...(kind.data?.polarised
      ? ['Electrolytic capacitors burst when reversed: check before power goes on.']
      : []),
  ];
}
