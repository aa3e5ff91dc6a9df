/** Drop of a diode that moves charge between capacitors without resistance: the slow limit. */

export interface DiodeTransfer {
  /** Saturation current, A. */
  readonly saturationA: number;
  /** Ideality factor times thermal voltage, V. */
  readonly slopeV: number;
  /** Series combination of the capacitors that share the charge, F. */
  readonly capacitanceF: number;
  /** Time the diode may conduct in one period, s. */
  readonly conductionS: number;
  /** Charge it passes in one period, C. */
  readonly chargeC: number;
}

export interface EffectiveDrop {
  /** Current that still flows when the diode is cut off, A. */
  readonly currentA: number;
  /** Voltage it leaves across the diode, V. */
  readonly dropV: number;
}

/**
 * The current decays while the capacitors approach each other; what counts is the current at the end:
 * `Ieff = (n Vt C / t)(1 - exp(-q/(n Vt C)))`, `Vd = n Vt ln(Ieff/Is + 1)`.
 *
 * All inputs above 0 (charge may be 0, drop then 0). Out of range: undefined.
 * Holds where series resistance drops little against n Vt. Small q gives the plain forward voltage at q/t; for
 * large q the drop stops growing with load.
 * Source: derived from the exponential law and charge balance. Worked: 2.5 nA, n 1.75 at 25 degC, 1 uF, 50 us, 1 uC: 0.8991 mA, 0.5751 V.
 */
export function effectiveDiodeDrop(transfer: DiodeTransfer): EffectiveDrop | undefined {
  const { saturationA, slopeV, capacitanceF, conductionS, chargeC } = transfer;
  if (!(saturationA > 0 && slopeV > 0 && capacitanceF > 0 && conductionS > 0 && chargeC >= 0))
    return undefined;
  const scale = slopeV * capacitanceF;
  const currentA = (scale / conductionS) * -Math.expm1(-chargeC / scale);
  return { currentA, dropV: slopeV * Math.log1p(currentA / saturationA) };
}
