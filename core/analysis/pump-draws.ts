/**
 * How much a pump takes at most and at least in a mode: its loads at the end of their band that draws more, and
 * everything else where the output stands highest, since resistances and drives draw more there. The charge that
 * each load takes comes from the sources once for each stage, whatever the other parts do. The same charge flows in the
 * highest pulses when capacitors and frequency are small: rms = I sqrt(coth(t / (2 R C)) / (2 f R C)) falls with both
 * (one capacitor between two sources, derived in the project's reference sheet and checked there).
 */

import { endSettings } from './pump-corners';
import { hasBand, type PumpModel } from './pump-model';
import { type SolvedPoint, solvePoint } from './pump-point';
import type { CornerPoint } from './types';

/**
 * `way` +1 for the most, -1 for the least; `sharp` for the highest pulses; `from` is the typical point. Undefined when
 * it has no solution.
 */
export function drawCorner(
  model: PumpModel,
  mode: string | undefined,
  from: SolvedPoint,
  way: 1 | -1,
  sharp = false,
): CornerPoint | undefined {
  const up = Math.sign(from.point.voltage || 1);
  const at = model.variables.map((variable, k) => {
    const { min, typical, max } = variable.band;
    if (!hasBand(variable)) return typical;
    const pulses = sharp ? variable.sharpens : undefined;
    const slope = variable.draws ?? pulses ?? up * (from.slopes.voltage[k] ?? 0);
    if (Number.isNaN(slope) || slope === 0) return typical;
    return slope * way > 0 ? max : min;
  });
  if (model.variables.every((variable, k) => at[k] === variable.band.typical))
    return { point: from.point, settings: [] };
  const solved = solvePoint(model, at, mode, 'figures');
  if ('reason' in solved) return undefined;
  return { point: solved.point, settings: endSettings(model, at, from.slopes.voltage) };
}
