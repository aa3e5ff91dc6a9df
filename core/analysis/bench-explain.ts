/**
 * What could make a board differ from its prediction within its tolerances: which quantity alone, which two, or only
 * all of them. For what no tolerance explains: which quantity would have to leave its band least.
 */
import { reads } from './bench-compare';
import type { BenchModel } from './bench-model';
import { pairForBoth } from './bench-pair';
import {
  type Approach,
  approaches,
  type Found,
  type Goal,
  readingOf,
  type Step,
  settle,
  speed,
} from './bench-search';
import type { Target } from './pump-corners';
import { hasBand, type Variable } from './pump-model';
import type { BenchComparison, BenchExplanation, BenchMove } from './types';

export type Compared = Readonly<Record<Target, BenchComparison | null>>;

/** Single quantities that are tried by solving, and those that are told. */
const mostTried = 6;
const mostTold = 3;
const targets: readonly Target[] = ['voltage', 'ripple'];

export function explainBench(model: BenchModel, compared: Compared): BenchExplanation {
  const off = targets.filter((target) => {
    const comparison = compared[target];
    return comparison !== null && !reads(comparison, comparison.predicted.typical);
  });
  const none: BenchExplanation = {
    moves: [],
    together: false,
    all: null,
    beyond: off.flatMap((target) => {
      const comparison = compared[target];
      return comparison && comparison.outside !== 0
        ? beyondTheirBand(model, compared, goalOf(target, comparison))
        : [];
    }),
  };
  const target = off.find((candidate) => compared[candidate]?.outside === 0);
  if (!target) return none;
  const goal = goalOf(target, compared[target]!);
  const ways = approaches(model, goal);
  const singles = singleMoves(model, compared, goal, ways);
  const second = compared[other(target)];
  if (!singles[0]?.both && second?.outside === 0) {
    const goals = [goal, goalOf(other(target), second)] as const;
    const pair = pairForBoth(model, goals);
    if (pair) {
      const moves = pair.indices.map((index) => moveOf(model, compared, goal, index, pair));
      return { ...none, moves: byShare(moves), together: true };
    }
  }
  if (singles.length > 0) return { ...none, moves: singles.slice(0, mostTold) };
  return { ...none, ...several(model, compared, goal, ways) };
}

/** Alternatives: those that bring in both measured figures first, then those that move least. */
function singleMoves(
  model: BenchModel,
  compared: Compared,
  goal: Goal,
  ways: readonly Approach[],
): BenchMove[] {
  const moves = ways
    // Curves bend: what looks a little too far away may still be within reach.
    .filter(({ share }) => share <= 2)
    .slice(0, mostTried)
    .flatMap(({ step, share }) => {
      const found = settle(model, [step], goal, share);
      return found ? [moveOf(model, compared, goal, step.index, found)] : [];
    });
  return byRank(moves);
}

/** The two quantities with the largest reach, or all of them, by the same share of their way. */
function several(
  model: BenchModel,
  compared: Compared,
  goal: Goal,
  ways: readonly Approach[],
): Pick<BenchExplanation, 'moves' | 'together' | 'all'> {
  const common = (some: readonly Approach[]) => 1 / some.reduce((sum, { share }) => sum + 1 / share, 0);
  const largest = ways.slice(0, 2);
  const pair = settle(model, largest.map(stepOf), goal, common(largest));
  if (pair && largest.length === 2) {
    const moves = largest.map(({ step }) => moveOf(model, compared, goal, step.index, pair));
    return { moves: byShare(moves), together: true, all: null };
  }
  const all = settle(model, ways.map(stepOf), goal, common(ways));
  return { moves: [], together: false, all: all?.share ?? null };
}

function stepOf({ step }: Approach): Step {
  return step;
}

/** What has no tolerance of its own is ranked as if it had this one. */
const usualTolerance = 0.1;
/** A part that is off by more than this factor is another part. */
const mostFactor = 5;

function beyondTheirBand(model: BenchModel, compared: Compared, goal: Goal): BenchMove[] {
  const need = goal.value - readingOf(model.typical(), goal.target);
  const moves = model.variables
    .flatMap((variable, index): (Approach & { most: number })[] => {
      const { min, typical, max } = variable.band;
      const slope = model.typical().slopes[goal.target][index]!;
      if (!canBeElse(variable) || !(typical > 0) || !(need * slope !== 0)) return [];
      const upward = need * slope > 0;
      const own = hasBand(variable) ? (upward ? max : min) : typical;
      const factor =
        own > 0 && own !== typical ? own / typical : upward ? 1 + usualTolerance : 1 - usualTolerance;
      const step = { index, end: typical * factor };
      const share = need / (slope * speed(typical, step.end));
      return [{ step, share, most: Math.log(mostFactor) / Math.abs(Math.log(factor)) }];
    })
    .filter(({ share, most }) => share <= 2 * most)
    .sort((a, b) => a.share - b.share)
    .slice(0, mostTried)
    .flatMap(({ step, share, most }) => {
      const found = settle(model, [step], goal, share, most);
      return found ? [moveOf(model, compared, goal, step.index, found)] : [];
    });
  return byRank(moves).slice(0, 2);
}

/** The temperature of a bench is known, and what has no unit and no band is the form of a curve. */
function canBeElse(variable: Variable): boolean {
  return variable.unit !== 'K' && (variable.unit !== '1' || hasBand(variable));
}

function moveOf(
  { variables }: BenchModel,
  compared: Compared,
  { target }: Goal,
  index: number,
  { values, reading }: Pick<Found, 'values' | 'reading'>,
): BenchMove {
  const { label, path, unit, band } = variables[index]!;
  const value = values[index]!;
  const end = value < band.typical ? band.min : band.max;
  const rest = compared[other(target)];
  const both = rest !== null && reads(rest, readingOf(reading, other(target)));
  return {
    label,
    path,
    unit,
    value,
    typical: band.typical,
    end,
    share: end === band.typical ? Number.POSITIVE_INFINITY : (value - band.typical) / (end - band.typical),
    explains: target,
    both,
  };
}

function byShare(moves: readonly BenchMove[]): BenchMove[] {
  return [...moves].sort((a, b) => a.share - b.share);
}

function byRank(moves: readonly BenchMove[]): BenchMove[] {
  return byShare(moves).sort((a, b) => Number(b.both) - Number(a.both));
}

/** What is inside the band by the instrument's error alone is sought at the band's end. */
function goalOf(target: Target, { measured, predicted, deviation, outside }: BenchComparison): Goal {
  const width = (measured.max - measured.min) / 2;
  const value =
    outside === 0 ? Math.min(predicted.max, Math.max(predicted.min, measured.typical)) : measured.typical;
  return { target, value, within: Math.max(0.01 * Math.abs(deviation), 0.1 * width) };
}

function other(target: Target): Target {
  return target === 'voltage' ? 'ripple' : 'voltage';
}
