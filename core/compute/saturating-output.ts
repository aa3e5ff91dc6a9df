/** Output stage of a CMOS chip beyond its linear range: it saturates like a transistor. */

export interface SaturatingOutput {
  /** Current at which it saturates, A, above 0. */
  readonly saturationA: number;
  /** Drop at which it saturates, V, above 0. */
  readonly saturationV: number;
}

/**
 * `I = Isat (2u - u^2)`, `u = min(V/Vsat, 1)`.
 *
 * `dropV` 0 or more; answers ampere, else undefined. Good to some 20 %; real short channels saturate earlier.
 * Source: H. Shichman, D. A. Hodges, IEEE JSSC 3(3), 1968 (from memory: confirm).
 * Worked: 80 mA, 2.5 V: 28.80 mA at 0.5 V.
 */
export function saturatingCurrent(output: SaturatingOutput, dropV: number): number | undefined {
  if (!isOutput(output) || !(dropV >= 0)) return undefined;
  const u = Math.min(dropV / output.saturationV, 1);
  return output.saturationA * u * (2 - u);
}

/** The inverse: `V = Vsat (1 - sqrt(1 - I/Isat))`; undefined at and beyond saturation. Worked: as above, 20 mA: 0.3349 V. */
export function saturatingDrop(output: SaturatingOutput, currentA: number): number | undefined {
  if (!isOutput(output) || !(currentA >= 0 && currentA < output.saturationA)) return undefined;
  return output.saturationV * (1 - Math.sqrt(1 - currentA / output.saturationA));
}

/** Resistance at small current, `Vsat/(2 Isat)`, ohm. Worked: as above 15.63 ohm. */
export function saturatingOnResistance(output: SaturatingOutput): number | undefined {
  return isOutput(output) ? output.saturationV / (2 * output.saturationA) : undefined;
}

function isOutput(output: SaturatingOutput): boolean {
  return (
    output.saturationA > 0 &&
    output.saturationV > 0 &&
    Number.isFinite(output.saturationA + output.saturationV)
  );
}
