/** Current through a diode and the resistance in series with it, for a known voltage across both. */
import { type DiodeParameters, isDiode } from './diode-forward-voltage';

/**
 * Closed form by the Lambert function, in logarithms so that no voltage overflows:
 * `L = ln(Is R / a) + (V + Is R)/a`, `w + ln w = L`, `I = (a/R) w - Is` with `a = n Vt`.
 *
 * `voltageV` across diode and `outerOhm` together; the diode's own resistance is added to `outerOhm`. Answers ampere.
 * Undefined for parameters out of range, and without any resistance when the exponential overflows.
 * Source: T. C. Banwell, A. Jayakumar, Electronics Letters 36(4), 291-292, 2000 (from memory: confirm).
 * Worked: Is 2.5 nA, n 1.75 at 25 degC, 1000.6 ohm in all, 5 V gives 4.351 mA.
 */
export function diodeCurrent(diode: DiodeParameters, voltageV: number, outerOhm: number): number | undefined {
  if (!isDiode(diode) || !(outerOhm >= 0) || !Number.isFinite(voltageV + outerOhm)) return undefined;
  const { saturationA, slopeV } = diode;
  const ohm = outerOhm + diode.seriesOhm;
  const answer =
    ohm === 0
      ? saturationA * Math.expm1(voltageV / slopeV)
      : (slopeV / ohm) * omega(logArgument(saturationA, slopeV, ohm, voltageV)) - saturationA;
  return Number.isFinite(answer) ? answer : undefined;
}

/**
 * The positive `w` with `w + ln w = x`: the Wright omega function of a real argument.
 * Six Newton steps in the logarithm reach the last bits for every finite `x`; below -700 it underflows to 0.
 */
export function omega(x: number): number {
  let w = x > 1 ? x - Math.log(x) : Math.exp(x);
  if (w === 0) return 0;
  for (let step = 0; step < 6; step++) {
    w *= 1 + (x - w - Math.log(w)) / (1 + w);
  }
  return w;
}

function logArgument(saturationA: number, slopeV: number, ohm: number, voltageV: number): number {
  return Math.log((saturationA * ohm) / slopeV) + (voltageV + saturationA * ohm) / slopeV;
}
