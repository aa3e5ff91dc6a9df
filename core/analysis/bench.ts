/**
 * Entries of `bench`: each measured point against the prediction at its own load, typical and over tolerance and
 * temperature, and what would explain the difference.
 */
import type { BenchPoint } from '../model/board';
import { usualCauses } from './bench-causes';
import { compareBench } from './bench-compare';
import { explainBench } from './bench-explain';
import type { BenchSite } from './bench-model';
import { benchModel } from './bench-rail';
import { isGap } from './gap';
import { once } from './once';
import type { BenchResult } from './types';

export function benchResults(site: BenchSite): readonly BenchResult[] {
  return site.board.bench.map((point) => benchResult(site, point));
}

function benchResult(site: BenchSite, point: BenchPoint): BenchResult {
  const rail = point.rail && site.board.rails.get(point.rail.name);
  if (!rail) return nothing(point, 'it names no rail of the board');
  if (!point.load) return { ...nothing(point, 'its load is not known'), rail };
  const model = benchModel(site, rail, point, point.load);
  if (isGap(model)) return { ...nothing(point, model.because), rail };
  const predicted = model.bands();
  const voltage = point.voltage ? compareBench('voltage', point.voltage, predicted.voltage) : null;
  const ripple =
    point.ripple && predicted.ripple ? compareBench('ripple', point.ripple, predicted.ripple) : null;
  const compared = [voltage, ripple].filter((comparison) => comparison !== null);
  return {
    point,
    rail,
    ...(model.mode === undefined ? {} : { mode: model.mode }),
    predicted,
    voltage,
    ripple,
    inside: compared.length > 0 ? compared.every(({ outside }) => outside === 0) : null,
    explanation: once(() => explainBench(model, { voltage, ripple })),
    causes: (of) => {
      const comparison = { voltage, ripple }[of];
      if (!comparison || comparison.outside === 0) return [];
      return usualCauses(model, rail, point, of, comparison);
    },
  };
}

function nothing(point: BenchPoint, because: string): BenchResult {
  return {
    point,
    predicted: null,
    voltage: null,
    ripple: null,
    inside: null,
    because,
  };
}
