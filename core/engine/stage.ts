/**
 * One implicit stage: the nodal equations with every capacitor as a conductance behind its last state and
 * every diode and load as a straight line, solved for voltages and, when asked, for their derivatives with
 * respect to the state at the start of the period and to parameters.
 */
import { type Circuit, dropAt, stamp, stampSource, stampTransfer } from './circuit';
import { moveLine, openingLine } from './diode';
import { lineError, loadConductance, loadCurrent } from './load';
import { type Parameter, parameterCurrent, parameterState } from './parameter';
import type { Trajectory } from './trajectory';

/** Derivatives of one pass: columns are the capacitor states at the start, then parameters. */
export interface Derivatives {
  readonly columns: number;
  readonly parameters: readonly Parameter[];
  /** Of each stage's unknown voltages: stage by stage, column by column, `nodes` entries each. */
  readonly volts: Float64Array;
  /** Of each stage's capacitor states: stage by stage, `capacitors * columns`, row by row. */
  readonly state: Float64Array;
  /** Of the states a stage started from, laid out as `state`. */
  readonly origin: Float64Array;
}

export function derivatives(circuit: Circuit, stages: number, parameters: readonly Parameter[]): Derivatives {
  const columns = circuit.capacitors.count + parameters.length;
  return {
    columns,
    parameters,
    volts: new Float64Array(stages * columns * circuit.nodes),
    state: new Float64Array(stages * columns * circuit.capacitors.count),
    origin: new Float64Array(stages * columns * circuit.capacitors.count),
  };
}

/** Voltages and states of stage `s` from its `origin` and lines; false when the equations are singular. */
export function solveStage(circuit: Circuit, path: Trajectory, s: number): boolean {
  const { nodes, knowns, capacitors, diodes, loads, work } = circuit;
  const segment = path.segment[s]!;
  const at = s * (nodes + knowns);
  const volts = path.volts;
  const rhs = circuit.work.scratch;
  work.copy(circuit.base[segment]!);
  rhs.fill(0);
  for (let n = 0; n < circuit.sources.length; n++) {
    const k = circuit.sources[n]!;
    const g = circuit.conductance[segment]![k]!;
    const drop = dropAt(circuit, k, segment, path.time[s]!);
    stampSource(rhs, circuit.resistors, k, g, -g * drop, nodes, volts, at);
  }
  const c0 = s * capacitors.count;
  for (let k = 0; k < capacitors.count; k++) {
    const g = 1 / (path.reach[s]! / circuit.farads[k]! + circuit.esr[k]!);
    stamp(work, rhs, capacitors, k, g, -g * path.origin[c0 + k]!, nodes, volts, at);
  }
  const d0 = s * diodes.count;
  const { i, u, g } = path.lines;
  for (let k = 0; k < diodes.count; k++) {
    const slope = g[d0 + k]!;
    const offset = i[d0 + k]! - slope * u[d0 + k]!;
    stamp(work, rhs, diodes, k, slope, offset, nodes, volts, at);
    if (circuit.alpha[k] !== 0) stampTransfer(work, rhs, circuit, k, slope, offset, volts, at);
  }
  const l0 = s * loads.count;
  for (let k = 0; k < loads.count; k++) {
    const v = path.loadVolts[l0 + k]!;
    const slope = loadConductance(circuit.laws[k]!, v);
    stamp(work, rhs, loads, k, slope, loadCurrent(circuit.laws[k]!, v) - slope * v, nodes, volts, at);
  }
  if (!work.factor()) return false;
  work.solve(rhs, 0);
  for (let n = 0; n < nodes; n++) volts[at + n] = rhs[n]!;
  for (let k = 0; k < capacitors.count; k++) {
    const reach = path.reach[s]! / circuit.farads[k]!;
    const origin = path.origin[c0 + k]!;
    const across = volts[at + capacitors.a[k]!]! - volts[at + capacitors.b[k]!]!;
    path.state[c0 + k] = origin + (reach * (across - origin)) / (reach + circuit.esr[k]!);
  }
  return true;
}

/** Derivatives of stage `s`, right after `solveStage` for it: the same factors serve. */
export function differentiateStage(circuit: Circuit, path: Trajectory, s: number, d: Derivatives): void {
  const { nodes, capacitors, work } = circuit;
  const count = capacitors.count;
  const { columns } = d;
  const v0 = s * columns * nodes;
  const x0 = s * columns * count;
  d.volts.fill(0, v0, v0 + columns * nodes);
  for (let k = 0; k < count; k++) {
    const g = 1 / (path.reach[s]! / circuit.farads[k]! + circuit.esr[k]!);
    const a = capacitors.a[k]!;
    const b = capacitors.b[k]!;
    for (let j = 0; j < columns; j++) {
      const w = g * d.origin[x0 + k * columns + j]!;
      if (a < nodes) d.volts[v0 + j * nodes + a] = d.volts[v0 + j * nodes + a]! + w;
      if (b < nodes) d.volts[v0 + j * nodes + b] = d.volts[v0 + j * nodes + b]! - w;
    }
  }
  for (let p = 0; p < d.parameters.length; p++)
    parameterCurrent(circuit, path, s, d.parameters[p]!, d.volts, v0 + (count + p) * nodes);
  for (let j = 0; j < columns; j++) work.solve(d.volts, v0 + j * nodes);
  for (let k = 0; k < count; k++) {
    const reach = path.reach[s]! / circuit.farads[k]!;
    const share = reach / (reach + circuit.esr[k]!);
    const a = capacitors.a[k]!;
    const b = capacitors.b[k]!;
    for (let j = 0; j < columns; j++) {
      const origin = d.origin[x0 + k * columns + j]!;
      const across =
        (a < nodes ? d.volts[v0 + j * nodes + a]! : 0) - (b < nodes ? d.volts[v0 + j * nodes + b]! : 0);
      d.state[x0 + k * columns + j] = origin + share * (across - origin);
    }
  }
  for (let p = 0; p < d.parameters.length; p++)
    parameterState(circuit, path, s, d.parameters[p]!, d.state, x0, columns, count + p);
}

/**
 * Moves the lines of all diodes and loads of stage `s` to its present voltages.
 * Returns the largest error the old lines made, V.
 */
export function moveLines(circuit: Circuit, path: Trajectory, s: number): number {
  const { nodes, knowns, diodes, loads } = circuit;
  const at = s * (nodes + knowns);
  let worst = 0;
  for (let k = 0; k < diodes.count; k++) {
    const v = path.volts[at + diodes.a[k]!]! - path.volts[at + diodes.b[k]!]!;
    const error = moveLine(
      path.lines,
      s * diodes.count + k,
      v,
      circuit.saturation[k]!,
      circuit.slope[k]!,
      circuit.diodeOhms[k]!,
    );
    if (!(error <= worst)) worst = error;
  }
  for (let k = 0; k < loads.count; k++) {
    const v = path.volts[at + loads.a[k]!]! - path.volts[at + loads.b[k]!]!;
    const old = path.loadVolts[s * loads.count + k]!;
    path.loadVolts[s * loads.count + k] = v;
    const error = lineError(circuit.laws[k]!, old, v);
    if (!(error <= worst)) worst = error;
  }
  return worst;
}

/** Lines for a stage that has no history: diodes lightly conducting, loads in their flat part. */
export function openLines(circuit: Circuit, path: Trajectory, s: number): void {
  const { diodes, loads } = circuit;
  for (let k = 0; k < diodes.count; k++)
    openingLine(
      path.lines,
      s * diodes.count + k,
      circuit.saturation[k]!,
      circuit.slope[k]!,
      circuit.diodeOhms[k]!,
    );
  for (let k = 0; k < loads.count; k++) {
    const load = circuit.network.loads[k]!;
    path.loadVolts[s * loads.count + k] = 'start' in load ? load.start : 20 * load.knee;
  }
}

/** Copies the lines of stage `from` of one path to stage `to` of another. */
export function copyLines(
  circuit: Circuit,
  source: Trajectory,
  from: number,
  target: Trajectory,
  to: number,
): void {
  const nd = circuit.diodes.count;
  for (let k = 0; k < nd; k++) {
    target.lines.i[to * nd + k] = source.lines.i[from * nd + k]!;
    target.lines.u[to * nd + k] = source.lines.u[from * nd + k]!;
    target.lines.g[to * nd + k] = source.lines.g[from * nd + k]!;
  }
  const nl = circuit.loads.count;
  for (let k = 0; k < nl; k++) target.loadVolts[to * nl + k] = source.loadVolts[from * nl + k]!;
}
