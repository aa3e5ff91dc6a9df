/**
 * One edge of a pump rail at a time, for a search that asks thousands of designs whether they reach it: the heaviest
 * mode at typical values and the one corner that decides.
 */

import type { PumpParts } from './pump-assembly';
import { assemblePump } from './pump-assembly';
import { type Bears, settlePump } from './pump-bias';
import { corner } from './pump-corners';
import type { PumpModel } from './pump-model';
import type { SolvedPoint } from './pump-point';

export interface PumpVerdict {
  /** Voltage nearer to zero, over modes at typical values, V, signed. */
  readonly typical: number;
  /** The same over corners too. */
  weakest(): number;
  /** Ripple at typical values, the worst of all modes, V, and over corners too. */
  readonly typicalRipple: number;
  ripple(): number;
  /** What its capacitors bear: a guess for the next one like it. */
  readonly bears: Bears;
}

interface Settled {
  readonly mode: string | undefined;
  readonly model: PumpModel;
  readonly at: SolvedPoint;
}

/** Undefined when a part has no usable value or no steady state is found. */
export function pumpVerdict(parts: readonly PumpParts[], guess?: Bears): PumpVerdict | undefined {
  const modes: Settled[] = [];
  for (const each of parts) {
    const settled = settlePump(
      each.pump,
      each.mode,
      (bears) => assemblePump(bears ? { ...each, bears } : each),
      guess,
    );
    if (!settled || 'reason' in settled.at) return undefined;
    modes.push({ mode: each.mode, model: settled.model, at: settled.at });
  }
  const heaviest = modes.reduce((a, b) => (b.at.point.askedCurrent > a.at.point.askedCurrent ? b : a));
  const down = heaviest.at.point.ideal < 0;
  const { model, mode, at } = heaviest;
  const typical = modes.map((each) => each.at.point.voltage);
  const worst = down ? Math.max(...typical) : Math.min(...typical);
  return {
    typical: worst,
    typicalRipple: Math.max(...modes.map((each) => each.at.point.ripple)),
    bears: new Map(at.point.capacitors.map(({ key, average }) => [key, Math.abs(average)])),
    weakest: () => {
      const { value } = corner(model, mode, at, 'voltage', down ? 1 : -1, 'quick');
      return down ? Math.max(worst, value) : Math.min(worst, value);
    },
    ripple: () => {
      const { value } = corner(model, mode, at, 'ripple', 1, 'quick');
      return Math.max(value, ...modes.map((each) => each.at.point.ripple));
    },
  };
}
