/**
 * A pump in every mode of the board, with its corners: the heaviest mode makes the low end of a rail, the
 * lightest one the high end.
 */
import type { Topology } from '../model/board';
import { corner } from './pump-corners';
import { drawCorner } from './pump-draws';
import { estimatePump } from './pump-estimate';
import { hasBand, type PumpModel, typicalPoint } from './pump-model';
import type { NoPoint, SolvedPoint } from './pump-point';
import type { CornerEnd, PumpResult } from './types';

/** The pump's model in one mode; `mode` is absent for a board without modes. */
export interface ModeModel {
  readonly mode: string | undefined;
  readonly model: PumpModel;
}

/** The same with its typical point, whose capacitors hold what their voltage leaves of them. */
export interface SettledMode extends ModeModel {
  readonly at: SolvedPoint | NoPoint;
}

export function solvePump(topology: Topology, modes: readonly SettledMode[]): PumpResult | NoPoint {
  const solved: { mode: ModeModel; at: SolvedPoint }[] = [];
  for (const { at, ...mode } of modes) {
    if ('reason' in at) return at;
    solved.push({ mode, at });
  }
  const byLoad = [...solved].sort((a, b) => b.at.point.askedCurrent - a.at.point.askedCurrent);
  const heaviest = byLoad[0]!;
  const lightest = byLoad.at(-1)!;
  const { point } = heaviest.at;
  const extreme = (
    from: (typeof solved)[number],
    target: 'voltage' | 'ripple',
    direction: 1 | -1,
  ): CornerEnd => corner(from.mode.model, from.mode.mode, from.at, target, direction);
  // In magnitude the heaviest load makes the weakest rail; for a negative rail that is the larger number.
  const values = heaviest.mode.model.values(typicalPoint(heaviest.mode.model));
  const [low, high] = values.negative ? [lightest, heaviest] : [heaviest, lightest];
  return {
    points: solved.map(({ at }) => at.point),
    heaviest: point,
    voltage: { lowest: extreme(low, 'voltage', -1), highest: extreme(high, 'voltage', 1) },
    ripple: { lowest: extreme(lightest, 'ripple', -1), highest: extreme(heaviest, 'ripple', 1) },
    draws: solved.map(({ mode, at }) => ({
      most: drawCorner(mode.model, mode.mode, at, 1) ?? null,
      least: drawCorner(mode.model, mode.mode, at, -1) ?? null,
      sharpest: drawCorner(mode.model, mode.mode, at, 1, true) ?? null,
    })),
    estimate: estimatePump(topology, values, point.loadCurrent),
    influences: influences(heaviest.mode.model, heaviest.at),
  };
}

function influences(model: PumpModel, at: SolvedPoint): PumpResult['influences'] {
  return model.variables
    .flatMap((variable, k) => {
      const slope = at.slopes.voltage[k]!;
      if (!hasBand(variable) || Number.isNaN(slope)) return [];
      const volts = slope * (variable.band.max - variable.band.min);
      return [{ label: variable.label, path: variable.path, volts }];
    })
    .sort((a, b) => Math.abs(b.volts) - Math.abs(a.volts));
}
