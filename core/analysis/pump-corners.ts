/**
 * Extremes of a pump over tolerance and temperature: every quantity goes to the end of its band that the
 * derivatives point to, and the derivatives are asked again there, until corner and signs agree.
 */

import { hasBand, type PumpModel, typicalPoint } from './pump-model';
import type { NoPoint, SolvedPoint } from './pump-point';
import { solvePoint } from './pump-point';
import type { CornerEnd, CornerSetting } from './types';

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
): CornerEnd {
  const typical = typicalPoint(model);
  let best = { value: from.point[target], at: typical, point: from.point };
  let slopes = from.slopes[target];
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
  const { value, point } = best;
  return { value, point, settings: endSettings(model, best.at, from.slopes[target]) };
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
