/** Number of stages beyond which a longer ladder gives less voltage. */

/**
 * Convention A of `ladder-drop` for many stages: `n = sqrt(Vmax f C / I)`, Vmax the peak of the sine, of which each
 * stage would give twice. Answers a real number. Undefined unless all inputs are above 0.
 *
 * Source: Kuffel, Zaengl, Kuffel 2000 (from memory: confirm), from the derivative of `2 n Vmax - (2/3) n^3 I/(f C)`.
 * Worked: 125 kV, 150 Hz, 0.05 uF, 5 mA: 13.69.
 */
export function textbookOptimumStages(
  peakV: number,
  frequencyHz: number,
  capacitanceF: number,
  outputA: number,
): number | undefined {
  if (!(peakV > 0 && frequencyHz > 0 && capacitanceF > 0 && outputA > 0)) return undefined;
  return Math.sqrt((peakV * frequencyHz * capacitanceF) / outputA);
}

/**
 * Convention D, square wave and large reservoir: the whole number of stages with the most output,
 * `n (Vswing - 2 Vd) - n(n+1)(5n+1)/12 I/(f C)`.
 *
 * `stageV` is what one stage gives without load, swing less two diode drops, V. Undefined unless all inputs are above 0;
 * 1 when even a second stage would cost voltage. Source: derived, exact search around `sqrt(4 V f C/(5 I))`.
 * Worked: 3.8 V, 10 kHz, 1 uF, 1 mA: 5 stages and 12.5 V, where 4 and 6 give less.
 */
export function optimumStages(
  stageV: number,
  frequencyHz: number,
  capacitanceF: number,
  outputA: number,
): number | undefined {
  if (!(stageV > 0 && frequencyHz > 0 && capacitanceF > 0 && outputA > 0)) return undefined;
  const unit = outputA / (frequencyHz * capacitanceF);
  const output = (n: number) => n * stageV - ((n * (n + 1) * (5 * n + 1)) / 12) * unit;
  let best = Math.max(1, Math.floor(Math.sqrt((0.8 * stageV) / unit)) - 1);
  if (!Number.isFinite(best)) return undefined;
  while (output(best + 1) > output(best)) best++;
  while (best > 1 && output(best - 1) >= output(best)) best--;
  return best;
}
