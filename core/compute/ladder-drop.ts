/**
 * Voltage drop of a half-wave ladder of equal capacitors, in the four conventions found in books and on boards. They
 * differ by which output is meant (its peak or its average) and by how the load and the clock behave; mixing them up
 * is off by up to 50 %. All answers in units of `I/(f C)`; `n` is the number of stages, a positive whole number, else undefined.
 */

/**
 * A, high-voltage textbooks: drop of the peak output, `2n^3/3 + n^2/2 - n/6`. Narrow transfers at the peaks of a sine, all load
 * charge drawn before the low transfer.
 *
 * Source: E. Kuffel, W. S. Zaengl, J. Kuffel, High Voltage Engineering Fundamentals, 2nd ed. 2000, cascade circuits
 * (from memory: confirm). Worked: 3 stages 22.
 */
export function textbookPeakDrop(n: number): number | undefined {
  return isStages(n) ? (2 * n ** 3) / 3 + n ** 2 / 2 - n / 6 : undefined;
}

/** A, drop of the mean output: the peak drop and half of the ripple, `2n^3/3 + 3n^2/4 + n/12`. Same source. Worked: 3 stages 25. */
export function textbookMeanDrop(n: number): number | undefined {
  return isStages(n) ? (2 * n ** 3) / 3 + (3 * n ** 2) / 4 + n / 12 : undefined;
}

/**
 * B, transfers at the extremes but the load spread evenly: mean output `2n^3/3 + n^2/2 + n/3`.
 *
 * Source: charge balance, checked by simulation with ideal diodes. Worked: 3 stages 23.5.
 */
export function spreadLoadMeanDrop(n: number): number | undefined {
  return isStages(n) ? (2 * n ** 3) / 3 + n ** 2 / 2 + n / 3 : undefined;
}

/**
 * C, square wave of half duty without a reservoir: mean output `2n^3/3 + n^2/4 + 7n/48`.
 *
 * Source: as B. Worked: 3 stages 20.69.
 */
export function squareWaveMeanDrop(n: number): number | undefined {
  return isStages(n) ? (2 * n ** 3) / 3 + n ** 2 / 4 + (7 * n) / 48 : undefined;
}

/**
 * D, square wave with a reservoir much larger than the other capacitors, the usual case on a board:
 * mean output `n(n+1)(5n+1)/12`, the slow limit of the charge-multiplier method.
 *
 * Source: as B. Worked: 3 stages 16, so 15 - 3.6 - 1.6 = 9.8 V at 5 V, 0.6 V diodes, 1 uF, 10 kHz, 1 mA.
 */
export function reservoirMeanDrop(n: number): number | undefined {
  return isStages(n) ? (n * (n + 1) * (5 * n + 1)) / 12 : undefined;
}

function isStages(n: number): boolean {
  return Number.isInteger(n) && n >= 1;
}
