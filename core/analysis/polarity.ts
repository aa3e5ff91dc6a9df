/**
 * Which terminal of each capacitor of a pump is positive, and how far its voltage turns round: in the steady state, and
 * while switching on and off.
 */
import type { Capacitor, Pump } from '../model/board';
import { solvedPoints, stressedParts } from './pump-stress';
import type { RailResult } from './types';

/** `diodes`: the side of the pumped or held node. `away`: the drive, the node below or ground. */
export type Side = 'diodes' | 'away';

export interface Polarity {
  readonly capacitor: Capacitor;
  readonly key: string;
  /** Terminal that the solution makes positive, on average at typical values. */
  readonly positive: Side;
  /** Where the file says that the negative terminal goes, or how the topology is usually drawn. */
  readonly assumed: Side;
  readonly stated: boolean;
  /** Largest voltage against that orientation, V; 0 when there is none. */
  readonly steady: number;
  readonly switching: number;
}

/** Only capacitors with a positive terminal; empty for rails that no pump makes. */
export function polarities(result: RailResult): readonly Polarity[] {
  const { rail, pump, transients } = result;
  const origin = rail.origin?.kind === 'pump' ? rail.origin.pump : undefined;
  if (!origin || !pump) return [];
  const parts = stressedParts(result).capacitors.filter(({ capacitor }) => capacitor.kind.data?.polarised);
  if (parts.length === 0) return [];
  const points = solvedPoints(pump);
  const course = transients?.()?.capacitors;
  return parts.map(({ capacitor, figures }): Polarity => {
    const usual: Side = isDown(origin) ? 'diodes' : 'away';
    const negative = capacitor.negativeTo ? sideOf(origin, capacitor.negativeTo.name) : usual;
    // Signed from the side of the diodes to the other: negative terminals at the diodes turn the sign.
    const against = (lowest: number, highest: number) => Math.max(0, negative === 'away' ? -lowest : highest);
    const steady = points.flatMap((point) => point.capacitors.filter(({ key }) => key === figures.key));
    const moved = course?.find(({ key }) => key === figures.key);
    return {
      capacitor,
      key: figures.key,
      positive: figures.average >= 0 ? 'diodes' : 'away',
      assumed: negative,
      stated: capacitor.negativeTo !== undefined,
      steady: Math.max(...steady.map(({ lowest, highest }) => against(lowest, highest))),
      switching: moved ? against(moved.lowest, moved.highest) : 0,
    };
  });
}

function isDown(pump: Pump): boolean {
  return pump.topology === 'inverter' || pump.polarity === 'negative';
}

/** Ground, a clock or a driver is the side away from the diodes; a rail is the side at them. */
function sideOf(pump: Pump, name: string): Side {
  return name === 'ground' || pump.drive.some((drive) => drive.name === name) ? 'away' : 'diodes';
}

/** A terminal in words: `the pumped node`, `the drive`. */
export function sideWords(key: string, side: Side): string {
  if (side === 'away') return key.includes('.flying') ? 'the drive' : 'ground';
  return key.includes('.flying') ? 'the diodes' : 'the rail';
}
