/**
 * From a network to its periodic steady state: a coarse period that needs no guess, a fine mesh laid by one
 * integration, Newton's method over the whole period on that mesh, and the mesh again if it turns out too
 * coarse for the solution found.
 */
import { type Circuit, prepare } from './circuit';
import { coarseSolution, leadIn } from './coarse-start';
import { standIn } from './load';
import { type Measures, measure } from './measure';
import { coarseMesh, fineMesh, type MeshSettings, meshError } from './mesh';
import { type Network, networkFault } from './network';
import type { Parameter } from './parameter';
import { solvePeriodic } from './periodic';
import { differentiate, type Port, type PortDerivatives } from './port-derivatives';
import type { Trajectory } from './trajectory';

export interface SolveOptions {
  /** Error of each step as a share of the charge that a capacitor moves in a period. */
  readonly tolerance: number;
  /** Largest error of a diode's straight line in the result, V. */
  readonly lineError: number;
  /** Nodes between which the output is taken, for `derivatives`. */
  readonly port?: Port;
  /** What the average voltage at `port` is differentiated by. */
  readonly parameters: readonly Parameter[];
}

export const defaultOptions: SolveOptions = { tolerance: 5e-4, lineError: 1e-6, parameters: [] };

export interface Counts {
  readonly coarse: number;
  readonly fine: number;
  readonly meshes: number;
  readonly stages: number;
}

export interface Solved extends Measures {
  readonly converged: true;
  readonly derivatives: PortDerivatives;
  readonly counts: Counts;
  /** True when loads of constant power had to be taken as resistors of that average power. */
  readonly powerAveraged: boolean;
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

/** Meshes laid for one solution before it is given up. */
const mostRounds = 8;
/** Steps in one segment of the first meshes; the last ones may take several times as many. */
const mostSteps = 400;

/**
 * Never throws; work is bounded. A result whose energy balance is off by 0.1 % or more is `Unsolved`.
 *
 * A load of constant power whose voltage collapses and recovers within each period has no orderly solution; it is
 * then taken as the resistor that draws its power at the average voltage, and the result says so.
 */
export function solve(network: Network, options: Partial<SolveOptions> = {}): Solved | Unsolved {
  const settings = { ...defaultOptions, ...options };
  const fault = networkFault(network);
  if (fault !== undefined) return { converged: false, reason: fault };
  const circuit = prepare(network);
  const result = solveCircuit(circuit, settings, false);
  if (result.converged || !circuit.laws.some((law) => law.kind === 'power')) return result;
  const path = coarseMesh(circuit, 1);
  const { volts } = leadIn(circuit, path, new Float64Array(circuit.capacitors.count));
  const laws = circuit.laws.map((law, k) => (law.kind === 'power' ? standIn(law, volts[k]!) : law));
  return solveCircuit({ ...circuit, laws }, settings, true);
}

function solveCircuit(circuit: Circuit, settings: SolveOptions, powerAveraged: boolean): Solved | Unsolved {
  const start = new Float64Array(circuit.capacitors.count);
  const coarse = coarseSolution(circuit, start);
  if (!coarse) return { converged: false, reason: 'the coarse period did not settle' };
  let seed = coarse.path;
  let tolerance = settings.tolerance;
  let reason = 'no mesh was fine enough';
  let fine = 0;
  for (let round = 1; round <= mostRounds; round++) {
    const mesh: MeshSettings = {
      tolerance,
      lineError: settings.lineError,
      mostSteps: round > 4 ? 4 * mostSteps : mostSteps,
    };
    const laid = layMesh(circuit, start, seed, mesh);
    if (!laid) return { converged: false, reason: 'a step within the period did not settle' };
    const { path } = laid;
    const result = solvePeriodic(circuit, path, start, settings.lineError, 60);
    fine += result.iterations;
    if (!result.converged) return { converged: false, reason: 'the fine period did not settle' };
    seed = path;
    if (laid.loosened || meshError(circuit, path, swings(circuit, path), mesh) > 8) continue;
    const measures = measure(circuit, path);
    if (measures.balance >= balanceLimit) {
      reason = `the energy balance stays off by ${(100 * measures.balance).toPrecision(2)} %`;
      tolerance /= 10;
      continue;
    }
    return {
      converged: true,
      ...measures,
      derivatives: differentiate(circuit, path, start, settings.parameters, settings.port),
      counts: { coarse: coarse.iterations, fine, meshes: round, stages: path.count },
      powerAveraged,
      start,
      circuit,
      path,
    };
  }
  return { converged: false, reason };
}

/**
 * Away from the periodic state the path may be far rougher than it will be in it: a mesh that needs too many
 * steps is laid with a looser hand, and laid again from the solution it leads to.
 */
function layMesh(
  circuit: Circuit,
  start: Float64Array,
  seed: Trajectory,
  mesh: MeshSettings,
): { path: Trajectory; loosened: boolean } | undefined {
  const swing = swings(circuit, seed);
  for (const factor of [1, 10, 100]) {
    const path = fineMesh(circuit, start, swing, seed, { ...mesh, tolerance: factor * mesh.tolerance });
    if (path) return { path, loosened: factor > 1 };
  }
  return undefined;
}

/** Voltage by which each capacitor moves within the period, with a floor that no error needs to undercut. */
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
    swing[k] = high - low;
  }
  const floor = Math.max(1e-3, 2e-4 * Math.max(...swing));
  return swing.map((value) => Math.max(value, floor));
}
