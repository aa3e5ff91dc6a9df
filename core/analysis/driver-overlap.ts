/**
 * What a push-pull stage in saturation adds to the solved period: after each edge the transistor that turns off still
 * conducts until its stored charge is gone, while the other one is on already. The network has no stored charge, so
 * this comes beside its solution, from base and collector currents that it gives.
 */
import { overlapCharge, overlapTime, storageConstant } from '../compute/storage-time';
import type { Solved } from '../engine';
import type { DrivePlace } from '../pump/drive';
import type { DriverValues, DriveValues, PumpValues, TransistorValues } from '../pump/values';
import type { DriverFigures } from './types';

type Places = NonNullable<DrivePlace['driver']>;

export interface OverlapFigures {
  /** Average out of the stage's rail, A. */
  readonly current: number;
  /** The longer of the two times, s. */
  readonly time: number;
}

const none: OverlapFigures = { current: 0, time: 0 };

/** Nothing for followers, which do not saturate, and for joined bases, which conduct at once all the time. */
export function overlapOf(values: PumpValues, solved: Solved, places: Places, k: number): OverlapFigures {
  const drive = values.drives[k]!;
  const stage = drive.driver;
  if (stage?.kind !== 'push-pull' || 'shared' in stage.base) return none;
  const edges = [
    edge(values, solved, places, drive, stage, 'npn'),
    edge(values, solved, places, drive, stage, 'pnp'),
  ];
  return {
    current: values.frequency * edges.reduce((sum, { charge }) => sum + charge, 0),
    time: Math.max(...edges.map(({ time }) => time)),
  };
}

/** Average out of each rail that supplies a stage, by name, A. */
export function besideCurrents(
  values: PumpValues,
  drivers: readonly (DriverFigures | null)[],
): Map<string, number> {
  const currents = new Map<string, number>();
  values.drives.forEach(({ driver }, k) => {
    const amps = drivers[k]?.overlapCurrent ?? 0;
    if (!driver || amps === 0) return;
    const { name } = values.rails[driver.rail]!;
    currents.set(name, (currents.get(name) ?? 0) + amps);
  });
  return currents;
}

/** The edge at which the transistor `off` turns off; its base and collector currents are those of the solved period. */
function edge(
  values: PumpValues,
  solved: Solved,
  places: Places,
  { clock, opposite }: DriveValues,
  stage: DriverValues,
  off: 'npn' | 'pnp',
): { charge: number; time: number } {
  const nothing = { charge: 0, time: 0 };
  const on = off === 'npn' ? 'pnp' : 'npn';
  const rail = values.rails[stage.rail]!;
  const [leaving, coming] = [stage[off], stage[on]];
  const tauS =
    leaving.storageSeconds === undefined ? undefined : storageConstant(leaving.storageSeconds, leaving.gain);
  if (tauS === undefined || !('npn' in stage.base)) return nothing;
  // From the junction through the base resistor to the level that turns it off.
  const level = values.rails[clock.rail]!.volts - clock.highDrop;
  const away = off === 'npn' ? clock.lowVolts : rail.volts - level;
  const way = stage.base[off] + leaving.baseOhms + (off === 'npn' ? clock.lowOhms : clock.highOhms);
  const junction = solved.diodes[places[off].emitterJunction]!.voltage.max;
  // The npn is on while its clock is high.
  const high = opposite ? 1 - values.duty : values.duty;
  const share = off === 'npn' ? high : 1 - high;
  const collector = solved.resistors[places[off].collector]!;
  const crossA = Math.min(
    coming.gain * baseOf(solved, places, on),
    rail.volts / (rail.ohms + ohmsOf(leaving) + ohmsOf(coming)),
  );
  const time = overlapTime({
    tauS,
    gain: leaving.gain,
    onA: baseOf(solved, places, off),
    offA: -(junction - away) / way,
    loadA: Math.max(collector.averagePositive, collector.averageNegative) / share,
    crossA,
  });
  // A level that does not turn it off makes it conduct all the time: that is in the solution.
  if (time === undefined) return nothing;
  const bounded = Math.min(time, (1 - share) / values.frequency);
  const charge = overlapCharge(coming.gain, baseOf(solved, places, on), crossA, bounded);
  return { charge: charge ?? 0, time: bounded };
}

function ohmsOf({ collectorOhms, emitterOhms }: TransistorValues): number {
  return collectorOhms + emitterOhms;
}

/** Largest base current in the direction that turns the transistor on, A. */
function baseOf(solved: Solved, places: Places, which: 'npn' | 'pnp'): number {
  const { max, min } = solved.resistors[places[which].base]!;
  return Math.max(0, which === 'npn' ? max : -min);
}
