/**
 * The closed forms for the same pump, beside its solution.
 */
import { pumpEstimate as closedForm } from '../compute/pump-estimate';
import { diodeCount } from '../compute/pump-topology';
import type { Topology } from '../model/board';
import type { PumpValues } from '../pump/values';
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
  const down = values.negative;
  const esr = values.flying.reduce((sum, c) => sum + c.ohms, 0) / values.flying.length;
  const result = closedForm({
    topology,
    stages: values.stages,
    sign: down ? -1 : 1,
    inputV: values.input,
    swingV: drive.high - drive.low,
    frequencyHz: values.frequency,
    // A pump that goes up delivers while its drive is high, one that goes down while it is low.
    deliverShare: down ? 1 - values.duty : values.duty,
    outputA: loadCurrent,
    flyingF: values.flying.map((c) => c.farads),
    smoothingF: values.smoothing.map((c) => c.farads),
    driverHighOhm: drive.highOhms + values.series,
    driverLowOhm: drive.lowOhms + values.series,
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
