/**
 * Cures as edits of the file, for the rules: a figure replaced, a key put in.
 */
import type { BoardAnalysis } from '../analysis/types';
import type { DiodeData } from '../catalog/part';
import type { Capacitor, Diode, Pump, Rail } from '../model/board';
import { formatQuantity } from '../quantity/write';
import { insertAfter } from '../text/insert-key';
import type { Span } from '../text/span';
import type { Fix } from './finding';

export function replaceWith(title: string, span: Span | undefined, text: string): readonly Fix[] {
  return span ? [{ title, edits: [{ span, text }], preferred: true }] : [];
}

/** Written in plain letters, as files are typed: `4.7 uF`. */
export function plainQuantity(value: number, unit: Parameters<typeof formatQuantity>[1]): string {
  return formatQuantity(value, unit).replace('µ', 'u');
}

/** Rated voltages that capacitors are stocked in (common practice, no source), V. */
const ratings = [4, 6.3, 10, 16, 25, 35, 50, 63, 100, 160, 200, 250, 400, 450, 630, 1000];

/** The next usual rating that is at least `volts`. */
export function rateFor(capacitor: Capacitor, volts: number): readonly Fix[] {
  const rating = ratings.find((each) => each >= volts * (1 - 1e-9));
  if (rating === undefined) return [];
  const text = plainQuantity(rating, 'V');
  return replaceWith(`Rate it for ${text}`, capacitor.rated?.span, text);
}

/** A diode of the catalogue of the same kind that bears all of it: the weakest that does. */
export function diodeFor(
  { reading }: BoardAnalysis,
  diode: Diode,
  needs: { readonly reverse: number; readonly average: number; readonly peak: number },
): readonly Fix[] {
  const { ref, data } = diode;
  if (!ref || !data) return [];
  const bears = (each: DiodeData) =>
    (['reverse', 'average', 'peak'] as const).every((key) => (each[key]?.min ?? 0) >= needs[key]);
  const size = (each: DiodeData) => (each.average?.min ?? 0) * (each.reverse?.min ?? 0);
  const rank = (each: DiodeData) => (each.kind === data.kind ? 0 : 1);
  const found = [...reading.catalogue.diodes]
    .filter(bears)
    .sort((a, b) => rank(a) - rank(b) || size(a) - size(b))[0];
  return found ? replaceWith(`Use ${found.key}`, ref.span, found.key) : [];
}

/** A series resistor of so many ohm for the pump: the present one replaced, or the key put in behind its diode. */
export function seriesOf(analysis: BoardAnalysis, rail: Rail, ohms: number): readonly Fix[] {
  const pump = rail.origin?.kind === 'pump' ? rail.origin.pump : undefined;
  if (!pump || !(ohms > 0)) return [];
  const text = plainQuantity(ohms, 'ohm');
  const title = `Put ${text} in series with the drive of ${rail.name}`;
  if (pump.series) return replaceWith(title, pump.series.span, text);
  const edit = insertAfter(analysis.text, pump.keys.values(), lastValue(pump), 'series', text);
  return edit ? [{ title, edits: [edit], preferred: true }] : [];
}

/** A value of the pump that stands on one line. */
function lastValue(pump: Pump): Span {
  const diode = pump.diodes.length === 1 ? pump.diodes[0] : undefined;
  return diode?.ref?.span ?? pump.topologySpan ?? pump.span;
}
