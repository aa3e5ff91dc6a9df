/**
 * What a rail has to spare at its worst corner, over everything that is asked of its voltage.
 */
import { spareAt, swingNeedOf, weakestMoments } from './swing-need';
import type { RailResult } from './types';

/**
 * V, negative when it is short; null without a need. Of the window the edge that the rail must not fall below counts,
 * in magnitude: for a negative rail the one nearer to zero. Of a signal the weakest moment counts.
 */
export function headroomOf(result: Pick<RailResult, 'rail' | 'voltage' | 'ripple' | 'pump'>): number | null {
  const { rail, voltage } = result;
  if (!voltage) return null;
  const window = rail.needs?.voltage;
  const spares: number[] = [];
  if (window) spares.push(window.max <= 0 ? window.max - voltage.max : voltage.min - window.min);
  const need = swingNeedOf(result);
  const moments = need && weakestMoments(result);
  if (need && moments) spares.push(spareAt(need, moments.corner.voltage));
  return spares.length > 0 ? Math.min(...spares) : null;
}
