/** Current of the first clock edge into empty capacitors, and the resistor that tames it. */

/**
 * `I = (V - Vd) / R`: nothing but resistance stops the first edge.
 *
 * `driveV` high level without load, `diodeV` drop of the diode, V; `pathOhm` driver, diode and both capacitors in series, above 0.
 * Answers ampere, 0 when the drive does not overcome the diode; undefined out of range. An upper value where the driver
 * limits its own current. Source: Ohm's law. Worked: 5 V, 0.7 V, 41.2 ohm: 104.4 mA.
 */
export function inrushPeak(driveV: number, diodeV: number, pathOhm: number): number | undefined {
  if (!(pathOhm > 0) || !Number.isFinite(driveV - diodeV)) return undefined;
  return Math.max(0, driveV - diodeV) / pathOhm;
}

/**
 * Series resistor that keeps the first edge below `limitA`: `R = (V - Vd)/I - Rpath`, 0 when none is needed.
 *
 * Answers ohm; undefined out of range. It counts in both phases, so it costs 4 R of output resistance at half duty.
 * Worked: 5 V, 0.7 V, 41.2 ohm, 20 mA: 173.8 ohm.
 */
export function inrushResistor(
  driveV: number,
  diodeV: number,
  pathOhm: number,
  limitA: number,
): number | undefined {
  if (!(pathOhm >= 0 && limitA > 0) || !Number.isFinite(driveV - diodeV)) return undefined;
  return Math.max(0, (driveV - diodeV) / limitA - pathOhm);
}

/**
 * Charge that the first high edge of a doubler moves into its reservoir: `q = Vswing C Cout / (C + Cout)`.
 *
 * Before it, the chain has charged the flying capacitor to one diode below the input and the output to two below, so
 * the diode between them is about to conduct and the whole swing counts. Volt and farad, capacitances above 0; answers
 * coulomb, else undefined. Source: charge balance of two capacitors. Worked: 16 V, 1 uF, 10 uF: 14.55 uC.
 */
export function firstEdgeCharge(swingV: number, flyingF: number, reservoirF: number): number | undefined {
  if (!(flyingF > 0 && reservoirF > 0 && swingV >= 0)) return undefined;
  return swingV * ((flyingF * reservoirF) / (flyingF + reservoirF));
}
