/** A bipolar transistor as a switch: voltage it keeps when saturated, and the time it stays on after its base is reversed. */

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

/**
 * Storage time by charge control: `t = tau ln( (IB1 - IB2) / (Ic/bF - IB2) )`, IB1 the base current while on, IB2 (below 0) the
 * one that turns it off.
 *
 * Second and ampere; 0 when it was not saturated; undefined unless `tau`, `onA`, `gain` > 0 and `offA` < 0.
 * Source: charge control model, P. R. Gray, R. G. Meyer (from memory: confirm).
 * Worked: 200 ns, 1 mA, -1 mA, 10 mA, gain 200: 128.9 ns.
 */
export function storageTime(
  tauS: number,
  onA: number,
  offA: number,
  collectorA: number,
  gain: number,
): number | undefined {
  if (!(tauS > 0 && onA > 0 && offA < 0 && collectorA >= 0 && gain > 0)) return undefined;
  return Math.max(0, tauS * Math.log((onA - offA) / (collectorA / gain - offA)));
}
