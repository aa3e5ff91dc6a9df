/** Frequency and duty of a timer chip that charges a capacitor through two resistors and discharges it through one. */

export interface SquareTiming {
  readonly highS: number;
  readonly lowS: number;
  readonly frequencyHz: number;
  /** Share of the period that the output is high. */
  readonly duty: number;
}

/**
 * Thresholds at one and two thirds of the supply: `tH = ln2 (RA + RB) C`, `tL = ln2 RB C`. Independent of the supply.
 *
 * `chargeOhm` RA between supply and discharge pin, `dischargeOhm` RB between discharge pin and capacitor, ohm;
 * `timingF` in farad; all above 0, else undefined. Good for RA of 1 kohm and more and C of 1 nF and more.
 * Source: both exponentials between the thresholds; data sheets print `1.44/((RA + 2 RB) C)`.
 * Worked: 1 kohm, 10 kohm, 10 nF: 6870 Hz, duty 0.5238.
 */
export function astableTiming(
  chargeOhm: number,
  dischargeOhm: number,
  timingF: number,
): SquareTiming | undefined {
  if (!(chargeOhm > 0 && dischargeOhm > 0 && timingF > 0)) return undefined;
  return squareTiming(Math.LN2 * (chargeOhm + dischargeOhm) * timingF, Math.LN2 * dischargeOhm * timingF);
}

/** A square wave from the lengths of its two phases; undefined unless both are above 0 and finite. */
export function squareTiming(highS: number, lowS: number): SquareTiming | undefined {
  const period = highS + lowS;
  if (!(highS > 0 && lowS > 0 && Number.isFinite(period))) return undefined;
  return { highS, lowS, frequencyHz: 1 / period, duty: highS / period };
}
