/**
 * Switch-off: every rail falls to zero and the clock stops low; the capacitors run down through what is left.
 */
import { prepare } from './circuit';
import { isOnCurve } from './measure';
import { coarseMesh, fineMesh } from './mesh';
import type { Network, Terminal } from './network';
import type { Trajectory } from './trajectory';

export interface RunDownOptions {
  readonly output: Terminal;
  /** States of the capacitors at the moment of switch-off, V. */
  readonly states: Float64Array;
  /** Voltage that counts as arrived, magnitude, V. */
  readonly level: number;
  /** Segment of the clock period whose resistances hold while the power is off. */
  readonly segment: number;
}

/** Longest time that is looked at, s: beyond it a rail counts as never discharged. */
const longest = 1e7;

export interface RunDown {
  /** Until the output's magnitude is below the level for good, s; Infinity beyond 115 days. */
  readonly time: number;
  /** Lowest and highest voltage of each capacitor on the way, V. */
  readonly capacitorLows: readonly number[];
  readonly capacitorHighs: readonly number[];
}

/** Undefined when the way down could not be followed. */
export function runDown(network: Network, options: RunDownOptions): RunDown | undefined {
  let last: RunDown | undefined;
  for (let horizon = 1e-3; horizon <= longest; horizon *= 100) {
    last = within(network, options, horizon);
    if (last === undefined || last.time < horizon) return last;
  }
  return last && { ...last, time: Number.POSITIVE_INFINITY };
}

/** As `runDown`, looking no further than `horizon`, which is also the answer when the output is still up then. */
function within(network: Network, options: RunDownOptions, horizon: number): RunDown | undefined {
  const off: Network = {
    ...network,
    segments: [{ duration: horizon }],
    knowns: network.knowns.map((known) => ({ ...known, volts: [0] })),
    resistors: network.resistors.map(({ name, a, b, ohms }) => ({
      name,
      a,
      b,
      ohms: [ohms[options.segment]!],
    })),
  };
  const circuit = prepare(off);
  const scale = Math.max(...options.states.map(Math.abs), 1e-3);
  const swing = options.states.map((v) => Math.max(Math.abs(v), 1e-2 * scale));
  const path = fineMesh(circuit, options.states, swing, coarseMesh(circuit, 1), {
    tolerance: 1e-5,
    lineError: 1e-6,
    mostSteps: 4000,
  });
  if (!path) return undefined;
  const index = options.output >= 0 ? circuit.place[options.output]! : circuit.nodes + ~options.output;
  const volts = (s: number) => Math.abs(path.volts[s * (circuit.nodes + circuit.knowns) + index]!);
  const way = extremes(path, circuit.capacitors.count, options.states);
  if (volts(path.count - 1) > options.level) return { time: horizon, ...way };
  const points = Array.from({ length: path.count }, (_, k) => k).filter((k) => isOnCurve(path, k));
  const last = points.findLastIndex((k) => volts(k) > options.level);
  if (last < 0) return { time: 0, ...way };
  const [from, to] = [points[last]!, points[last + 1]!];
  // A run-down is close to exponential between two points.
  const share = Math.log(volts(from) / options.level) / Math.log(volts(from) / Math.max(volts(to), 1e-12));
  return { time: path.time[from]! + Math.min(share, 1) * (path.time[to]! - path.time[from]!), ...way };
}

function extremes(path: Trajectory, count: number, states: Float64Array) {
  const capacitorLows = [...states];
  const capacitorHighs = [...states];
  for (let s = 0; s < path.count; s++) {
    if (!isOnCurve(path, s)) continue;
    for (let k = 0; k < count; k++) {
      const volts = path.state[s * count + k]!;
      capacitorLows[k] = Math.min(capacitorLows[k]!, volts);
      capacitorHighs[k] = Math.max(capacitorHighs[k]!, volts);
    }
  }
  return { capacitorLows, capacitorHighs };
}
