/** How long a saturated transistor stays on after its base is reversed, and what flows through a pair meanwhile. */

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

/** Forced gain of the usual test of the storage time, the base reversed by the same current. */
const testGain = 10;

/**
 * Time constant of the saturation charge from the storage time of a data sheet, which is measured with a tenth of the
 * collector current into the base and as much out of it again: `tau = ts / ln( 2 / (10/bF + 1) )`.
 *
 * Seconds; undefined unless `testS` > 0 and `gain` > 10, where the test does not saturate.
 * Source: the formula above at the usual test conditions (common practice). Worked: 128.9 ns at gain 200: 200 ns.
 */
export function storageConstant(testS: number, gain: number): number | undefined {
  if (!(testS > 0 && gain > testGain)) return undefined;
  return testS / Math.log(2 / (testGain / gain + 1));
}

export interface Overlap {
  /** Saturation charge of the transistor that turns off: time constant, s, and current gain. */
  readonly tauS: number;
  readonly gain: number;
  /** Its base current while it was on, and the one that turns it off (below 0), A. */
  readonly onA: number;
  readonly offA: number;
  /** What it carries for the load at the edge, A. */
  readonly loadA: number;
  /** What the other transistor pushes through both once it is fully on, A. */
  readonly crossA: number;
}

/**
 * Time in which both transistors of a complementary pair conduct after an edge: the storage time of the one that turns
 * off, whose collector current grows meanwhile from the load's to the full cross current; its mean counts.
 *
 * Seconds; undefined out of range. A rise in a straight line is an approximation: against an integration of both
 * charges the charge that flows is right within about a third.
 */
export function overlapTime({ tauS, gain, onA, offA, loadA, crossA }: Overlap): number | undefined {
  return storageTime(tauS, onA, offA, loadA + crossA / 2, gain);
}

/**
 * Charge from supply to ground in one edge: `Qx = min(bF Ib, Imax) t`, Ib the base current of the transistor that turns on,
 * Imax what supply and resistances let through.
 *
 * Ampere and second in, coulomb out; undefined for negative figures. Twice a period it makes a supply current of `2 f Qx`.
 * Worked: gain 100, 3.55 mA, 150 ns: 53.25 nC; at 5 V 266.3 nJ; at 10 kHz 1.065 mA.
 */
export function overlapCharge(gain: number, baseA: number, mostA: number, timeS: number): number | undefined {
  if (!(gain > 0 && baseA >= 0 && mostA >= 0 && timeS >= 0)) return undefined;
  return Math.min(gain * baseA, mostA) * timeS;
}
