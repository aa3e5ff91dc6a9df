/**
 * Currents of one round of the board as the next round needs them: who takes how much from which rail.
 */
import type { Board } from '../model/board';
import { weightedModes } from './board-modes';
import type { Currents } from './currents';
import type { RailVoltages } from './rail-voltages';

export interface Drawn {
  /** Out of a rail in all, A. */
  total(rail: string, mode: string | undefined): number;
  /** Out of a rail by what stands on it, its own loads apart, A. */
  below(rail: string, mode: string | undefined): number;
  /** Out of a rail by one pump, named by the rail that it makes, A. */
  byPump(rail: string, mode: string | undefined, pump: string): number;
}

export const nothingDrawn: Drawn = { total: () => 0, below: () => 0, byPump: () => 0 };

/** What is not known counts as nothing: the rail above then has no number for its current either. */
export function drawnFrom(board: Board, solved: RailVoltages, currents: Currents): Drawn {
  const totals = new Map<string, number>();
  const belows = new Map<string, number>();
  const key = (rail: string, mode: string | undefined) => `${rail}\n${mode ?? ''}`;
  for (const { name: mode } of weightedModes(board))
    for (const rail of board.rails.values()) {
      const total = currents.rail(rail.name, mode) ?? 0;
      totals.set(key(rail.name, mode), total);
      belows.set(key(rail.name, mode), Math.max(0, total - (currents.loads(rail, mode) ?? 0)));
    }
  return {
    total: (rail, mode) => totals.get(key(rail, mode)) ?? 0,
    below: (rail, mode) => belows.get(key(rail, mode)) ?? 0,
    byPump: (rail, mode, pump) =>
      solved.pumps
        .get(pump)
        ?.points.find((point) => point.mode === mode)
        ?.railCurrents.get(rail) ?? 0,
  };
}
