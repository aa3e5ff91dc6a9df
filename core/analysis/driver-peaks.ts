/**
 * Rated parts of a driver and the largest currents in them: in every period, and while the pumps behind it come up.
 */
import type { Figure } from '../quantity/figure';
import type { Span } from '../text/span';
import { pinResistance } from './pin-resistance';
import type { BoardAnalysis, DriverResult, DriverUse } from './types';

export interface RatedPart {
  /** `the npn of amp`. */
  readonly what: string;
  readonly path: string;
  readonly span: Span;
  readonly rating: Figure;
  /** Largest current in the solved period, A: pumps behind one driver charge at the same moments. */
  readonly steady: number;
  /** No more than this can flow at switch-on, A: below the rating nobody needs to follow it. */
  readonly most: number;
  /** Rails whose pumps the driver lifts. */
  readonly rails: readonly string[];
}

/** The current of one use in the part, A; at switch-on undefined where it could not be followed. */
interface Way {
  readonly steady: (use: DriverUse) => number;
  readonly starting: (use: DriverUse) => number | undefined;
  readonly most: (use: DriverUse) => number;
}

export interface DriverPeak extends RatedPart {
  /** Largest current while all pumps come up together, A; computed at the first call. */
  readonly inrush: () => number | undefined;
}

/** Parts without a rating are left out. */
export function driverPeaks(analysis: BoardAnalysis, result: DriverResult): readonly DriverPeak[] {
  const { driver, uses } = result;
  const { stage, name } = driver;
  if (!stage || uses.length === 0) return [];
  const part = (
    label: string,
    key: string,
    place: { readonly span: Span } | undefined,
    rating: Figure | undefined,
    way: Way,
  ): readonly DriverPeak[] => {
    if (!rating || !place) return [];
    return [
      {
        what: `${label} of ${name}`,
        path: `${driver.path}.${stage.kind}.${key}`,
        span: place.span,
        rating,
        steady: total(uses, way.steady) ?? 0,
        most: total(uses, way.most) ?? Number.POSITIVE_INFINITY,
        inrush: () => total(uses, way.starting),
        rails: uses.map(({ railName }) => railName),
      },
    ];
  };
  switch (stage.kind) {
    case 'push-pull':
    case 'follower':
      return (['npn', 'pnp'] as const).flatMap((which) => {
        const data = stage[which]?.data;
        return part(`the ${which}`, which, stage[which], data?.current, {
          steady: (use) => use.stage?.collectorPeaks[which] ?? 0,
          starting: (use) => startOf(analysis, use)?.transistorPeaks?.[use.index]?.[which],
          // Base current times gain is all that it carries.
          most: (use) => (use.stage && data ? data.gain.typical * use.stage.baseCurrent : Number.NaN),
        });
      });
    case 'mosfet-pair':
      return (['nmos', 'pmos'] as const).flatMap((which) => {
        const up = which === 'pmos';
        const data = stage[which]?.data;
        return part(
          up ? 'the p-channel MOSFET' : 'the n-channel MOSFET',
          which,
          stage[which],
          data?.current,
          {
            steady: ({ drive }) => (up ? drive.peakSource : drive.peakSink),
            starting: (use) => tracePeak(analysis, use, up ? 'source' : 'sink'),
            most: (use) => bound(analysis, use, data?.onResistance.typical ?? 0),
          },
        );
      });
    case 'gates': {
      const data = stage.part?.data;
      const count = Math.max(1, Math.round(stage.parallel?.typical ?? 1));
      const larger = ({ drive }: DriverUse) => Math.max(drive.peakSource, drive.peakSink);
      const starting = (use: DriverUse) => {
        const [out, into] = [tracePeak(analysis, use, 'source'), tracePeak(analysis, use, 'sink')];
        return out === undefined || into === undefined ? undefined : Math.max(out, into);
      };
      const most = (use: DriverUse) => {
        const volts = analysis.rails.get(use.driverRail)?.voltage?.typical ?? Number.NaN;
        const ohms = (level: 'high' | 'low') => data && pinResistance(data.output, level, volts)?.typical;
        return bound(analysis, use, Math.min(ohms('high') ?? 0, ohms('low') ?? 0) / count);
      };
      const shared = (figure: (use: DriverUse) => number | undefined) => (use: DriverUse) => {
        const amps = figure(use);
        return amps === undefined ? undefined : amps / count;
      };
      return [
        ...part('each gate', 'part', stage.part, data?.absolute ?? data?.output.absolute, {
          steady: (use) => larger(use) / count,
          starting: shared(starting),
          most: (use) => most(use) / count,
        }),
        // All gates in parallel are taken to share one package.
        ...part('a supply pin of the gates', 'part', stage.part, data?.total, {
          steady: larger,
          starting,
          most,
        }),
      ];
    }
    case 'pins':
      return [];
  }
}

/** Undefined as soon as one of them is. */
function total(
  uses: readonly DriverUse[],
  figure: (use: DriverUse) => number | undefined,
): number | undefined {
  let sum = 0;
  for (const use of uses) {
    const amps = figure(use);
    if (amps === undefined || Number.isNaN(amps)) return undefined;
    sum += amps;
  }
  return sum;
}

function startOf({ rails }: BoardAnalysis, { railName }: DriverUse) {
  return rails.get(railName)?.transients?.();
}

/** Largest current out of or into the driver's output on the way up. */
function tracePeak(analysis: BoardAnalysis, use: DriverUse, way: 'source' | 'sink'): number | undefined {
  const trace = startOf(analysis, use)?.startTrace?.drives[use.index];
  if (!trace) return undefined;
  return trace.reduce((most, amps) => Math.max(most, way === 'source' ? amps : -amps), 0);
}

/** Ohm's law with empty capacitors: all the voltage there is over the resistance in every path. */
function bound({ rails }: BoardAnalysis, use: DriverUse, ohms: number): number {
  const origin = rails.get(use.railName)?.rail.origin;
  if (origin?.kind !== 'pump') return Number.POSITIVE_INFINITY;
  const { input, series } = origin.pump;
  const volts = (name: string | undefined) =>
    Math.abs((name === undefined ? undefined : rails.get(name)?.voltage?.typical) ?? 0);
  const standing = input && input.name !== 'ground' ? volts(input.name) : 0;
  return (volts(use.driverRail) + standing) / (ohms + (series?.typical ?? 0));
}
