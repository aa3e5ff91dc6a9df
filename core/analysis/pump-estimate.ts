/**
 * The closed forms for the same pump, beside its solution.
 */
import { pumpEstimate as closedForm } from '../compute/pump-estimate';
import { diodeCount } from '../compute/pump-topology';
import type { Topology } from '../model/board';
import { type DriveValues, inPhase, type PumpValues, swingRail } from '../pump/values';
import type { PumpEstimate } from './types';

/** Null when a value is out of the formulas' range. */
export function estimatePump(
  topology: Topology,
  values: PumpValues,
  loadCurrent: number,
): PumpEstimate | null {
  const drive = values.drives[0];
  const diode = values.diodes[0];
  if (!drive || !diode) return null;
  const { highOhms, lowOhms } = driveResistance(drive);
  const down = values.negative;
  const esr = values.flying.reduce((sum, c) => sum + c.ohms, 0) / values.flying.length;
  const result = closedForm({
    topology,
    stages: values.stages,
    sign: down ? -1 : 1,
    inputV: values.input === undefined ? 0 : values.rails[values.input]!.volts,
    swingV: swing(values, drive),
    frequencyHz: values.frequency,
    // A pump that goes up delivers while its drive is high, one that goes down while it is low.
    deliverShare: down === inPhase(drive) ? 1 - values.duty : values.duty,
    outputA: loadCurrent,
    flyingF: values.flying.map((c) => c.farads),
    smoothingF: values.smoothing.map((c) => c.farads),
    driverHighOhm: highOhms + values.series,
    driverLowOhm: lowOhms + values.series,
    diodeOhm: diode.ohms,
    flyingEsrOhm: esr,
    reservoirEsrOhm: values.reservoir?.ohms ?? 0,
    diodeSaturationA: diode.saturation,
    diodeSlopeV: diode.slope,
  });
  if (!result) return null;
  return {
    ideal: result.idealV,
    slowLimit: result.slowOhm,
    fastLimit: result.fastOhm,
    resistance: result.outputOhm,
    diodeDrop: result.diodesV / diodeCount(topology, values.stages),
    voltage: result.outputV,
  };
}

/** Swing at the pump's terminal without load, V. */
function swing(values: PumpValues, drive: DriveValues): number {
  const rail = swingRail(values, drive).volts;
  if (!drive.driver) return rail - drive.clock.highDrop - drive.clock.lowVolts;
  // A follower loses one junction at each end (common practice, no source).
  return drive.driver.kind === 'follower' ? rail - 1.2 : rail;
}

/** A saturated transistor is its collector resistance and little more; what it may carry is not in this estimate. */
function driveResistance({ clock, driver }: DriveValues) {
  if (!driver) return clock;
  return {
    highOhms: driver.pnp.collectorOhms + driver.pnp.emitterOhms,
    lowOhms: driver.npn.collectorOhms + driver.npn.emitterOhms,
  };
}
