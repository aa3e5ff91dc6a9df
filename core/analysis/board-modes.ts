/**
 * Modes as weights: the share of time that each one takes.
 */
import type { Board } from '../model/board';

export interface WeightedMode {
  /** Absent for a board without modes. */
  readonly name: string | undefined;
  /** Adds up to 1 over all modes. */
  readonly share: number;
}

/** Shares that the file leaves out divide what the others leave; all are scaled to add up to 1. */
export function weightedModes(board: Board): readonly WeightedMode[] {
  const modes = [...board.modes.values()];
  if (modes.length === 0) return [{ name: undefined, share: 1 }];
  const given = modes.reduce((sum, mode) => sum + (mode.share?.typical ?? 0), 0);
  const open = modes.filter((mode) => !mode.share).length;
  const left = open > 0 ? Math.max(0, 1 - given) / open : 0;
  const total = given + left * open;
  return modes.map((mode) => ({
    name: mode.name,
    share: total > 0 ? (mode.share?.typical ?? left) / total : 1 / modes.length,
  }));
}

/** True when something marked with `modes` is active in `mode`; unmarked things always are. */
export function activeIn(mode: string | undefined, modes: readonly { name: string }[] | undefined): boolean {
  return mode === undefined || modes === undefined || modes.some((m) => m.name === mode);
}
