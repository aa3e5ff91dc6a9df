/**
 * Extremes of a pump over tolerance and temperature: every quantity goes to the end of its band that the
 * derivatives point to, and the derivatives are asked again there, until corner and signs agree.
 */

import { hasBand, type PumpModel, typicalPoint } from './pump-model';
import type { NoPoint, SolvedPoint } from './pump-point';
import { solvePoint } from './pump-point';
import type { CornerEnd, CornerSetting, PumpPoint } from './types';

export type Target = 'voltage' | 'ripple';

/** Rounds in which a corner may still move before the most extreme point seen is taken. */
const mostRounds = 3;

/** The lowest (`direction` -1) or highest (+1) value of the target; `from` is the typical point. */
export function corner(
  model: PumpModel,
  mode: string | undefined,
  from: SolvedPoint,
  target: Target,
  direction: 1 | -1,
  /** `quick`: one climb, for a search that looks again at what it settles on. */
  care: 'full' | 'quick' = 'full',
): CornerEnd {
  const start: Found = { value: from.point[target], at: typicalPoint(model), point: from.point };
  const climb = { model, mode, target, direction };
  const first = climbed(climb, start, from.slopes[target]);
  let best =
    care === 'quick'
      ? first.best
      : turned(climb, first.best, doubtful(model, from.slopes[target], first.slopes));
  if (target === 'ripple' && care === 'full') {
    // Ripple may have two such corners: one where the capacitors equalise, one where resistance keeps them from it.
    const other = reversed(climb, from, best);
    if (other && direction * (other.value - best.value) > 0) best = other;
  }
  return {
    value: best.value,
    point: best.point,
    settings: endSettings(model, best.at, from.slopes[target]),
  };
}

interface Climb {
  readonly model: PumpModel;
  readonly mode: string | undefined;
  readonly target: Target;
  readonly direction: 1 | -1;
}

/** Goes to the corner that the slopes point to, and on as long as those found there point elsewhere. */
function climbed(
  climb: Climb,
  start: Found,
  from: readonly number[],
): { readonly best: Found; readonly slopes: readonly number[] } {
  const { model, mode, target, direction } = climb;
  let best = start;
  let slopes = from;
  let ends = '';
  for (let round = 0; round < mostRounds; round++) {
    const at = move(model, mode, slopes, target, direction);
    const key = at.join();
    if (key === ends) break;
    ends = key;
    const solved = solvePoint(model, at, mode);
    if ('reason' in solved) break;
    if (direction * (solved.point[target] - best.value) > 0)
      best = { value: solved.point[target], at, point: solved.point };
    slopes = solved.slopes[target];
  }
  return { best, slopes };
}

/** Share of the ripple below which a quantity's reach at the typical point says little about its sign elsewhere. */
const weak = 0.03;

/** The search again from the corner with the weak quantities at their other ends; undefined without any. */
function reversed(climb: Climb, { point, slopes }: SolvedPoint, found: Found): Found | undefined {
  const { model, mode, target } = climb;
  const at = found.at.map((value, k) => {
    const { min, max } = model.variables[k]!.band;
    const slope = slopes[target][k]!;
    if (!(max > min) || !(Math.abs(slope * (max - min)) < weak * point[target]) || slope === 0) return value;
    return value === max ? min : max;
  });
  if (at.every((value, k) => value === found.at[k])) return undefined;
  const solved = solvePoint(model, at, mode);
  if ('reason' in solved) return undefined;
  const start = { value: solved.point[target], at, point: solved.point };
  return climbed(climb, start, solved.slopes[target]).best;
}

interface Found {
  readonly value: number;
  readonly at: readonly number[];
  readonly point: PumpPoint;
}

/** Quantities that a corner is tried without, beyond those whose derivatives agree. */
const mostDoubtful = 8;

/** Quantities whose derivative changes its sign between the typical point and the corner, most influential first. */
function doubtful(model: PumpModel, typical: readonly number[], atCorner: readonly number[]): number[] {
  const reach = (slope: number, k: number) =>
    Math.abs(slope * (model.variables[k]!.band.max - model.variables[k]!.band.min));
  return model.variables
    .flatMap((variable, k) => {
      const [a, b] = [typical[k]!, atCorner[k]!];
      return hasBand(variable) && !Number.isNaN(a * b) && a * b < 0 ? [k] : [];
    })
    .sort(
      (i, j) =>
        Math.max(reach(typical[j]!, j), reach(atCorner[j]!, j)) -
        Math.max(reach(typical[i]!, i), reach(atCorner[i]!, i)),
    )
    .slice(0, mostDoubtful);
}

/** Turns doubtful quantities over one by one, for as long as that helps. */
function turned(
  { model, mode, target, direction }: Climb,
  from: Found,
  quantities: readonly number[],
): Found {
  let best = from;
  for (let sweep = 0; sweep < 2; sweep++) {
    const before = best;
    for (const k of quantities) {
      const { min, max } = model.variables[k]!.band;
      const at = [...best.at];
      at[k] = best.at[k] === max ? min : max;
      const solved = solvePoint(model, at, mode, 'figures');
      if ('reason' in solved) continue;
      if (direction * (solved.point[target] - best.value) > 0)
        best = { value: solved.point[target], at, point: solved.point };
    }
    if (best === before) break;
  }
  return best;
}

/** The point whose quantities stand at the ends that their slopes point to. */
function move(
  model: PumpModel,
  mode: string | undefined,
  slopes: readonly number[],
  target: Target,
  direction: 1 | -1,
): number[] {
  return model.variables.map((variable, k) => {
    const { min, typical, max } = variable.band;
    if (!hasBand(variable)) return typical;
    const slope = slopes[k]!;
    if (Number.isNaN(slope)) return tryEnds(model, mode, k, target, direction);
    if (slope === 0) return typical;
    return slope * direction > 0 ? max : min;
  });
}

/** For a quantity without a derivative (the duty): both ends are solved, others typical. */
function tryEnds(
  model: PumpModel,
  mode: string | undefined,
  k: number,
  target: Target,
  direction: 1 | -1,
): number {
  const { min, typical, max } = model.variables[k]!.band;
  const at = typicalPoint(model);
  let best = { value: Number.NEGATIVE_INFINITY, end: typical };
  for (const end of [min, typical, max]) {
    at[k] = end;
    const solved: SolvedPoint | NoPoint = solvePoint(model, at, mode);
    if ('reason' in solved) continue;
    const value = direction * solved.point[target];
    if (value > best.value) best = { value, end };
  }
  return best.end;
}

/** Quantities of a point that stand at an end of their band, the most influential first. */
export function endSettings(
  model: PumpModel,
  at: readonly number[],
  slopes: readonly number[],
): CornerSetting[] {
  return model.variables
    .flatMap((variable, k) => {
      const { min, max } = variable.band;
      if (!hasBand(variable) || (at[k] !== min && at[k] !== max)) return [];
      const { label, path, unit } = variable;
      const weight = Math.abs((slopes[k] || 0) * (max - min));
      return [{ weight, setting: { label, path, unit, value: at[k]!, end: endOf(at[k]!, min) } }];
    })
    .sort((a, b) => b.weight - a.weight)
    .map(({ setting }) => setting);
}

function endOf(value: number, min: number): CornerSetting['end'] {
  return value === min ? 'lowest' : 'highest';
}
