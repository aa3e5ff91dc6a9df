/**
 * Two quantities that together bring a rail's voltage and its ripple to what was measured: two equations, two
 * unknowns, by Newton's method with the solver's own derivatives.
 */
import { type BenchModel, type BenchReading, typicals } from './bench-model';
import { type Found, type Goal, readingOf } from './bench-search';
import { hasBand } from './pump-model';

export interface FoundPair extends Pick<Found, 'values' | 'reading'> {
  readonly indices: readonly [number, number];
}

/** Pairs that are tried by solving, and rounds of each. */
const mostTried = 4;
const mostRounds = 4;

/** The pair that has to leave its typical values least; undefined when no pair within tolerance does it. */
export function pairForBoth(model: BenchModel, goals: readonly [Goal, Goal]): FoundPair | undefined {
  const movable = model.variables.flatMap((variable, k) => (hasBand(variable) ? [k] : []));
  const start = typicals(model.variables);
  return movable
    .flatMap((a, n) =>
      movable.slice(n + 1).flatMap((b) => {
        const moved = newton(model, goals, [a, b], start, model.typical());
        const share = moved ? Math.max(shareOf(model, a, moved), shareOf(model, b, moved)) : Infinity;
        // Far from straight lines a part of the way too much may turn out to be enough.
        return share < 1.5 ? [{ pair: [a, b] as const, share }] : [];
      }),
    )
    .sort((one, two) => one.share - two.share)
    .slice(0, mostTried)
    .map(({ pair }) => follow(model, goals, pair))
    .find((found) => found !== undefined);
}

function follow(
  model: BenchModel,
  goals: readonly [Goal, Goal],
  pair: readonly [number, number],
): FoundPair | undefined {
  let values = typicals(model.variables);
  let reading: BenchReading | undefined = model.typical();
  for (let round = 0; round < mostRounds; round++) {
    const moved = newton(model, goals, pair, values, reading);
    reading = moved && model.at(moved);
    if (!moved || !reading) return undefined;
    values = moved;
    const met = goals.every((goal) => Math.abs(readingOf(reading!, goal.target) - goal.value) <= goal.within);
    if (met)
      return pair.every((k) => shareOf(model, k, moved) <= 1)
        ? { indices: pair, values, reading }
        : undefined;
  }
  return undefined;
}

/** One step of Newton's method in the logarithms of both quantities. */
function newton(
  { variables }: BenchModel,
  goals: readonly [Goal, Goal],
  [a, b]: readonly [number, number],
  values: readonly number[],
  reading: BenchReading,
): number[] | undefined {
  const [first, second] = goals;
  const scale = (k: number) => (isFactor(variables[k]!.band.min) ? values[k]! : 1);
  const slope = ({ target }: Goal, k: number) => reading.slopes[target][k]! * scale(k);
  const need = (goal: Goal) => goal.value - readingOf(reading, goal.target);
  const determinant = slope(first, a) * slope(second, b) - slope(first, b) * slope(second, a);
  const step = {
    a: (need(first) * slope(second, b) - need(second) * slope(first, b)) / determinant,
    b: (need(second) * slope(first, a) - need(first) * slope(second, a)) / determinant,
  };
  if (!Number.isFinite(step.a) || !Number.isFinite(step.b)) return undefined;
  const moved = [...values];
  for (const [k, by] of [
    [a, step.a],
    [b, step.b],
  ] as const)
    moved[k] = isFactor(variables[k]!.band.min) ? values[k]! * Math.exp(by) : values[k]! + by;
  return moved;
}

function isFactor(min: number): boolean {
  return min > 0;
}

/** Part of the way from typical to the end of the band on the side of the value. */
function shareOf({ variables }: BenchModel, k: number, values: readonly number[]): number {
  const { min, typical, max } = variables[k]!.band;
  const value = values[k]!;
  if (value === typical) return 0;
  const end = value > typical ? max : min;
  const way = isFactor(min) ? Math.log(end / typical) : end - typical;
  const gone = isFactor(min) ? Math.log(value / typical) : value - typical;
  return way === 0 ? Number.POSITIVE_INFINITY : gone / way;
}
