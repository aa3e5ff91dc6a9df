/** Peak-to-peak ripple of a half-wave ladder, in the conventions of `ladder-drop`. */

/**
 * A and B, whole smoothing column, unequal capacitors allowed: `(I/f) sum (n-k+1)/C_k`, k from ground; for equal ones
 * `n(n+1)/2` times `I/(f C)`. Half of it is the amplitude that some books call ripple.
 *
 * `outputA` in ampere, `frequencyHz` and every capacitance above 0; answers volt, else undefined.
 * Source: Kuffel, Zaengl, Kuffel 2000 (from memory: confirm).
 * Worked: 8 stages of 0.05 uF, 150 Hz, 5 mA: 24.00 kV.
 */
export function columnRipple(
  outputA: number,
  frequencyHz: number,
  smoothingF: readonly number[],
): number | undefined {
  const n = smoothingF.length;
  if (n === 0 || !(outputA >= 0 && frequencyHz > 0) || !smoothingF.every((farads) => farads > 0))
    return undefined;
  return (outputA / frequencyHz) * smoothingF.reduce((sum, farads, i) => sum + (n - i) / farads, 0);
}

/**
 * D, a large reservoir across the whole column: `(n+1)/2 I/(f Cout)` in the slow limit and `n/2 I/(f Cout)` in the fast,
 * because the column takes charge back from the reservoir in every low phase.
 *
 * Answers volt; undefined out of range. Source: charge balance, checked by simulation with ideal diodes.
 * Worked: 2 stages, 1 mA, 10 kHz, 100 uF: 1.5 mV slow, 1 mV fast.
 */
export function reservoirRipple(
  limit: 'slow' | 'fast',
  stages: number,
  outputA: number,
  frequencyHz: number,
  reservoirF: number,
): number | undefined {
  if (!(Number.isInteger(stages) && stages >= 1 && outputA >= 0 && frequencyHz > 0 && reservoirF > 0)) {
    return undefined;
  }
  const factor = limit === 'slow' ? (stages + 1) / 2 : stages / 2;
  return (factor * outputA) / (frequencyHz * reservoirF);
}
