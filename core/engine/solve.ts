/**
 * From a network to its periodic steady state: a coarse period that needs no guess, a fine mesh laid by one
 * integration, Newton's method over the whole period on that mesh, and the mesh again if it turns out too
 * coarse for the solution found.
 */
import { type Circuit, prepare } from './circuit';
import { type Measures, measure } from './measure';
import { coarseMesh, fineMesh, type MeshSettings, meshError } from './mesh';
import { type Network, networkFault, type Terminal } from './network';
import type { Parameter } from './parameter';
import { closePeriod, linearPass, solvePeriodic } from './periodic';
import { derivatives } from './stage';
import type { Trajectory } from './trajectory';

export interface SolveOptions {
  /** Error of each step as a share of the charge that a capacitor moves in a period. */
  readonly tolerance: number;
  /** Largest error of a diode's straight line in the result, V. */
  readonly lineError: number;
  /** Nodes between which the output is taken, for `derivatives`. */
  readonly port?: { readonly a: Terminal; readonly b: Terminal };
  /** What the average voltage at `port` is differentiated by. */
  readonly parameters: readonly Parameter[];
}

export const defaultOptions: SolveOptions = { tolerance: 1e-3, lineError: 1e-6, parameters: [] };

export interface Counts {
  readonly coarse: number;
  readonly fine: number;
  readonly meshes: number;
  readonly stages: number;
}

export interface Solved extends Measures {
  readonly converged: true;
  /** d(average voltage at `port`) per unit of each parameter, in the order of `parameters`. */
  readonly derivatives: readonly number[];
  readonly counts: Counts;
  /** Capacitor states at the start of the period, V. */
  readonly start: Float64Array;
  readonly circuit: Circuit;
  readonly path: Trajectory;
}

export interface Unsolved {
  readonly converged: false;
  readonly reason: string;
}

/** Energy that may go missing in the integration before a result counts as none. */
const balanceLimit = 1e-3;

/** Never throws; work is bounded. A result whose energy balance is off by 0.1 % or more is `Unsolved`. */
export function solve(network: Network, options: Partial<SolveOptions> = {}): Solved | Unsolved {
  const settings = { ...defaultOptions, ...options };
  const fault = networkFault(network);
  if (fault !== undefined) return { converged: false, reason: fault };
  const circuit = prepare(network);
  let reason = 'no iteration settled';
  for (const tighter of [1, 0.1, 0.01]) {
    const result = attempt(circuit, settings, settings.tolerance * tighter);
    if (!result.converged) {
      reason = result.reason;
      continue;
    }
    if (result.balance < balanceLimit) return result;
    reason = `energy balance off by ${(100 * result.balance).toPrecision(2)} %`;
  }
  return { converged: false, reason };
}

function attempt(circuit: Circuit, options: SolveOptions, tolerance: number): Solved | Unsolved {
  const count = circuit.capacitors.count;
  const start = new Float64Array(count);
  const first = coarseSolution(circuit, start);
  if (!first) return { converged: false, reason: 'the coarse period did not settle' };
  const mesh: MeshSettings = { tolerance, lineError: options.lineError, mostSteps: 400 };
  let swing = swings(circuit, first.path);
  let seed = first.path;
  let fine = 0;
  for (let meshes = 1; meshes <= 4; meshes++) {
    const path = fineMesh(circuit, start, swing, seed, mesh);
    if (!path) return { converged: false, reason: 'a step within the period did not settle' };
    const result = solvePeriodic(circuit, path, start, options.lineError, 60);
    fine += result.iterations;
    if (!result.converged) return { converged: false, reason: 'the fine period did not settle' };
    swing = swings(circuit, path);
    seed = path;
    if (meshError(circuit, path, swing, mesh) > 8 && meshes < 4) continue;
    return {
      converged: true,
      ...measure(circuit, path),
      derivatives: differentiate(circuit, path, start, options),
      counts: { coarse: first.iterations, fine, meshes, stages: path.count },
      start,
      circuit,
      path,
    };
  }
  return { converged: false, reason: 'no mesh was fine enough' };
}

function coarseSolution(
  circuit: Circuit,
  start: Float64Array,
): { path: Trajectory; iterations: number } | undefined {
  for (const steps of [1, 3, 8]) {
    const path = coarseMesh(circuit, steps);
    start.fill(0);
    // A start need not be exact: a tenth of a millivolt is far below what the coarse steps are off by.
    const result = solvePeriodic(circuit, path, start, 1e-4, 100);
    if (result.converged) return { path, iterations: result.iterations };
  }
  return undefined;
}

/** Voltage by which each capacitor moves within the period, with a floor of a millivolt. */
function swings(circuit: Circuit, path: Trajectory): Float64Array {
  const count = circuit.capacitors.count;
  const swing = new Float64Array(count);
  for (let k = 0; k < count; k++) {
    let low = Number.POSITIVE_INFINITY;
    let high = Number.NEGATIVE_INFINITY;
    for (let s = 0; s < path.count; s++) {
      if (!path.last[s]) continue;
      const v = path.state[s * count + k]!;
      if (v < low) low = v;
      if (v > high) high = v;
    }
    swing[k] = Math.max(high - low, 1e-3);
  }
  return swing;
}

function differentiate(
  circuit: Circuit,
  path: Trajectory,
  start: Float64Array,
  options: SolveOptions,
): number[] {
  const { parameters, port } = options;
  if (parameters.length === 0 || !port) return [];
  const d = derivatives(circuit, path.count, parameters);
  if (!linearPass(circuit, path, start, d)) return parameters.map(() => Number.NaN);
  const change = closePeriod(circuit, path, start, d);
  if (!change) return parameters.map(() => Number.NaN);
  const { nodes } = circuit;
  const count = circuit.capacitors.count;
  const at = (column: number, s: number, terminal: Terminal) =>
    terminal < 0 ? 0 : d.volts[(s * d.columns + column) * nodes + circuit.place[terminal]!]!;
  const average = (column: number) => {
    let sum = 0;
    for (let s = 0; s < path.count; s++)
      sum += path.weight[s]! * (at(column, s, port.a) - at(column, s, port.b));
    return sum / circuit.period;
  };
  const byState = Array.from({ length: count }, (_, k) => average(k));
  const width = 1 + parameters.length;
  return parameters.map((_, p) => {
    let total = average(count + p);
    for (let k = 0; k < count; k++) total += byState[k]! * change[k * width + 1 + p]!;
    return total;
  });
}
