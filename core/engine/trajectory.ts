/**
 * One clock period as a row of stages: the implicit solutions from which steps are made, each with its
 * node voltages, capacitor states and the straight lines that stand for its diodes and loads.
 *
 * Steps are SDIRK2 of two stages (R. Alexander, SIAM J. Numer. Anal. 14, 1977; L-stable, stiffly accurate),
 * backward Euler of one stage for the coarse start, and at every clock edge a probe of no length, which
 * yields the currents and voltages right behind the edge.
 */
import type { Circuit } from './circuit';
import { type DiodeLines, diodeLines } from './diode';
import { courseAt } from './network';

export const gamma = 1 - Math.SQRT1_2;

export enum Step {
  probe = 0,
  euler = 1,
  sdirk = 2,
}

export interface Trajectory {
  /** Stages in use. */
  count: number;
  readonly capacity: number;
  /** Which step a stage belongs to: its kind and whether it is the step's last stage. */
  readonly kind: Uint8Array;
  readonly last: Uint8Array;
  readonly segment: Int32Array;
  /** Length of the step, s. */
  readonly length: Float64Array;
  /** Implicit time constant of the stage, s: the capacitor moves by `reach / farads * current`. */
  readonly reach: Float64Array;
  /** Share of the period that the stage stands for in averages, s. */
  readonly weight: Float64Array;
  /** Position in the period, s. */
  readonly time: Float64Array;
  /** `nodes + knowns` per stage. */
  readonly volts: Float64Array;
  /** State of each capacitor at the stage, V. */
  readonly state: Float64Array;
  /** State each capacitor started the stage from, V. */
  readonly origin: Float64Array;
  readonly lines: DiodeLines;
  /** Voltage about which each load was linearised, V. */
  readonly loadVolts: Float64Array;
}

export function trajectory(circuit: Circuit, capacity: number): Trajectory {
  return {
    count: 0,
    capacity,
    kind: new Uint8Array(capacity),
    last: new Uint8Array(capacity),
    segment: new Int32Array(capacity),
    length: new Float64Array(capacity),
    reach: new Float64Array(capacity),
    weight: new Float64Array(capacity),
    time: new Float64Array(capacity),
    volts: new Float64Array(capacity * (circuit.nodes + circuit.knowns)),
    state: new Float64Array(capacity * circuit.capacitors.count),
    origin: new Float64Array(capacity * circuit.capacitors.count),
    lines: diodeLines(capacity * circuit.diodes.count),
    loadVolts: new Float64Array(capacity * circuit.loads.count),
  };
}

/** The same path with room for twice as many stages. */
export function grown(circuit: Circuit, path: Trajectory): Trajectory {
  const larger = trajectory(circuit, 2 * path.capacity);
  larger.count = path.count;
  for (const key of plainArrays) larger[key].set(path[key]);
  for (const key of ['i', 'u', 'g'] as const) larger.lines[key].set(path.lines[key]);
  return larger;
}

const plainArrays = [
  'kind',
  'last',
  'segment',
  'length',
  'reach',
  'weight',
  'time',
  'volts',
  'state',
  'origin',
  'loadVolts',
] as const;

/** Writes the fixed facts of a step's stages from index `at`; returns the index behind them. */
export function placeStep(
  circuit: Circuit,
  path: Trajectory,
  at: number,
  kind: Step,
  segment: number,
  start: number,
  length: number,
): number {
  const stages = kind === Step.sdirk ? 2 : 1;
  for (let s = at; s < at + stages; s++) {
    const final = s === at + stages - 1;
    path.kind[s] = kind;
    path.last[s] = final ? 1 : 0;
    path.segment[s] = segment;
    path.length[s] = length;
    path.reach[s] = kind === Step.probe ? 0 : kind === Step.euler ? length : gamma * length;
    path.weight[s] =
      kind === Step.probe ? 0 : kind === Step.euler ? length : final ? gamma * length : (1 - gamma) * length;
    path.time[s] = start + (final ? length : gamma * length);
    const share =
      (path.time[s]! - circuit.segmentStart[segment]!) / circuit.network.segments[segment]!.duration;
    const known = s * (circuit.nodes + circuit.knowns) + circuit.nodes;
    for (let k = 0; k < circuit.knowns; k++)
      path.volts[known + k] = courseAt(circuit.network.knowns[k]!.volts[segment]!, share);
  }
  return at + stages;
}
