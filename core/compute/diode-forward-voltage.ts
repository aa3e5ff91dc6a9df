/** Voltage across a diode that carries a known current. */

export interface DiodeParameters {
  /** Saturation current, A, above 0. */
  readonly saturationA: number;
  /** Ideality factor times thermal voltage, V, above 0. */
  readonly slopeV: number;
  /** Series resistance, ohm, 0 or more. */
  readonly seriesOhm: number;
}

/**
 * Shockley diode with series resistance: `V = n Vt ln(I/Is + 1) + I Rs`.
 *
 * `currentA` in ampere, above `-Is` (a diode cannot carry more reverse current in this model); answers volt.
 * Out of range: undefined. Holds without breakdown, junction charge and self-heating.
 * Source: W. Shockley, Bell System Technical Journal 28, 1949 (from memory: confirm).
 * Worked: Is 2.5 nA, n Vt 44.96 mV, Rs 0.6 ohm, 1 mA gives 0.5806 V.
 */
export function diodeForwardVoltage(diode: DiodeParameters, currentA: number): number | undefined {
  if (!isDiode(diode) || !(currentA > -diode.saturationA) || !Number.isFinite(currentA)) return undefined;
  return diode.slopeV * Math.log1p(currentA / diode.saturationA) + currentA * diode.seriesOhm;
}

/** True for parameters that describe a diode at all. */
export function isDiode(diode: DiodeParameters): boolean {
  return (
    diode.saturationA > 0 &&
    diode.slopeV > 0 &&
    diode.seriesOhm >= 0 &&
    Number.isFinite(diode.saturationA + diode.slopeV + diode.seriesOhm)
  );
}
