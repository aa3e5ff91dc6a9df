/**
 * The junction capacitance of a diode as one linear capacitor that moves the same charge over a swing.
 */

/**
 * `Cj(V) = Cj0 / (1 + V / Vj)^M` at a reverse voltage V (any textbook on semiconductor devices; from memory: confirm).
 * Its charge from 0 to V over V:
 *
 *   Ceq = Cj0 * Vj / (1 - M) * ((1 + V / Vj)^(1 - M) - 1) / V
 *
 * Vj 0.8 V and M 0.4 for silicon, 0.5 V and 0.5 for Schottky barriers (from memory: confirm). Example: 10 pF, silicon,
 * 5 V: 6.09 pF. Capacitance in F above 0, swing in V, 0 or more; undefined outside.
 */
export function equivalentJunction(
  zeroBiasF: number,
  swingV: number,
  kind: 'silicon' | 'schottky',
): number | undefined {
  if (!(zeroBiasF > 0 && swingV >= 0)) return undefined;
  const { potential, grading } = laws[kind];
  // The limit of the formula, where it would divide nothing by nothing.
  if (swingV < 1e-6) return zeroBiasF;
  const grown = (1 + swingV / potential) ** (1 - grading) - 1;
  return (zeroBiasF * potential * grown) / ((1 - grading) * swingV);
}

const laws = {
  silicon: { potential: 0.8, grading: 0.4 },
  schottky: { potential: 0.5, grading: 0.5 },
} as const;
