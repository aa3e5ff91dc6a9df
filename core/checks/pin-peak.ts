/**
 * Peaks of a pin's current above its absolute maximum while its steady current is below: short, once each edge.
 */
import type { BoardAnalysis, PinResult } from '../analysis/types';
import { originWords } from '../analysis/words';
import { nextPreferredUp } from '../quantity/preferred';
import { formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding, Fix } from './finding';
import { seriesOf } from './fixes';
import { steadyCurrent } from './pin-current';
import { drivenRails, pinPlace } from './pin-place';

export const pinPeak: Check = {
  code: 'pin-peak',
  title: 'Peaks above a pin’s absolute maximum',
  severity: 'warning',
  why: 'Most data sheets give one current for a pin and no time for it; peaks at each edge are common practice but nobody promises them.',
  run: (analysis) => [...analysis.pins.values()].flatMap((pin) => judge(analysis, pin)),
};

function judge(analysis: BoardAnalysis, pin: PinResult): readonly Finding[] {
  const limit = pin.data.absolute;
  const peak = Math.max(pin.peakSource ?? 0, pin.peakSink ?? 0);
  if (limit === undefined || !(peak > limit.min * (1 + 1e-9))) return [];
  const steady = steadyCurrent(pin);
  if (steady && steady.amps > limit.min * (1 + 1e-9)) return [];
  const most = formatQuantity(limit.min, 'A');
  const way = (pin.peakSource ?? 0) >= (pin.peakSink ?? 0) ? 'out of' : 'into';
  const beside = steady ? `, while its ${steady.what} is ${formatQuantity(steady.amps, 'A')}` : '';
  return [
    {
      code: 'pin-peak',
      severity: 'warning',
      ...pinPlace(analysis, pin),
      message: `Peaks of ${formatQuantity(peak, 'A')} flow ${way} ${pin.key} at each edge, ${Number((peak / limit.min).toPrecision(2))} times its absolute maximum of ${most}${beside}. ${cure(analysis, pin, peak, limit.min)}`,
      expected: `peaks up to ${most}`,
      actual: formatQuantity(peak, 'A'),
      source: originWords(limit.origin),
      related: drivenRails(analysis, pin),
      fixes: fixesFor(analysis, pin, peak / limit.min),
    },
  ];
}

/** With more resistance the capacitors no longer equalise, and the voltage behind the peak grows by about this. */
const grows = 1.4;

/** The peak is a voltage over the resistance in its way: what is missing there follows from the ratio. */
function missingOhms(pin: PinResult, ratio: number, series = 0): number | undefined {
  const present = Math.max(pin.highResistance?.typical ?? 0, pin.lowResistance?.typical ?? 0) + series;
  return present > 0 ? nextPreferredUp(present * (grows * ratio - 1), 'E12') : undefined;
}

/** Only where one pump hangs on the pin is its series resistor the whole answer. */
function fixesFor(analysis: BoardAnalysis, pin: PinResult, ratio: number): readonly Fix[] {
  const rail = pin.drives.length === 1 ? analysis.rails.get(pin.drives[0]!)?.rail : undefined;
  const present = rail?.origin?.kind === 'pump' ? (rail.origin.pump.series?.typical ?? 0) : 0;
  const ohms = missingOhms(pin, ratio, present);
  return rail && ohms ? seriesOf(analysis, rail, nextPreferredUp(present + ohms, 'E12')) : [];
}

function cure(analysis: BoardAnalysis, pin: PinResult, peak: number, limit: number): string {
  const ratio = peak / limit;
  if (pin.pumps.length === 0 && pin.charges.length > 0) return gateCure(analysis, pin, peak, limit);
  const proposed = missingOhms(pin, ratio);
  if (proposed === undefined) return 'A resistor in series with the drive bounds them.';
  return `A resistor of about ${formatQuantity(proposed, 'ohm')} in series with the drive (\`series\`) bounds them; the rail pays for it.`;
}

/** A gate resistor may be there already, so what is missing follows from the whole swing. */
function gateCure(analysis: BoardAnalysis, pin: PinResult, peak: number, limit: number): string {
  const swing = analysis.rails.get(pin.chip.rail?.name ?? '')?.voltage?.typical;
  const missing = swing === undefined ? 0 : swing / limit - swing / peak;
  const more =
    missing > 0 ? `about ${formatQuantity(nextPreferredUp(missing, 'E12'), 'ohm')} more` : 'more resistance';
  return `They charge the gates of ${pin.charges.join(' and ')}: ${more} in front of them (\`gate\`) bounds them and slows the edges.`;
}
