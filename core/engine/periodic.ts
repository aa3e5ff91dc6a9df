/**
 * The periodic steady state on a given mesh, by Newton's method over the whole period at once: each stage
 * keeps its own straight lines for diodes and loads, one linear pass carries the derivatives of the final
 * state with respect to the initial one, and the condition "ends where it began" gives both the new initial
 * state and, through those derivatives, every voltage in between (shooting after T. J. Aprille,
 * T. N. Trick, Proc. IEEE 60, 1972, without an inner iteration).
 */
import type { Circuit } from './circuit';
import { solveDense } from './dense';
import { type Derivatives, derivatives, differentiateStage, moveLines, solveStage } from './stage';
import { gamma, type Trajectory } from './trajectory';

export interface PeriodicResult {
  readonly converged: boolean;
  readonly iterations: number;
  /** Largest voltage error of any straight line at the last iteration, V. */
  readonly error: number;
}

/** Iterations after which a goal that rounding may not allow is widened. */
const patience = 25;

/** Iterates until no straight line is off by more than `tolerance` volt; `start` is changed in place. */
export function solvePeriodic(
  circuit: Circuit,
  path: Trajectory,
  start: Float64Array,
  tolerance: number,
  most: number,
): PeriodicResult {
  const d = derivatives(circuit, path.count, []);
  let error = Number.POSITIVE_INFINITY;
  for (let iteration = 1; iteration <= most; iteration++) {
    if (!linearPass(circuit, path, start, d)) return { converged: false, iterations: iteration, error };
    const change = closePeriod(circuit, path, start, d);
    if (change === undefined) return { converged: false, iterations: iteration, error };
    shiftPath(circuit, path, start, d, change);
    error = 0;
    for (let s = 0; s < path.count; s++) {
      const worst = moveLines(circuit, path, s);
      if (!(worst <= error)) error = worst;
    }
    // Where rounding keeps the iteration from its goal, a hundred times that is still far below what matters.
    const goal = iteration < patience ? tolerance : 100 * tolerance;
    if (error <= goal) return { converged: true, iterations: iteration, error };
    if (!Number.isFinite(error)) return { converged: false, iterations: iteration, error };
  }
  return { converged: false, iterations: most, error };
}

/** One pass over all stages from `start`, with derivatives; false when a stage is singular. */
export function linearPass(circuit: Circuit, path: Trajectory, start: Float64Array, d: Derivatives): boolean {
  const count = circuit.capacitors.count;
  const { columns } = d;
  const ratio = (1 - gamma) / gamma;
  let begin = -1;
  for (let s = 0; s < path.count; s++) {
    const x0 = s * count;
    const s0 = s * count * columns;
    const secondStage = s > 0 && !path.last[s - 1];
    for (let k = 0; k < count; k++) {
      const from = begin < 0 ? start[k]! : path.state[begin * count + k]!;
      path.origin[x0 + k] = secondStage ? from + ratio * (path.state[x0 - count + k]! - from) : from;
      for (let j = 0; j < columns; j++) {
        const place = k * columns + j;
        const source = begin < 0 ? (k === j ? 1 : 0) : d.state[begin * count * columns + place]!;
        d.origin[s0 + place] = secondStage
          ? source + ratio * (d.state[s0 - count * columns + place]! - source)
          : source;
      }
    }
    if (!solveStage(circuit, path, s)) return false;
    differentiateStage(circuit, path, s, d);
    if (path.last[s]) begin = s;
  }
  return true;
}

/**
 * Change of the initial state that closes the period, and its derivatives with respect to the parameters:
 * `capacitors` rows of `1 + parameters` entries; undefined when the period map has no unique fixed point.
 */
export function closePeriod(
  circuit: Circuit,
  path: Trajectory,
  start: Float64Array,
  d: Derivatives,
): Float64Array | undefined {
  const count = circuit.capacitors.count;
  const width = 1 + d.parameters.length;
  const matrix = new Float64Array(count * count);
  const change = new Float64Array(count * width);
  const end = (path.count - 1) * count;
  for (let k = 0; k < count; k++) {
    for (let j = 0; j < count; j++)
      matrix[k * count + j] = (k === j ? 1 : 0) - d.state[(end + k) * d.columns + j]!;
    change[k * width] = path.state[end + k]! - start[k]!;
    for (let p = 0; p < d.parameters.length; p++)
      change[k * width + 1 + p] = d.state[(end + k) * d.columns + count + p]!;
  }
  return solveDense(matrix, change, count, width) ? change : undefined;
}

/** Applies the change of the initial state to everything that depends on it. */
function shiftPath(
  circuit: Circuit,
  path: Trajectory,
  start: Float64Array,
  d: Derivatives,
  change: Float64Array,
): void {
  const { nodes, knowns } = circuit;
  const count = circuit.capacitors.count;
  const { columns } = d;
  for (let k = 0; k < count; k++) start[k] = start[k]! + change[k]!;
  for (let s = 0; s < path.count; s++) {
    const v0 = s * (nodes + knowns);
    for (let j = 0; j < count; j++) {
      const step = change[j]!;
      const column = (s * columns + j) * nodes;
      for (let n = 0; n < nodes; n++) path.volts[v0 + n] = path.volts[v0 + n]! + step * d.volts[column + n]!;
      for (let k = 0; k < count; k++) {
        const place = (s * count + k) * columns + j;
        path.state[s * count + k] = path.state[s * count + k]! + step * d.state[place]!;
        path.origin[s * count + k] = path.origin[s * count + k]! + step * d.origin[place]!;
      }
    }
  }
}
