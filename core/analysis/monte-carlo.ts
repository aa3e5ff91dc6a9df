/**
 * A Monte Carlo run of the whole board: boards drawn by lot within the bands of their parts, each solved in every
 * mode and held against `needs`. One step for each sample, so that a host can show progress and stop.
 *
 * Same text, seed and options: same result, on every machine.
 */
import { sampledCoverage } from '../compute/sample-size';
import type { Rail } from '../model/board';
import { isGap } from './gap';
import { Lots } from './lots';
import { type SampledBoard, sampledBoard } from './sampled-rails';
import type { BoardAnalysis } from './types';
import type { RailYield, YieldOptions, YieldProgress, YieldResult } from './yield-result';
import { RailTally, Tally, type Verdict } from './yield-tally';

export const usualSamples = 1000;
/** More would keep the values of all samples in memory for hours to no use. */
export const mostSamples = 1_000_000;
const level = 0.95;

/** Yields before the first and after each sample; the run itself begins with the second call. */
export function* monteCarlo(
  analysis: BoardAnalysis,
  options: YieldOptions,
): Generator<YieldProgress, YieldResult, void> {
  const samples = Math.min(mostSamples, whole(options.samples, usualSamples, 1));
  const seed = whole(options.seed, 1, Number.MIN_SAFE_INTEGER);
  const distribution = options.distribution ?? 'uniform';
  yield { done: 0, samples };
  const { board } = analysis.reading;
  const lots = new Lots(seed, distribution);
  const sampled = sampledBoard(board, lots);
  const tallies = [...board.rails.values()]
    .filter(isJudged)
    .map((rail) => tallyOf(rail, analysis, sampled, lots));
  const open = tallies.filter((tally) => tally instanceof RailTally);
  const together = new Tally();
  for (let done = 1; done <= samples && open.length > 0; done++) {
    // A board on which nothing has a band is the same every time: what it reached first stands.
    if (done === 1 || lots.quantities.length > 0) sampled.next();
    lots.draw(done - 1);
    together.add(worst(open.map((tally) => tally.add(done))));
    yield { done, samples };
  }
  const rails = tallies.map((tally) => (tally instanceof RailTally ? tally.result : tally));
  const outcome = open.length === tallies.length ? together.outcome : null;
  return {
    file: analysis.file,
    board: board.title ?? null,
    samples,
    seed,
    distribution,
    quantities: lots.quantities.length,
    outcome,
    rails,
    notJudged: [...board.rails.values()].flatMap(unjudgedNeeds),
    confidence: {
      level,
      oneSided: sampledCoverage(samples, level, 1) ?? null,
      twoSided: sampledCoverage(samples, level, 2) ?? null,
      mayFail: outcome?.met === samples ? 1 - sampledCoverage(samples, level, 1)! : null,
    },
  };
}

/** A board is as good as its worst rail. */
function worst(verdicts: readonly Verdict[]): Verdict {
  if (verdicts.includes('missed')) return 'missed';
  return verdicts.includes('unsolved') ? 'unsolved' : 'met';
}

function whole(value: number, fallback: number, least: number): number {
  return Number.isFinite(value) ? Math.max(least, Math.floor(value)) : fallback;
}

const isPumped = ({ origin }: Rail): boolean => origin?.kind === 'pump';

/** Rules judge ripple of pumps only: what a supply has of it stands nowhere in the file. */
function isJudged(rail: Rail): boolean {
  const { voltage, swing, ripple } = rail.needs ?? {};
  return voltage !== undefined || swing !== undefined || (ripple !== undefined && isPumped(rail));
}

function unjudgedNeeds(rail: Rail): { rail: string; need: string }[] {
  const { needs, name } = rail;
  const others = (['start', 'discharge'] as const).filter((need) => needs?.[need]);
  const ripple = needs?.ripple && !isPumped(rail) ? ['ripple'] : [];
  return [...ripple, ...others].map((need) => ({ rail: name, need }));
}

function tallyOf(
  rail: Rail,
  analysis: BoardAnalysis,
  sampled: SampledBoard,
  lots: Lots,
): RailTally | RailYield {
  const found = sampled.rail(rail.name);
  const typical = analysis.rails.get(rail.name)?.voltage?.typical ?? 0;
  if (!isGap(found)) return new RailTally(found, sampled.modes, lots, isPumped(rail), typical);
  return {
    rail: rail.name,
    outcome: null,
    because: found.because,
    misses: { low: null, high: null, ripple: null },
    weakest: null,
    strongest: null,
    mostRipple: null,
    modes: [],
    leading: [],
  };
}
