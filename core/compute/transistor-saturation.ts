/** A bipolar transistor as a switch: voltage it keeps when saturated. */

export interface SaturatedTransistor {
  /** Current gain, forward and reverse, above 0. */
  readonly gain: number;
  readonly reverseGain: number;
  /** Thermal voltage, V. */
  readonly thermalV: number;
  /** Resistance in the collector, ohm. */
  readonly collectorOhm: number;
}

/**
 * `VCE = Vt ln( (1 + (b + 1)/bR) / (1 - b/bF) ) + Ic Rc`, `b = Ic/Ib` the forced gain.
 *
 * Currents in ampere, magnitudes; answers volt. Undefined out of range and when `Ic >= bF Ib`, where it does not saturate.
 * Source: Ebers-Moll equations, J. J. Ebers, J. L. Moll, Proc. IRE 42, 1954 (from memory: confirm).
 * Worked: bF 200, bR 5, 25 degC, 10 mA and 1 mA: 31.20 mV without resistance.
 */
export function saturationVoltage(
  transistor: SaturatedTransistor,
  collectorA: number,
  baseA: number,
): number | undefined {
  const { gain, reverseGain, thermalV, collectorOhm } = transistor;
  if (!(gain > 0 && reverseGain > 0 && thermalV > 0 && collectorOhm >= 0)) return undefined;
  if (!(baseA > 0 && collectorA >= 0 && collectorA < gain * baseA)) return undefined;
  const forced = collectorA / baseA;
  return (
    thermalV * Math.log((1 + (forced + 1) / reverseGain) / (1 - forced / gain)) + collectorA * collectorOhm
  );
}
