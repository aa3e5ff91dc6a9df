/** Loads of the independent reference: current and its slope at a given voltage. */
import { type LoadValues, loadKnee } from '../../core/pump/values';
import type { Current } from './junctions';

/** A resistance, a power down to its knee, or a current that fades with the voltage below a few tenths of a volt. */
export function loadCurrent(load: LoadValues, volts: number): Current {
  if (load.kind === 'resistance') return { amps: volts / load.ohms, siemens: 1 / load.ohms };
  if (load.kind === 'power') {
    const { watts, knee } = load;
    if (volts > knee) return { amps: watts / volts, siemens: -watts / volts ** 2 };
    return { amps: (watts * volts) / knee ** 2, siemens: watts / knee ** 2 };
  }
  const { amps } = load;
  const left = Math.exp(-volts / loadKnee);
  if (volts > 0) return { amps: amps * (1 - left), siemens: (amps / loadKnee) * left };
  return { amps: (amps * volts) / loadKnee, siemens: amps / loadKnee };
}
