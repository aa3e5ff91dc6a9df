/**
 * Pumps as plain numbers for tests of the engine: a sound one, and anything changed about it.
 */
import { type PumpNetwork, pumpNetwork } from '../../core/pump/network';
import type { CapacitorValues, DiodeValues, DriveValues, PumpValues } from '../../core/pump/values';

export const capacitor = (farads: number, ohms = 0): CapacitorValues => ({ farads, ohms });

/** Shockley parameters of a silicon switching diode at 27 degC (class values, from memory). */
export const siliconDiode: DiodeValues = { saturation: 2.52e-9, slope: 1.752 * 0.025865, ohms: 0 };

/** A pin on the first rail. */
export const pinDrive = (highOhms: number, lowOhms = highOhms, opposite = false): DriveValues => ({
  clock: { rail: 0, highDrop: 0, highOhms, lowVolts: 0, lowOhms },
  opposite,
});

/** The network of a pump that is known to have one. */
export function networkOf(values: PumpValues): PumpNetwork {
  const network = pumpNetwork(values);
  if (!network) throw new Error('the clock of this pump has no levels');
  return network;
}

/** A doubler or, with other fields, any pump: 5 V, 10 kHz, 1 uF, 10 uF, 1 mA. */
export function pump(change: Partial<PumpValues> = {}): PumpValues {
  const topology = change.topology ?? 'chain';
  const stages = change.stages ?? 1;
  const column = Array.from({ length: stages }, () => capacitor(1e-6));
  return {
    topology,
    stages,
    negative: false,
    rails: [{ name: 'v5', volts: 5, ohms: 0 }],
    input: 0,
    frequency: 10e3,
    duty: 0.5,
    rise: 0,
    fall: 0,
    drives: [pinDrive(1e-3)],
    series: 0,
    flying: column,
    smoothing: topology === 'ladder' ? column : [],
    reservoir: capacitor(10e-6),
    diodes: Array.from({ length: topology === 'ladder' ? 2 * stages : stages + 1 }, () => siliconDiode),
    loads: [{ name: 'load', kind: 'current', amps: 1e-3 }],
    ...change,
  };
}

/** Without an input rail: the first diode starts from ground. */
export function fromGround({ input: _input, ...rest }: PumpValues): PumpValues {
  return rest;
}
