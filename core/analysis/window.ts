/**
 * A rail against the window it must stay in. Negative rails are judged by magnitude: "weak" is the side nearer to
 * zero, "strong" the side away from it, and both keep their sign when they are written.
 */

import type { Band, Figure } from '../quantity/figure';
import { isNegative } from './sign';
import type { CornerEnd, RailResult } from './types';

export type Side = 'weak' | 'strong';

/** A need that is missed, at typical values or only at a corner. */
export interface Miss {
  readonly result: RailResult;
  readonly needed: Figure;
  /** The edge that is missed, V, signed. */
  readonly limit: number;
  /** The voltage reached, V, signed. */
  readonly voltage: number;
  /** How far beyond the edge, V, positive. */
  readonly by: number;
  readonly mode?: string;
  /** Present when the typical board meets the need. */
  readonly corner?: CornerEnd;
}

/** One end of a window. */
export interface Edge {
  /** V, signed. */
  readonly limit: number;
  /** True when voltages above the limit miss it. */
  readonly upper: boolean;
}

/** The end of the window on that side; none where the window is open. */
export function edgeOf(needed: Band, side: Side): Edge | undefined {
  // One figure instead of a window asks for at least that much: every rail has some tolerance.
  if (side === 'strong' && needed.min === needed.max) return undefined;
  const upper = isNegative(needed) === (side === 'weak');
  return { limit: upper ? needed.max : needed.min, upper };
}

/** How far a voltage is past the edge, V; negative while it is not. */
export function beyond({ limit, upper }: Edge, voltage: number): number {
  return upper ? voltage - limit : limit - voltage;
}

/** True past the edge by more than rounding makes. */
export function isBeyond(edge: Edge, voltage: number): boolean {
  return beyond(edge, voltage) > 1e-9 * Math.max(1, Math.abs(edge.limit));
}

/** True for more ripple than allowed by more than rounding makes. */
export function isTooMuchRipple(allowed: Band, ripple: number): boolean {
  return ripple > allowed.max * (1 + 1e-9);
}

/** The rail's miss on that side of its needed window, if it has one. */
export function missOf(result: RailResult, side: Side): Miss | undefined {
  const needed = result.rail.needs?.voltage;
  const edge = needed && edgeOf(needed, side);
  return edge && result.voltage ? judge(result, needed, edge) : undefined;
}

function judge(result: RailResult, needed: Figure, edge: Edge): Miss | undefined {
  const { limit } = edge;
  const typical = typicalVoltages(result).reduce((worst, point) =>
    beyond(edge, point.voltage) > beyond(edge, worst.voltage) ? point : worst,
  );
  if (isBeyond(edge, typical.voltage))
    return { result, needed, limit, by: beyond(edge, typical.voltage), ...typical };

  const corner = cornerOf(result, edge.upper);
  if (corner === undefined || !isBeyond(edge, corner.value)) return undefined;
  return { result, needed, limit, voltage: corner.value, by: beyond(edge, corner.value), corner };
}

function typicalVoltages(
  result: RailResult,
): readonly { readonly voltage: number; readonly mode?: string }[] {
  if (result.pump === undefined) return [{ voltage: result.voltage?.typical ?? Number.NaN }];
  return result.pump.points.map(({ voltage, mode }) =>
    mode === undefined ? { voltage } : { voltage, mode },
  );
}

function cornerOf(result: RailResult, upper: boolean): CornerEnd | undefined {
  if (result.pump) return upper ? result.pump.voltage.highest : result.pump.voltage.lowest;
  if (result.voltage === null) return undefined;
  return { value: upper ? result.voltage.max : result.voltage.min, settings: [] };
}
