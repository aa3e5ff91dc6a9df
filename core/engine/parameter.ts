/**
 * What the output may be differentiated by. Part values are taken in relative terms (per unit of the
 * natural logarithm), potentials in volt, the injected current in ampere.
 */
import { type Circuit, dropAt } from './circuit';
import { loadConductance, loadCurrent } from './load';
import { type Course, courseAt, type Terminal } from './network';
import type { Trajectory } from './trajectory';

export type Parameter =
  | { readonly kind: 'ohms'; readonly index: number /** Only in this segment. */; readonly segment?: number }
  /** `share` is how far the potential follows in each segment; everywhere in full when left out. */
  | { readonly kind: 'volts'; readonly index: number; readonly share?: readonly Course[] }
  | {
      readonly kind: 'farads' | 'esr' | 'saturation' | 'slope' | 'diode-ohms' | 'load';
      readonly index: number;
    }
  /** The share that a transistor's junction passes on, absolute. */
  | { readonly kind: 'alpha'; readonly index: number }
  /** A resistor's drop, V. */
  | { readonly kind: 'drop'; readonly index: number; readonly share?: readonly Course[] }
  /** A current drawn from `a` and returned to `b`. */
  | { readonly kind: 'draw'; readonly a: Terminal; readonly b: Terminal };

/** Adds to `target` the right-hand side that a unit change of the parameter makes in stage `s`. */
export function parameterCurrent(
  circuit: Circuit,
  path: Trajectory,
  s: number,
  parameter: Parameter,
  target: Float64Array,
  at: number,
): void {
  const { nodes, knowns } = circuit;
  const v0 = s * (nodes + knowns);
  const segment = path.segment[s]!;
  const add = (a: number, b: number, current: number) => {
    if (a < nodes) target[at + a] = target[at + a]! - current;
    if (b < nodes) target[at + b] = target[at + b]! + current;
  };
  switch (parameter.kind) {
    case 'ohms': {
      if (parameter.segment !== undefined && parameter.segment !== segment) return;
      const { a, b } = circuit.resistors;
      const k = parameter.index;
      const across = path.volts[v0 + a[k]!]! - path.volts[v0 + b[k]!]!;
      const drop = dropAt(circuit, k, segment, path.time[s]!);
      add(a[k]!, b[k]!, -circuit.conductance[segment]![k]! * (across - drop));
      return;
    }
    case 'volts': {
      const share = followed(circuit, path, s, parameter.share);
      if (share !== 0)
        knownCurrent(circuit, path, s, nodes + parameter.index, (a, b, current) => {
          add(a, b, share * current);
        });
      return;
    }
    case 'alpha': {
      const k = parameter.index;
      const current = path.lines.i[s * circuit.diodes.count + k]!;
      add(circuit.collector[k]!, circuit.baseEnd[k]!, Math.sign(circuit.alpha[k]!) * current);
      return;
    }
    case 'drop': {
      const { a, b } = circuit.resistors;
      const k = parameter.index;
      const share = followed(circuit, path, s, parameter.share);
      add(a[k]!, b[k]!, -circuit.conductance[segment]![k]! * share);
      return;
    }
    case 'farads':
    case 'esr': {
      const k = parameter.index;
      const { g, current, reach } = capacitorAt(circuit, path, s, k);
      const factor = parameter.kind === 'farads' ? reach : -circuit.esr[k]!;
      add(circuit.capacitors.a[k]!, circuit.capacitors.b[k]!, g * factor * current);
      return;
    }
    case 'load': {
      const { a, b } = circuit.loads;
      const k = parameter.index;
      const v = path.volts[v0 + a[k]!]! - path.volts[v0 + b[k]!]!;
      add(a[k]!, b[k]!, loadCurrent(circuit.laws[k]!, v));
      return;
    }
    case 'draw':
      add(
        parameter.a >= 0 ? circuit.place[parameter.a]! : nodes,
        parameter.b >= 0 ? circuit.place[parameter.b]! : nodes,
        1,
      );
      return;
    default:
      pushDiode(
        circuit,
        parameter.index,
        diodeChange(circuit, path, s, parameter.kind, parameter.index),
        add,
      );
      return;
  }
}

/** What a unit change of the parameter adds to the capacitor's state beside the change of its current. */
export function parameterState(
  circuit: Circuit,
  path: Trajectory,
  s: number,
  parameter: Parameter,
  state: Float64Array,
  at: number,
  columns: number,
  column: number,
): void {
  if (parameter.kind === 'volts') {
    const share = followed(circuit, path, s, parameter.share);
    if (share !== 0)
      knownState(circuit, path, s, circuit.nodes + parameter.index, share, state, at, columns, column);
    return;
  }
  if (parameter.kind !== 'farads' && parameter.kind !== 'esr') return;
  const k = parameter.index;
  const { g, current, reach } = capacitorAt(circuit, path, s, k);
  const index = at + k * columns + column;
  const shift =
    parameter.kind === 'farads'
      ? reach * (g * reach * current - current)
      : -reach * g * circuit.esr[k]! * current;
  state[index] = state[index]! + shift;
}

/** How far the potential follows its parameter at stage `s`, 0..1. */
function followed(
  circuit: Circuit,
  path: Trajectory,
  s: number,
  share: readonly Course[] | undefined,
): number {
  if (!share) return 1;
  const segment = path.segment[s]!;
  const { duration } = circuit.network.segments[segment]!;
  return courseAt(share[segment]!, (path.time[s]! - circuit.segmentStart[segment]!) / duration);
}

/** A capacitor that stands on the potential is pushed along with it. */
function knownState(
  circuit: Circuit,
  path: Trajectory,
  s: number,
  known: number,
  share: number,
  state: Float64Array,
  at: number,
  columns: number,
  column: number,
): void {
  const { count, a, b } = circuit.capacitors;
  for (let k = 0; k < count; k++) {
    const sign = (a[k] === known ? 1 : 0) - (b[k] === known ? 1 : 0);
    if (sign === 0) continue;
    const reach = path.reach[s]! / circuit.farads[k]!;
    const index = at + k * columns + column;
    state[index] = state[index]! + (share * sign * reach) / (reach + circuit.esr[k]!);
  }
}

function capacitorAt(circuit: Circuit, path: Trajectory, s: number, k: number) {
  const v0 = s * (circuit.nodes + circuit.knowns);
  const reach = path.reach[s]! / circuit.farads[k]!;
  const g = 1 / (reach + circuit.esr[k]!);
  const across = path.volts[v0 + circuit.capacitors.a[k]!]! - path.volts[v0 + circuit.capacitors.b[k]!]!;
  return { g, reach, current: g * (across - path.origin[s * circuit.capacitors.count + k]!) };
}

/** Change of the diode's current at fixed voltage per unit of the logarithm of one of its parameters, A. */
function diodeChange(
  circuit: Circuit,
  path: Trajectory,
  s: number,
  kind: 'saturation' | 'slope' | 'diode-ohms',
  k: number,
): number {
  const saturation = circuit.saturation[k]!;
  const slope = circuit.slope[k]!;
  const ohms = circuit.diodeOhms[k]!;
  const current = Math.max(path.lines.i[s * circuit.diodes.count + k]!, -saturation * (1 - 1e-15));
  const total = current + saturation;
  const scale = 1 / (slope + ohms * total);
  if (kind === 'saturation') return slope * current * scale;
  if (kind === 'slope') return -total * slope * Math.log1p(current / saturation) * scale;
  return -ohms * current * total * scale;
}

/** A change of a diode's current, and of what a transistor's junction moves from collector to base end. */
function pushDiode(
  circuit: Circuit,
  k: number,
  current: number,
  add: (a: number, b: number, current: number) => void,
): void {
  add(circuit.diodes.a[k]!, circuit.diodes.b[k]!, current);
  if (circuit.alpha[k] !== 0) add(circuit.collector[k]!, circuit.baseEnd[k]!, circuit.alpha[k]! * current);
}

/** A rise of a known potential by 1 V pushes the conductance of each element attached to it. */
function knownCurrent(
  circuit: Circuit,
  path: Trajectory,
  s: number,
  known: number,
  add: (a: number, b: number, current: number) => void,
): void {
  const push = (branches: { a: Int32Array; b: Int32Array }, k: number, g: number) => {
    if (branches.a[k] === known) add(known, branches.b[k]!, g);
    else if (branches.b[k] === known) add(branches.a[k]!, known, -g);
  };
  const segment = path.segment[s]!;
  for (let k = 0; k < circuit.resistors.count; k++)
    push(circuit.resistors, k, circuit.conductance[segment]![k]!);
  for (let k = 0; k < circuit.capacitors.count; k++)
    push(circuit.capacitors, k, 1 / (path.reach[s]! / circuit.farads[k]! + circuit.esr[k]!));
  for (let k = 0; k < circuit.diodes.count; k++) {
    const g = path.lines.g[s * circuit.diodes.count + k]!;
    push(circuit.diodes, k, g);
    const sign = (circuit.diodes.a[k] === known ? 1 : 0) - (circuit.diodes.b[k] === known ? 1 : 0);
    if (sign !== 0 && circuit.alpha[k] !== 0)
      add(circuit.collector[k]!, circuit.baseEnd[k]!, sign * circuit.alpha[k]! * g);
  }
  for (let k = 0; k < circuit.loads.count; k++) {
    const v = path.loadVolts[s * circuit.loads.count + k]!;
    push(circuit.loads, k, loadConductance(circuit.laws[k]!, v));
  }
}
