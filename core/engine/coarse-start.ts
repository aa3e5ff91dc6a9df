/**
 * Where the solution starts from: a coarse period that needs no guess, and for loads of constant power the way to
 * their higher operating point.
 */
import type { Circuit } from './circuit';
import { standIn } from './load';
import { coarseMesh } from './mesh';
import { solvePeriodic } from './periodic';
import type { Trajectory } from './trajectory';

/** Undefined when no coarse mesh settles; `start` becomes the state at the start of the period. */
export function coarseSolution(
  circuit: Circuit,
  start: Float64Array,
): { path: Trajectory; iterations: number } | undefined {
  for (const steps of [1, 3, 8]) {
    const path = coarseMesh(circuit, steps);
    start.fill(0);
    const before = circuit.laws.some((law) => law.kind === 'power')
      ? leadIn(circuit, path, start).iterations
      : 0;
    // A start need not be exact: a tenth of a millivolt is far below what the coarse steps are off by.
    const result = solvePeriodic(circuit, path, start, 1e-4, 100);
    if (result.converged) return { path, iterations: before + result.iterations };
  }
  return undefined;
}

/** Rounds in which stand-ins for constant powers may still move. */
const mostStandIns = 80;

/**
 * Leads a network with loads of constant power to its higher operating point, or to where it collapses: each power is
 * a resistor that takes it at the voltage of the round before, from the open voltage down. Returns the voltages of
 * the loads at the end, and the iterations.
 */
export function leadIn(
  circuit: Circuit,
  path: Trajectory,
  start: Float64Array,
): { volts: readonly number[]; iterations: number } {
  const { loads, network } = circuit;
  const volts = network.loads.map((load) => ('start' in load ? load.start : 0));
  let iterations = 0;
  for (let round = 0; round < mostStandIns; round++) {
    const laws = circuit.laws.map((law, k) => (law.kind === 'power' ? standIn(law, volts[k]!) : law));
    const result = solvePeriodic({ ...circuit, laws }, path, start, 1e-4, 100);
    iterations += result.iterations;
    if (!result.converged) break;
    let moved = 0;
    for (let k = 0; k < loads.count; k++) {
      if (circuit.laws[k]!.kind !== 'power') continue;
      const average = averageAcross(circuit, path, loads.a[k]!, loads.b[k]!);
      moved = Math.max(
        moved,
        Math.abs(average - volts[k]!) / Math.max(Math.abs(average), circuit.laws[k]!.knee),
      );
      volts[k] = average;
    }
    if (moved < 1e-3) break;
  }
  return { volts, iterations };
}

function averageAcross(circuit: Circuit, path: Trajectory, a: number, b: number): number {
  const width = circuit.nodes + circuit.knowns;
  let sum = 0;
  for (let s = 0; s < path.count; s++)
    sum += path.weight[s]! * (path.volts[s * width + a]! - path.volts[s * width + b]!);
  return sum / circuit.period;
}
