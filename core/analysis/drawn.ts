/**
 * Currents of one round of the board as the next round needs them: who takes how much from which rail.
 */
import type { Board } from '../model/board';
import { type Band, exactly } from '../quantity/figure';
import { weightedModes } from './board-modes';
import type { CurrentCases } from './currents';
import type { RailVoltages } from './rail-voltages';

/** Least, typical and most in a mode, A. */
export interface Drawn {
  /** Out of a rail in all. */
  total(rail: string, mode: string | undefined): Band;
  /** Out of a rail by what stands on it, its own loads apart. */
  below(rail: string, mode: string | undefined): Band;
  /** Out of a rail by one pump, named by the rail that it makes. */
  byPump(rail: string, mode: string | undefined, pump: string): Band;
}

const nothing = exactly(0);
export const nothingDrawn: Drawn = { total: () => nothing, below: () => nothing, byPump: () => nothing };

/** What is not known counts as nothing: the rail above then has no number for its current either. */
export function drawnFrom(board: Board, solved: RailVoltages, currents: CurrentCases): Drawn {
  const totals = new Map<string, Band>();
  const belows = new Map<string, Band>();
  const key = (rail: string, mode: string | undefined) => `${rail}\n${mode ?? ''}`;
  for (const { name: mode } of weightedModes(board))
    for (const rail of board.rails.values()) {
      const total = (of: Pick<CurrentCases, 'rail'>) => of.rail(rail.name, mode) ?? 0;
      const below = (of: Pick<CurrentCases, 'rail' | 'loads'>) =>
        Math.max(0, total(of) - (of.loads(rail, mode) ?? 0));
      totals.set(key(rail.name, mode), ordered(total(currents), total(currents.least), total(currents.most)));
      belows.set(key(rail.name, mode), ordered(below(currents), below(currents.least), below(currents.most)));
    }
  return {
    total: (rail, mode) => totals.get(key(rail, mode)) ?? nothing,
    below: (rail, mode) => belows.get(key(rail, mode)) ?? nothing,
    byPump: (rail, mode, name) => {
      const pump = solved.pumps.get(name);
      const index = pump?.points.findIndex((point) => point.mode === mode) ?? -1;
      const typical = pump?.points[index]?.railCurrents.get(rail) ?? 0;
      const draws = pump?.draws[index];
      return ordered(
        typical,
        draws?.least?.point.railCurrents.get(rail) ?? typical,
        draws?.most?.point.railCurrents.get(rail) ?? typical,
      );
    },
  };
}

/** Typical values of two resistors in turn may lie a hair outside their own extremes. */
function ordered(typical: number, least: number, most: number): Band {
  return { min: Math.min(least, typical), typical, max: Math.max(most, typical) };
}
