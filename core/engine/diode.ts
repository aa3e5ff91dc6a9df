/**
 * The diode as a straight line about its last operating point, chosen so that Newton's method neither
 * overflows in forward conduction nor stalls in reverse.
 *
 * `v = slope * ln(1 + i / saturation) + ohms * i` (W. Shockley, 1949, with series resistance). While the
 * line's own current is forward the diode is relinearised on current: no exponential, series resistance
 * exact. Otherwise on voltage, capped at the voltage of sharpest curvature.
 */

/** The straight line `i = i0 + g * (v - u)` of each diode of one stage, at `offset + d` of these arrays. */
export interface DiodeLines {
  readonly i: Float64Array;
  readonly u: Float64Array;
  readonly g: Float64Array;
}

export function diodeLines(count: number): DiodeLines {
  return { i: new Float64Array(count), u: new Float64Array(count), g: new Float64Array(count) };
}

/** Currents below this are no more than what leaks at every node and what rounding makes: they prove nothing, A. */
const leastAmps = 1e-12;

/** Voltage of sharpest curvature of the exponential, V: `slope * ln(slope / (saturation * sqrt 2))`. */
export function criticalVoltage(saturation: number, slope: number): number {
  return Math.max(slope * Math.log(slope / (saturation * Math.SQRT2)), slope);
}

/** A first line, in light forward conduction. */
export function openingLine(
  lines: DiodeLines,
  at: number,
  saturation: number,
  slope: number,
  ohms: number,
): void {
  lineAtVoltage(lines, at, criticalVoltage(saturation, slope), saturation, slope, ohms);
}

/**
 * Moves the line to where the last one says the diode is, given the branch voltage `v`.
 * Returns the error of the old line, V: how far line and diode differ there.
 */
export function moveLine(
  lines: DiodeLines,
  at: number,
  v: number,
  saturation: number,
  slope: number,
  ohms: number,
): number {
  const current = lines.i[at]! + lines.g[at]! * (v - lines.u[at]!);
  if (current > -0.5 * saturation) {
    const u = slope * Math.log1p(current / saturation) + ohms * current;
    lines.i[at] = current;
    lines.u[at] = u;
    lines.g[at] = 1 / (slope / (current + saturation) + ohms);
    return (Math.abs(v - u) * (current + saturation)) / (current + saturation + leastAmps);
  }
  const critical = criticalVoltage(saturation, slope);
  const capped = v > critical;
  lineAtVoltage(lines, at, capped ? critical : v, saturation, slope, ohms);
  // On this branch the line always passes through v, so the error is judged by the current instead.
  const change = (slope * Math.abs(lines.i[at]! - current)) / (Math.abs(current) + saturation + leastAmps);
  return capped ? Math.max(change, v - critical) : change;
}

function lineAtVoltage(
  lines: DiodeLines,
  at: number,
  v: number,
  saturation: number,
  slope: number,
  ohms: number,
): void {
  const current = saturation * Math.expm1(v / slope);
  lines.i[at] = current;
  lines.u[at] = v + (current > 0 ? ohms * current : 0);
  lines.g[at] = 1 / (slope / (current + saturation) + ohms);
}
