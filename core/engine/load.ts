/**
 * Loads that are no resistors: a current that holds while it can, or a constant power. Linearised about the voltage
 * that they see.
 */

/**
 * `size` is ampere, watt, or siemens for the resistor that may stand in for a power; `knee` as in the network's
 * description.
 */
export interface LoadLaw {
  readonly kind: 'current' | 'power' | 'conductance';
  readonly size: number;
  readonly knee: number;
}

/** The resistor that takes the same power at `volts`: what a constant power is started from. */
export function standIn(law: LoadLaw, volts: number): LoadLaw {
  return { kind: 'conductance', size: law.size / Math.max(Math.abs(volts), law.knee) ** 2, knee: law.knee };
}

/** Current at voltage `v`, A. */
export function loadCurrent({ kind, size, knee }: LoadLaw, v: number): number {
  if (kind === 'conductance') return size * v;
  if (kind === 'power') return v > knee ? size / v : (size * v) / (knee * knee);
  return v > 0 ? -size * Math.expm1(-v / knee) : (size * v) / knee;
}

/** Slope of the current at voltage `v`, S. Negative for a constant power above its knee. */
export function loadConductance({ kind, size, knee }: LoadLaw, v: number): number {
  if (kind === 'conductance') return size;
  if (kind === 'power') return v > knee ? -size / (v * v) : size / (knee * knee);
  return (size / knee) * (v > 0 ? Math.exp(-v / knee) : 1);
}

/**
 * Error of the straight line about `old` when the voltage turns out as `v`, seen as a voltage: in the flat part of the
 * curve a move of any size changes nothing, so the current's error is what counts.
 */
export function lineError(law: LoadLaw, old: number, v: number): number {
  const unit = { ...law, size: 1 };
  const off = loadCurrent(unit, v) - loadCurrent(unit, old) - loadConductance(unit, old) * (v - old);
  const scale = law.kind === 'power' ? Math.max(v, law.knee) ** 2 : law.knee;
  return scale * Math.abs(off);
}
