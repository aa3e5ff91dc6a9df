/**
 * How far a pump rail is from its needs at its corners, as numbers for a search.
 */
import type { Needs } from '../model/board';
import { pumpMoments, spareAt, swingNeed } from './swing-need';
import type { PumpResult } from './types';

export interface Shortfall {
  /** V short of the edge that the rail must reach, of its window or for its signal, in magnitude; 0 when it does. */
  readonly weak: number;
  /** V beyond the edge that it must not pass; 0 when it does not. */
  readonly strong: number;
  /** V of ripple too many; 0 when none. */
  readonly ripple: number;
}

/** Judged over all modes and corners, as the rules do: nothing is left that would raise a finding. */
export function shortfall(needs: Needs | undefined, pump: PumpResult): Shortfall {
  const window = needs?.voltage;
  const lowest = Math.min(pump.voltage.lowest.value, ...pump.points.map((p) => p.voltage));
  const highest = Math.max(pump.voltage.highest.value, ...pump.points.map((p) => p.voltage));
  const ripple = Math.max(pump.ripple.highest.value, ...pump.points.map((p) => p.ripple));
  const over = needs?.ripple ? Math.max(0, ripple - needs.ripple.max) : 0;
  const short = swingShort(needs, pump);
  if (!window) return { weak: short, strong: 0, ripple: over };
  const below = Math.max(0, window.min - lowest);
  const above = Math.max(0, highest - window.max);
  const negative = window.max <= 0;
  // One figure instead of a window asks for at least that much.
  const open = window.min === window.max;
  return {
    weak: Math.max(negative ? above : below, short),
    strong: open ? 0 : negative ? below : above,
    ripple: over,
  };
}

/** V that the weakest moment lacks to what a signal needs; 0 when nothing. */
function swingShort(needs: Needs | undefined, pump: PumpResult): number {
  const need = swingNeed(needs, pump.heaviest.ideal < 0);
  if (!need) return 0;
  const { typical, corner } = pumpMoments(pump);
  const spares = [corner, ...typical].map(({ voltage }) => spareAt(need, voltage));
  return Math.max(0, -Math.min(...spares));
}

export function isMet({ weak, strong, ripple }: Shortfall): boolean {
  return weak === 0 && strong === 0 && ripple === 0;
}
