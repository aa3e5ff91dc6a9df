/**
 * One edge of a pump rail at a time, for a search that asks thousands of designs whether they reach it: the heaviest
 * mode at typical values and the one corner that decides.
 */

import type { PumpParts } from './pump-assembly';
import { assemblePump } from './pump-assembly';
import { settlePump } from './pump-bias';
import { corner } from './pump-corners';
import type { PumpModel } from './pump-model';
import type { SolvedPoint } from './pump-point';

export interface PumpVerdict {
  /** Voltage nearer to zero, over modes and corners, V, signed. */
  weakest(): number;
  /** Ripple at its worst, V. */
  ripple(): number;
}

interface Settled {
  readonly mode: string | undefined;
  readonly model: PumpModel;
  readonly at: SolvedPoint;
}

/** Undefined when a part has no usable value or no steady state is found. */
export function pumpVerdict(parts: readonly PumpParts[]): PumpVerdict | undefined {
  const modes: Settled[] = [];
  for (const each of parts) {
    const settled = settlePump(each.pump, each.mode, (bears) =>
      assemblePump(bears ? { ...each, bears } : each),
    );
    if (!settled || 'reason' in settled.at) return undefined;
    modes.push({ mode: each.mode, model: settled.model, at: settled.at });
  }
  const heaviest = modes.reduce((a, b) => (b.at.point.askedCurrent > a.at.point.askedCurrent ? b : a));
  const down = heaviest.at.point.ideal < 0;
  const { model, mode, at } = heaviest;
  return {
    weakest: () => {
      const typical = modes.map((each) => each.at.point.voltage);
      // A load that lets go or a rail that does not rise at all needs no corner to be told.
      const worst = down ? Math.max(...typical) : Math.min(...typical);
      const { value } = corner(model, mode, at, 'voltage', down ? 1 : -1);
      return down ? Math.max(worst, value) : Math.min(worst, value);
    },
    ripple: () => {
      const { value } = corner(model, mode, at, 'ripple', 1);
      return Math.max(value, ...modes.map((each) => each.at.point.ripple));
    },
  };
}
