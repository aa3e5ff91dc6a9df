/**
 * A small switched network as plain data: what the engine solves. It knows nothing of boards or parts.
 *
 * Terminals: `0..nodeNames.length-1` are unknown nodes; `~k` (bitwise not) is the known potential `k`.
 * Potentials and resistances of switched elements are given per segment of the clock period.
 */

export type Terminal = number;

export interface Segment {
  /** Second, above 0. */
  readonly duration: number;
}

/** A value that holds over a segment, or one that goes in a straight line from the first to the second. */
export type Course = number | readonly [number, number];

export interface Known {
  readonly name: string;
  /** Volt, one per segment. */
  readonly volts: readonly Course[];
}

export interface Resistor {
  readonly name: string;
  readonly a: Terminal;
  readonly b: Terminal;
  /** Ohm, one per segment, above 0: a pin's resistance changes with its level. */
  readonly ohms: readonly number[];
  /** Volts that must stand across it before current flows from a to b: a fixed drop in series. One per segment. */
  readonly drop?: readonly Course[];
}

export interface Capacitor {
  readonly name: string;
  readonly a: Terminal;
  readonly b: Terminal;
  readonly farads: number;
  /** Equivalent series resistance; values below 1 mohm are taken as 1 mohm, so that edges stay algebraic. */
  readonly ohms: number;
}

/** Shockley diode with series resistance; current flows from `a` (anode) to `b`. */
export interface Diode {
  readonly name: string;
  readonly a: Terminal;
  readonly b: Terminal;
  /** Saturation current, A. */
  readonly saturation: number;
  /** Ideality times thermal voltage, V. */
  readonly slope: number;
  readonly ohms: number;
  /** Makes it one junction of a transistor (J. J. Ebers, J. L. Moll, Proc. IRE 42, 1954; from memory: confirm). */
  readonly transfer?: Transfer;
}

/**
 * A share of a junction's current that passes at `terminal` instead of at the base: of a transistor's emitter
 * junction the share `alpha` goes through its collector. `base` says which end of the junction the base is: `a`
 * for npn, `b` for pnp.
 */
export interface Transfer {
  readonly terminal: Terminal;
  readonly base: 'a' | 'b';
  /** 0..1 exclusive: gain / (gain + 1). */
  readonly alpha: number;
}

/**
 * A current from `a` to `b` that is constant while the voltage is well above `knee`:
 * `amps * (1 - exp(-v / knee))` for v > 0, `amps * v / knee` below. The concave knee keeps an overloaded
 * rail from being pulled to voltages that no real load would reach.
 */
export interface CurrentLoad {
  readonly name: string;
  readonly a: Terminal;
  readonly b: Terminal;
  readonly amps: number;
  /** V, above 0. */
  readonly knee: number;
}

/**
 * A load that takes a constant power: `watts / v` from `knee` upward, falling in proportion to v below it. It may have
 * two operating points; the iteration starts at `start` volt, so that the higher one is found when it exists.
 */
export interface PowerLoad {
  readonly name: string;
  readonly a: Terminal;
  readonly b: Terminal;
  readonly watts: number;
  /** Lowest voltage at which it still takes its power, V, above 0. */
  readonly knee: number;
  readonly start: number;
}

export interface Network {
  /** One clock period, in order. */
  readonly segments: readonly Segment[];
  readonly nodeNames: readonly string[];
  readonly knowns: readonly Known[];
  readonly resistors: readonly Resistor[];
  readonly capacitors: readonly Capacitor[];
  readonly diodes: readonly Diode[];
  readonly loads: readonly (CurrentLoad | PowerLoad)[];
}

/** Floor of resistances that must not vanish, ohm. */
export const leastOhms = 1e-3;
/** Conductance from every node to zero volt, S: keeps a floating node defined without being seen. */
export const nodeLeak = 1e-12;

/** The first reason why a network cannot be solved as written, in words; undefined when it is well formed. */
export function networkFault(network: Network): string | undefined {
  const segments = network.segments.length;
  const terminal = (t: number) =>
    Number.isInteger(t) && (t >= 0 ? t < network.nodeNames.length : ~t < network.knowns.length);
  if (segments === 0) return 'a clock period has no segments';
  if (!network.segments.every((s) => s.duration > 0 && Number.isFinite(s.duration)))
    return 'a segment of the clock period has no length';
  for (const known of network.knowns)
    if (known.volts.length !== segments || !known.volts.flat().every(Number.isFinite))
      return `${known.name}: a potential is missing or not finite`;
  const groups = [network.resistors, network.capacitors, network.diodes, network.loads];
  for (const element of groups.flat())
    if (!terminal(element.a) || !terminal(element.b)) return `${element.name}: a terminal leads nowhere`;
  for (const r of network.resistors)
    if (r.drop && !(r.drop.length === segments && r.drop.flat().every(Number.isFinite)))
      return `${r.name}: a drop is missing or not finite`;
    else if (r.ohms.length !== segments || !r.ohms.every((x) => x > 0 && Number.isFinite(x)))
      return `${r.name}: a resistance must be above 0 ohm`;
  for (const c of network.capacitors)
    if (!(c.farads > 0 && Number.isFinite(c.farads)) || !(c.ohms >= 0))
      return `${c.name}: a capacitance must be above 0 F`;
  for (const d of network.diodes)
    if (d.transfer && !(terminal(d.transfer.terminal) && d.transfer.alpha > 0 && d.transfer.alpha < 1))
      return `${d.name}: a transistor's gain must be above 0`;
    else if (!(d.saturation > 0 && d.slope > 0 && d.ohms >= 0 && d.saturation * d.slope * d.ohms < Infinity))
      return `${d.name}: saturation current and slope must be above 0`;
  for (const l of network.loads)
    if (!(Number.isFinite('amps' in l ? l.amps : l.watts + l.start) && l.knee > 0))
      return `${l.name}: a load must be finite`;
  return undefined;
}

/** Value of a course at a share 0..1 of its segment. */
export function courseAt(course: Course, share: number): number {
  return typeof course === 'number' ? course : course[0] + share * (course[1] - course[0]);
}
