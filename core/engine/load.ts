/**
 * Loads that draw a constant current while they can: linearised about the voltage they see.
 */

/** Current at voltage `v`, A. */
export function loadCurrent(amps: number, knee: number, v: number): number {
  return v > 0 ? -amps * Math.expm1(-v / knee) : (amps * v) / knee;
}

/** Slope of the current at voltage `v`, S. */
export function loadConductance(amps: number, knee: number, v: number): number {
  return (amps / knee) * (v > 0 ? Math.exp(-v / knee) : 1);
}
