/** What the capacitance of the diodes takes from the open-circuit voltage of a multiplier. */

/**
 * Each diode's capacitance lies between two nodes that swing against each other. The swings solve
 * `(C + 2 Cj) a_k + Cj (a_(k-1) + a_(k+1)) = C V`, zero at both ends; the output gains their sum.
 *
 * `swingV` of the clocks; capacitances in farad, `flyingF` above 0 and `junctionF` 0 or more; answers the sum in volt.
 * Undefined out of range. Source: charge balance, checked by simulation with ideal diodes.
 * Worked: 5 V, junction 5 % of the flying capacitor, 2 stages: 8.70 V instead of 10 V.
 */
export function swingWithJunctions(
  stages: number,
  swingV: number,
  flyingF: number,
  junctionF: number,
): number | undefined {
  if (
    !(Number.isInteger(stages) && stages >= 1 && flyingF > 0 && junctionF >= 0 && Number.isFinite(swingV))
  ) {
    return undefined;
  }
  // Thomas elimination of the tridiagonal system; its diagonal dominates, so no pivot can vanish.
  const diagonal = flyingF + 2 * junctionF;
  const upper: number[] = [];
  const right: number[] = [];
  for (let k = 0; k < stages; k++) {
    const pivot = diagonal - junctionF * (upper[k - 1] ?? 0);
    upper.push(junctionF / pivot);
    right.push((flyingF * swingV - junctionF * (right[k - 1] ?? 0)) / pivot);
  }
  let sum = 0;
  let above = 0;
  for (let k = stages - 1; k >= 0; k--) {
    above = right[k]! - upper[k]! * above;
    sum += above;
  }
  return sum;
}
