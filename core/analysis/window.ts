/**
 * A rail against the window it must stay in. Negative rails are judged by magnitude: "weak" is the side nearer to
 * zero, "strong" the side away from it, and both keep their sign when they are written.
 */

import type { Figure } from '../quantity/figure';
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

/** The rail's miss on that side of its needed window, if it has one. */
export function missOf(result: RailResult, side: Side): Miss | undefined {
  const needed = result.rail.needs?.voltage;
  return needed && result.voltage ? judge(result, needed, side) : undefined;
}

function judge(result: RailResult, needed: Figure, side: Side): Miss | undefined {
  // One figure instead of a window asks for at least that much: every rail has some tolerance.
  if (side === 'strong' && needed.min === needed.max) return undefined;
  const negative = isNegative(needed);
  const upper = negative === (side === 'weak');
  const limit = upper ? needed.max : needed.min;
  const beyond = (voltage: number) => (upper ? voltage - limit : limit - voltage);
  const slack = 1e-9 * Math.max(1, Math.abs(limit));

  const typical = typicalVoltages(result).reduce((worst, point) =>
    beyond(point.voltage) > beyond(worst.voltage) ? point : worst,
  );
  const by = beyond(typical.voltage);
  if (by > slack) return { result, needed, limit, by, ...typical };

  const corner = cornerOf(result, upper);
  if (corner === undefined || !(beyond(corner.value) > slack)) return undefined;
  return { result, needed, limit, voltage: corner.value, by: beyond(corner.value), corner };
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
