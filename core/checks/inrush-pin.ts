/**
 * The first pulse into empty capacitors against the absolute maximum of the pin that drives it. Information, not a
 * warning: makers print that limit for steady current, and pins of real chips saturate before they reach such pulses.
 */
import { inrushPeak } from '../analysis/inrush-peak';
import type { BoardAnalysis, PinResult } from '../analysis/types';
import { originWords } from '../analysis/words';
import { inrushResistor } from '../compute/inrush';
import { nextPreferredUp } from '../quantity/preferred';
import { formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';
import { seriesOf } from './fixes';
import { drivenRails, pinPlace } from './pin-place';

export const inrushPin: Check = {
  code: 'inrush-pin',
  title: 'First pulse above a pin’s absolute maximum',
  severity: 'information',
  why: 'At switch-on the capacitors are empty and only resistance limits the first edges; most pins survive it, but no data sheet promises that.',
  run: (analysis) => [...analysis.pins.values()].flatMap((pin) => judge(analysis, pin)),
};

function judge(analysis: BoardAnalysis, pin: PinResult): readonly Finding[] {
  const limit = pin.data.absolute;
  if (!limit || pin.pumps.length === 0) return [];
  // Steady peaks beyond the limit say the same and more.
  if (Math.max(pin.peakSource ?? 0, pin.peakSink ?? 0) > limit.min) return [];
  if (!(bound(analysis, pin) > limit.min)) return [];
  const peak = inrushPeak(pin, analysis);
  if (peak === undefined || !(peak > limit.min * (1 + 1e-9))) return [];
  const most = formatQuantity(limit.min, 'A');
  const ohms = resistor(analysis, pin, limit.min);
  const cure =
    ohms === undefined
      ? 'A resistor in series with the drive (`series`) bounds it.'
      : `A resistor of ${formatQuantity(ohms, 'ohm')} in series with the drive (\`series\`) bounds it; it adds about ${formatQuantity(4 * ohms, 'ohm', 2)} to the output resistance.`;
  const rail = pin.drives.length === 1 ? analysis.rails.get(pin.drives[0]!)?.rail : undefined;
  const present = rail?.origin?.kind === 'pump' ? (rail.origin.pump.series?.typical ?? 0) : 0;
  return [
    {
      code: 'inrush-pin',
      severity: 'information',
      ...pinPlace(analysis, pin),
      message: `At switch-on the first pulses through ${pin.key} reach ${formatQuantity(peak, 'A')}, ${Number((peak / limit.min).toPrecision(2))} times its absolute maximum of ${most}. ${cure}`,
      expected: `peaks up to ${most}`,
      actual: formatQuantity(peak, 'A'),
      source: originWords(limit.origin),
      related: drivenRails(analysis, pin),
      fixes:
        rail && ohms !== undefined ? seriesOf(analysis, rail, nextPreferredUp(present + ohms, 'E12')) : [],
    },
  ];
}

/** The whole rail across the least resistance of the pin: no pulse is larger, and it costs nothing to know. */
function bound({ chips }: BoardAnalysis, pin: PinResult): number {
  const volts = chips.get(pin.chip.name)?.voltage?.max;
  const ohms = Math.min(
    pin.highResistance?.min ?? Number.POSITIVE_INFINITY,
    pin.lowResistance?.min ?? Number.POSITIVE_INFINITY,
  );
  return volts === undefined ? Number.POSITIVE_INFINITY : pin.pumps.length * (volts / ohms);
}

/** What is missing to the supply over the limit, the diode and what the capacitors already hold left out: cautious. */
function resistor({ chips }: BoardAnalysis, pin: PinResult, limitA: number): number | undefined {
  const volts = chips.get(pin.chip.name)?.voltage?.typical;
  const own = pin.highResistance?.typical;
  const missing =
    volts === undefined || own === undefined ? undefined : inrushResistor(volts, 0, own, limitA);
  return missing ? nextPreferredUp(missing, 'E12') : undefined;
}
