/**
 * Pumps as plain numbers for tests of the engine: a sound one, and anything changed about it.
 */
import type { CapacitorValues, DiodeValues, PumpValues } from '../../core/pump/values';

export const capacitor = (farads: number, ohms = 0): CapacitorValues => ({ farads, ohms });

/** Shockley parameters of a silicon switching diode at 27 degC (class values, from memory). */
export const siliconDiode: DiodeValues = { saturation: 2.52e-9, slope: 1.752 * 0.025865, ohms: 0 };

/** A doubler or, with other fields, any pump: 5 V, 10 kHz, 1 uF, 10 uF, 1 mA. */
export function pump(change: Partial<PumpValues> = {}): PumpValues {
  const topology = change.topology ?? 'chain';
  const stages = change.stages ?? 1;
  const column = Array.from({ length: stages }, () => capacitor(1e-6));
  return {
    topology,
    stages,
    negative: false,
    input: 5,
    frequency: 10e3,
    duty: 0.5,
    drives: [{ high: 5, low: 0, highOhms: 1e-3, lowOhms: 1e-3 }],
    series: 0,
    flying: column,
    smoothing: topology === 'ladder' ? column : [],
    reservoir: capacitor(10e-6),
    diodes: Array.from({ length: topology === 'ladder' ? 2 * stages : stages + 1 }, () => siliconDiode),
    loads: [{ name: 'load', kind: 'current', amps: 1e-3 }],
    ...change,
  };
}
