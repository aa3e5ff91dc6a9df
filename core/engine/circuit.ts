/**
 * A network prepared for solving: nodes renumbered, elements in flat arrays, and for every segment of the
 * clock period the part of the matrix that does not change.
 *
 * Voltages live in one array per stage: unknown nodes first, then the known potentials, so that an element
 * reads both its terminals the same way.
 */
import { Envelope } from './envelope';
import type { LoadLaw } from './load';
import { courseAt, leastOhms, type Network, nodeLeak, type Terminal } from './network';
import { orderNodes } from './ordering';

/** Two-terminal elements of one kind: indices into the voltage array, and the place of their off-diagonal. */
export interface Branches {
  readonly count: number;
  readonly a: Int32Array;
  readonly b: Int32Array;
  readonly position: Int32Array;
}

export interface Circuit {
  readonly network: Network;
  /** Unknown nodes; the voltage array holds `nodes + knowns` entries. */
  readonly nodes: number;
  readonly knowns: number;
  readonly segments: number;
  readonly period: number;
  /** Place of each node of the network in the voltage array. */
  readonly place: Int32Array;
  readonly resistors: Branches;
  readonly capacitors: Branches;
  readonly diodes: Branches;
  readonly loads: Branches;
  readonly conductance: readonly Float64Array[];
  readonly farads: Float64Array;
  readonly esr: Float64Array;
  readonly saturation: Float64Array;
  readonly slope: Float64Array;
  readonly diodeOhms: Float64Array;
  /** Junctions of transistors: signed share of the current, 0 for a plain diode, and where it passes instead. */
  readonly alpha: Float64Array;
  readonly collector: Int32Array;
  readonly baseEnd: Int32Array;
  readonly laws: readonly LoadLaw[];
  /** Where each segment starts in the period, s. */
  readonly segmentStart: Float64Array;
  /** The resistors that end at a known potential or have a drop: those with a right-hand side. */
  readonly sources: Int32Array;
  /** Matrix of all resistors, one per segment. */
  readonly base: readonly Envelope[];
  readonly work: Envelope;
}

export function prepare(network: Network): Circuit {
  const nodes = network.nodeNames.length;
  const knowns = network.knowns.length;
  const elements = [network.resistors, network.capacitors, network.diodes, network.loads];
  const edges = elements
    .flat()
    .filter((e) => e.a >= 0 && e.b >= 0)
    .map((e) => [e.a, e.b] as const);
  for (const { a, b, transfer } of network.diodes)
    for (const end of transfer ? [a, b] : [])
      if (end >= 0 && transfer!.terminal >= 0) edges.push([end, transfer!.terminal]);
  const place = orderNodes(nodes, edges);
  const first = Int32Array.from({ length: nodes }, (_, i) => i);
  for (const [a, b] of edges) {
    const low = Math.min(place[a]!, place[b]!);
    const high = Math.max(place[a]!, place[b]!);
    first[high] = Math.min(first[high]!, low);
  }
  const work = new Envelope(first);
  const index = (t: Terminal) => (t >= 0 ? place[t]! : nodes + ~t);
  const branches = (list: readonly { a: Terminal; b: Terminal }[]): Branches => {
    const a = Int32Array.from(list, (e) => index(e.a));
    const b = Int32Array.from(list, (e) => index(e.b));
    const position = Int32Array.from(list, (e) =>
      e.a >= 0 && e.b >= 0 && e.a !== e.b ? work.position(place[e.a]!, place[e.b]!) : -1,
    );
    return { count: list.length, a, b, position };
  };
  const resistors = branches(network.resistors);
  const conductance = network.segments.map((_, s) =>
    Float64Array.from(network.resistors, (r) => 1 / Math.max(r.ohms[s]!, leastOhms)),
  );
  const base = network.segments.map((_, s) => {
    const matrix = new Envelope(first);
    matrix.diagonal.fill(nodeLeak);
    for (let r = 0; r < resistors.count; r++)
      stampConductance(matrix, resistors, r, conductance[s]![r]!, nodes);
    return matrix;
  });
  return {
    network,
    nodes,
    knowns,
    segments: network.segments.length,
    period: network.segments.reduce((sum, s) => sum + s.duration, 0),
    place,
    resistors,
    capacitors: branches(network.capacitors),
    diodes: branches(network.diodes),
    loads: branches(network.loads),
    conductance,
    farads: Float64Array.from(network.capacitors, (c) => c.farads),
    esr: Float64Array.from(network.capacitors, (c) => Math.max(c.ohms, leastOhms)),
    saturation: Float64Array.from(network.diodes, (d) => d.saturation),
    slope: Float64Array.from(network.diodes, (d) => d.slope),
    // A junction of a transistor has its resistances outside.
    diodeOhms: Float64Array.from(network.diodes, (d) => (d.transfer ? d.ohms : Math.max(d.ohms, leastOhms))),
    alpha: Float64Array.from(network.diodes, ({ transfer }) =>
      transfer ? (transfer.base === 'a' ? transfer.alpha : -transfer.alpha) : 0,
    ),
    collector: Int32Array.from(network.diodes, ({ transfer }) => (transfer ? index(transfer.terminal) : -1)),
    baseEnd: Int32Array.from(network.diodes, ({ a, b, transfer }) => index(transfer?.base === 'b' ? b : a)),
    laws: network.loads.map((load) => ({
      kind: 'watts' in load ? 'power' : 'current',
      size: 'watts' in load ? load.watts : load.amps,
      knee: load.knee,
    })),
    sources: Int32Array.from(network.resistors.flatMap((r, k) => (r.drop || r.a < 0 !== r.b < 0 ? [k] : []))),
    segmentStart: Float64Array.from(network.segments, (_, s) =>
      network.segments.slice(0, s).reduce((sum, segment) => sum + segment.duration, 0),
    ),
    base,
    work,
  };
}

/** Adds the branch current `i = g * v + offset` (from a to b) to the nodal equations. */
export function stamp(
  matrix: Envelope,
  rhs: Float64Array,
  branches: Branches,
  index: number,
  g: number,
  offset: number,
  nodes: number,
  volts: Float64Array,
  at: number,
): void {
  stampConductance(matrix, branches, index, g, nodes);
  stampSource(rhs, branches, index, g, offset, nodes, volts, at);
}

/** The right-hand side of a branch: its offset, and what flows to known potentials (`volts` from `at` on). */
export function stampSource(
  rhs: Float64Array,
  branches: Branches,
  index: number,
  g: number,
  offset: number,
  nodes: number,
  volts: Float64Array,
  at: number,
): void {
  const a = branches.a[index]!;
  const b = branches.b[index]!;
  if (a < nodes) rhs[a] = rhs[a]! - offset + (b >= nodes ? g * volts[at + b]! : 0);
  if (b < nodes) rhs[b] = rhs[b]! + offset + (a >= nodes ? g * volts[at + a]! : 0);
}

function stampConductance(
  matrix: Envelope,
  branches: Branches,
  index: number,
  g: number,
  nodes: number,
): void {
  const a = branches.a[index]!;
  const b = branches.b[index]!;
  if (a < nodes) matrix.diagonal[a] = matrix.diagonal[a]! + g;
  if (b < nodes) matrix.diagonal[b] = matrix.diagonal[b]! + g;
  const position = branches.position[index]!;
  if (position >= 0) {
    matrix.lower[position] = matrix.lower[position]! - g;
    matrix.upper[position] = matrix.upper[position]! - g;
  }
}

/**
 * Adds the current `j = gm * (v_a - v_b) + offset` that a transistor's junction `a`, `b` moves from its collector to
 * its base end.
 */
export function stampTransfer(
  matrix: Envelope,
  rhs: Float64Array,
  circuit: Circuit,
  k: number,
  g: number,
  offset: number,
  volts: Float64Array,
  at: number,
): void {
  const alpha = circuit.alpha[k]!;
  const a = circuit.diodes.a[k]!;
  const b = circuit.diodes.b[k]!;
  const from = circuit.collector[k]!;
  const to = circuit.baseEnd[k]!;
  stampRow(matrix, rhs, circuit.nodes, from, a, b, alpha * g, alpha * offset, volts, at);
  stampRow(matrix, rhs, circuit.nodes, to, a, b, -alpha * g, -alpha * offset, volts, at);
}

function stampRow(
  matrix: Envelope,
  rhs: Float64Array,
  nodes: number,
  row: number,
  a: number,
  b: number,
  gm: number,
  offset: number,
  volts: Float64Array,
  at: number,
): void {
  if (row >= nodes) return;
  rhs[row] = rhs[row]! - offset;
  if (a < nodes) matrix.add(row, a, gm);
  else rhs[row] = rhs[row]! - gm * volts[at + a]!;
  if (b < nodes) matrix.add(row, b, -gm);
  else rhs[row] = rhs[row]! + gm * volts[at + b]!;
}

/** Drop of resistor `k` at a moment of the period, V. */
export function dropAt(circuit: Circuit, k: number, segment: number, time: number): number {
  const { drop } = circuit.network.resistors[k]!;
  if (!drop) return 0;
  const { duration } = circuit.network.segments[segment]!;
  return courseAt(drop[segment]!, (time - circuit.segmentStart[segment]!) / duration);
}
