/** How long a battery lasts in steady use. */

/**
 * `t = k Q / (I + Isd)`, with a self-discharge of `s Q` per year.
 *
 * `capacityC` in coulomb (1 Ah is 3600 C) and `averageA` of the load, above 0; `usable` share of the capacity, 0 to 1;
 * `selfDischargePerYear` share, 0 or more. Answers second, else undefined.
 * Source: charge balance. Worked: 220 mAh, 0.85, 104.95 uA, no self-discharge: 1782 h.
 */
export function batteryLife(
  capacityC: number,
  averageA: number,
  usable: number,
  selfDischargePerYear: number,
): number | undefined {
  if (!(capacityC > 0 && averageA >= 0 && usable > 0 && usable <= 1 && selfDischargePerYear >= 0))
    return undefined;
  const drain = averageA + selfDischargeCurrent(capacityC, selfDischargePerYear);
  return drain > 0 ? (usable * capacityC) / drain : undefined;
}

/** Steady current that would empty as much as self-discharge does, A. Worked: 220 mAh at 1 % a year: 0.2511 uA. */
export function selfDischargeCurrent(capacityC: number, sharePerYear: number): number {
  return (capacityC * sharePerYear) / (365 * 24 * 3600);
}

/**
 * Average current over modes: `sum(I share)`.
 *
 * Shares of time, 0 or more, must add up to 1 within a thousandth; undefined otherwise.
 * Worked: 10 mA for 1 %, 5 uA otherwise: 104.95 uA.
 */
export function averageCurrent(
  modes: readonly { readonly currentA: number; readonly share: number }[],
): number | undefined {
  const total = modes.reduce((sum, mode) => sum + mode.share, 0);
  if (!(Math.abs(total - 1) < 1e-3) || !modes.every((mode) => mode.share >= 0)) return undefined;
  return modes.reduce((sum, mode) => sum + mode.currentA * mode.share, 0);
}
