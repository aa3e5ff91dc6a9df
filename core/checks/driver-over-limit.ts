/**
 * Transistors, MOSFETs and gates of a driver beyond the current they are rated for: in every period an error, only
 * while the pump comes up a warning.
 */
import { type DriverPeak, driverPeaks } from '../analysis/driver-peaks';
import type { BoardAnalysis, DriverResult } from '../analysis/types';
import { originWords } from '../analysis/words';
import { nextPreferredUp } from '../quantity/preferred';
import { formatPercent, formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding, Fix } from './finding';
import { seriesOf } from './fixes';

export const driverOverLimit: Check = {
  code: 'driver-over-limit',
  title: 'Driver beyond the current it is rated for',
  severity: 'error',
  why: 'A transistor loses its gain and its bond wires age beyond their rating, and a logic gate may latch up.',
  run: (analysis) =>
    [...analysis.drivers.values()].flatMap((result) =>
      driverPeaks(analysis, result).flatMap((peak) => judge(analysis, result, peak)),
    ),
};

function judge(analysis: BoardAnalysis, { uses }: DriverResult, peak: DriverPeak): readonly Finding[] {
  const limit = peak.rating.min * (1 + 1e-9);
  const rail = analysis.rails.get(uses[0]?.driverRail ?? '')?.voltage?.typical;
  if (peak.steady > limit) return [toFinding(analysis, peak, peak.steady, rail, false)];
  // The way up costs more than the steady state: it is followed only where it can matter.
  if (!(peak.most > limit)) return [];
  const starting = peak.inrush();
  if (starting === undefined || !(starting > limit)) return [];
  return [toFinding(analysis, peak, starting, rail, true)];
}

function toFinding(
  analysis: BoardAnalysis,
  { what, path, span, rating, rails }: DriverPeak,
  amps: number,
  railVolts: number | undefined,
  starting: boolean,
): Finding {
  const most = formatQuantity(rating.min, 'A');
  const flows = formatQuantity(amps, 'A');
  const ratio = amps / rating.min;
  const over = ratio < 2 ? `${formatPercent(ratio - 1, 2)} above` : `${Number(ratio.toPrecision(2))} times`;
  const ohms = missingOhms(amps, rating.min, railVolts);
  const when = starting
    ? `while the pump of ${rails.join(' and ')} comes up from empty capacitors`
    : `at the peaks of every period (pump of ${rails.join(' and ')})`;
  return {
    code: 'driver-over-limit',
    severity: starting ? 'warning' : 'error',
    at: path,
    span,
    message: `${what[0]!.toUpperCase()}${what.slice(1)} carries up to ${flows} ${when}, ${over} the ${most} it is rated for. ${cure(ohms)}`,
    expected: `at most ${most}`,
    actual: flows,
    source: originWords(rating.origin),
    // In steady state more resistance costs the rail its voltage: there the part is the thing to change.
    fixes: starting ? fixesFor(analysis, rails, ohms) : [],
    related: rails.flatMap((name) => {
      const rail = analysis.rails.get(name)?.rail;
      return rail ? [{ span: rail.nameSpan, message: `${name} is pumped through it` }] : [];
    }),
  };
}

/** The current is a voltage over the resistance in its way: what is missing follows from the ratio. */
function missingOhms(amps: number, limit: number, railVolts: number | undefined): number | undefined {
  const missing = railVolts === undefined ? 0 : Math.abs(railVolts) * (1 / limit - 1 / amps);
  return missing > 0 ? nextPreferredUp(missing, 'E12') : undefined;
}

function cure(ohms: number | undefined): string {
  if (ohms === undefined) return 'A larger class of part, or a resistor in series with the drive, cures it.';
  return `A larger class of part, or about ${formatQuantity(ohms, 'ohm')} in series with the drive (\`series\`), cures it.`;
}

/** Only where one pump stands behind the driver is its series resistor the whole answer. */
function fixesFor(
  analysis: BoardAnalysis,
  rails: readonly string[],
  ohms: number | undefined,
): readonly Fix[] {
  const rail = rails.length === 1 ? analysis.rails.get(rails[0]!)?.rail : undefined;
  const present = rail?.origin?.kind === 'pump' ? (rail.origin.pump.series?.typical ?? 0) : 0;
  return rail && ohms !== undefined ? seriesOf(analysis, rail, nextPreferredUp(present + ohms, 'E12')) : [];
}
