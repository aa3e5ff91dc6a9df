/** Charge left on a reservoir: its energy, how long a resistance takes to remove it, and the resistance for a given time. */

/**
 * `E = C V^2 / 2`. Farad (0 or more) and volt in, joule out; undefined out of range. Worked: 100 uF at 100 V: 0.5000 J.
 */
export function storedEnergy(capacitanceF: number, voltageV: number): number | undefined {
  return capacitanceF >= 0 && Number.isFinite(voltageV) ? (capacitanceF * voltageV ** 2) / 2 : undefined;
}

/**
 * Time in which a resistance brings a capacitor from `fromV` to `toV`: `t = R C ln(V0/V)`.
 *
 * Both voltages of one sign, `toV` not 0; 0 when it is there already; answers second, else undefined.
 * Source: exponential discharge. Worked: 10 kohm, 100 uF, 12 V to 1 V: 2.485 s.
 */
export function dischargeTime(
  resistanceOhm: number,
  capacitanceF: number,
  fromV: number,
  toV: number,
): number | undefined {
  if (!(resistanceOhm > 0 && capacitanceF >= 0 && fromV * toV > 0)) return undefined;
  return resistanceOhm * capacitanceF * Math.max(0, Math.log(fromV / toV));
}

export interface Bleeder {
  /** Ohm: the largest resistance that is quick enough. */
  readonly resistanceOhm: number;
  /** W it turns into heat at the full voltage. */
  readonly powerW: number;
  /** A it takes from the rail all the time. */
  readonly currentA: number;
}

/**
 * Resistance that brings a capacitor from `fromV` to `toV` in `timeS`: `R = t / (C ln(V0/V))`.
 *
 * Undefined unless the time and capacitance are above 0 and `fromV` is beyond `toV` on the same side of zero.
 * Worked: 100 uF, 100 V to 60 V in 2 s: 39.15 kohm, 0.2554 W.
 */
export function bleeder(
  capacitanceF: number,
  fromV: number,
  toV: number,
  timeS: number,
): Bleeder | undefined {
  if (!(capacitanceF > 0 && timeS > 0 && fromV / toV > 1)) return undefined;
  const resistanceOhm = timeS / (capacitanceF * Math.log(fromV / toV));
  return { resistanceOhm, powerW: fromV ** 2 / resistanceOhm, currentA: Math.abs(fromV) / resistanceOhm };
}
