/** Series resistance of a capacitor from the loss factor that its data sheet prints. */

/** Frequency at which loss factors of electrolytics are measured, Hz. */
export const lossFrequency = 120;

/**
 * `ESR = tan(delta) / (2 pi f C)`.
 *
 * `loss` without unit, 0 or more; `frequencyHz` of the measurement (120 Hz for electrolytics); answers ohm, else undefined.
 * Above some 10 kHz an electrolytic has less: an upper estimate there.
 * Source: definition of the loss factor. Worked: 0.16, 120 Hz, 100 uF: 2.122 ohm.
 */
export function esrFromLoss(
  loss: number,
  capacitanceF: number,
  frequencyHz = lossFrequency,
): number | undefined {
  if (!(loss >= 0 && capacitanceF > 0 && frequencyHz > 0)) return undefined;
  return loss / (2 * Math.PI * frequencyHz * capacitanceF);
}
