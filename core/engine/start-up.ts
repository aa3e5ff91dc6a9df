/**
 * Switch-on from empty capacitors. The first periods are integrated one by one; later ones are leapt over in groups:
 * the derivatives of a period's end by its start say how its change dies away from period to period, and the next
 * integrated period tells whether that was right.
 */
import { type Circuit, prepare } from './circuit';
import { isOnCurve, resistorCurrent } from './measure';
import { coarseMesh, fineMesh, type MeshSettings } from './mesh';
import type { Network, Terminal } from './network';
import { linearPass } from './periodic';
import { derivatives } from './stage';
import type { Trajectory } from './trajectory';

export interface StartUp {
  /** Time until the output's average over a period has reached the share `reach` of its final value, s. */
  readonly time: number;
  /** Energy taken from each known potential until then, J, and the charge, C. */
  readonly energy: readonly number[];
  readonly charge: readonly number[];
  /** Largest magnitude of the current in each resistor and diode until then, A. */
  readonly resistorPeaks: readonly number[];
  readonly diodePeaks: readonly number[];
  /** Lowest and highest voltage of each capacitor from switch-on until then, V: both include the 0 of the start. */
  readonly capacitorLows: readonly number[];
  readonly capacitorHighs: readonly number[];
  /** The output on its way: end of each integrated period, s, and its average over that period, V. */
  readonly course: readonly { readonly time: number; readonly volts: number }[];
  readonly trace: Trace;
  /** Periods that were integrated, of the `periods` that passed. */
  readonly integrated: number;
  readonly periods: number;
}

export interface StartUpOptions {
  readonly output: Terminal;
  /** Steady average of the output, V, and steady states of the capacitors, which scale the errors. */
  readonly final: number;
  readonly states: Float64Array;
  /** Share of `final` that ends the run, 0..1. */
  readonly reach: number;
  /** Resistors whose current is traced at every point of every integrated period; none when left out. */
  readonly trace?: readonly number[];
}

/** Points of the integrated periods: between them the run leaps, so the list has gaps in time. */
export interface Trace {
  /** s, from switch-on. */
  readonly time: readonly number[];
  /** V. */
  readonly output: readonly number[];
  /** A, one list for each traced resistor. */
  readonly currents: readonly (readonly number[])[];
}

/** Integrated periods after which a start that has not ended is given up. */
const mostIntegrated = 400;
/** Share of its final value by which a leap may move a capacitor. */
const leapShare = 0.08;
/** Periods of a leap as a share of those that have passed: diodes that are off now may conduct soon. */
const leapGrowth = 0.15;

/** Undefined when a period does not converge or the output has not arrived within the bound on work. */
export function startUp(network: Network, options: StartUpOptions): StartUp | undefined {
  const circuit = prepare(network);
  const count = circuit.capacitors.count;
  const swing = options.states.map((v) => Math.max(Math.abs(v), 0.02 * Math.abs(options.final), 1e-3));
  const settings: MeshSettings = { tolerance: 1e-3, lineError: 1e-5, mostSteps: 2000 };
  const tally = newTally(circuit, options.trace ?? []);
  const state = new Float64Array(count);
  let seed = coarseMesh(circuit, 1);
  let periods = 0;
  let before: { time: number; volts: number } | undefined;
  for (let integrated = 1; integrated <= mostIntegrated; integrated++) {
    const path = fineMesh(circuit, state, swing, seed, settings);
    if (!path) return undefined;
    seed = path;
    const power = record(circuit, path, tally);
    traceInto(tally, circuit, path, options, periods * circuit.period);
    periods++;
    const now = { time: periods * circuit.period, volts: averageAt(circuit, path, options.output) };
    tally.course.push(now);
    if (Math.abs(now.volts) >= options.reach * Math.abs(options.final))
      return finish(tally, before, now, options, integrated, periods);
    const leap = leapOver(circuit, path, state, swing, periods);
    if (!leap) return undefined;
    spend(tally, power, leap.periods * circuit.period);
    periods += leap.periods;
    before = now;
  }
  return undefined;
}

interface Tally {
  /** Known potentials, V: a rail's holds still. */
  readonly potentials: Float64Array;
  readonly energy: Float64Array;
  readonly charge: Float64Array;
  readonly resistors: Float64Array;
  readonly diodes: Float64Array;
  readonly lows: Float64Array;
  readonly highs: Float64Array;
  readonly course: { time: number; volts: number }[];
  readonly trace: { time: number[]; output: number[]; currents: number[][] };
}

function newTally(circuit: Circuit, traced: readonly number[]): Tally {
  return {
    potentials: new Float64Array(circuit.knowns),
    energy: new Float64Array(circuit.knowns),
    charge: new Float64Array(circuit.knowns),
    resistors: new Float64Array(circuit.resistors.count),
    diodes: new Float64Array(circuit.diodes.count),
    lows: new Float64Array(circuit.capacitors.count),
    highs: new Float64Array(circuit.capacitors.count),
    course: [],
    trace: { time: [], output: [], currents: traced.map(() => []) },
  };
}

/** Peaks and charge of one integrated period; returns the average current out of each known potential, A. */
function record(circuit: Circuit, path: Trajectory, tally: Tally): Float64Array {
  const { nodes, knowns } = circuit;
  const flow = new Float64Array(knowns);
  for (let s = 0; s < path.count; s++) {
    const extreme = isOnCurve(path, s);
    for (let k = 0; extreme && k < tally.lows.length; k++) {
      const volts = path.state[s * tally.lows.length + k]!;
      tally.lows[k] = Math.min(tally.lows[k]!, volts);
      tally.highs[k] = Math.max(tally.highs[k]!, volts);
    }
    const book = (index: number, current: number) => {
      if (index >= nodes) flow[index - nodes] = flow[index - nodes]! + path.weight[s]! * current;
    };
    for (let k = 0; k < circuit.resistors.count; k++) {
      const current = resistorCurrent(circuit, path, k, s);
      if (extreme) tally.resistors[k] = Math.max(tally.resistors[k]!, Math.abs(current));
      book(circuit.resistors.a[k]!, current);
      book(circuit.resistors.b[k]!, -current);
    }
    for (let k = 0; k < circuit.diodes.count; k++) {
      const current = path.lines.i[s * circuit.diodes.count + k]!;
      if (extreme) tally.diodes[k] = Math.max(tally.diodes[k]!, current);
      book(circuit.diodes.a[k]!, current);
      book(circuit.diodes.b[k]!, -current);
      if (circuit.alpha[k] === 0) continue;
      book(circuit.collector[k]!, circuit.alpha[k]! * current);
      book(circuit.baseEnd[k]!, -circuit.alpha[k]! * current);
    }
  }
  const average = flow.map((charge) => charge / circuit.period);
  tally.potentials.set(path.volts.subarray(nodes, nodes + knowns));
  spend(tally, average, circuit.period);
  return average;
}

function spend(tally: Tally, current: Float64Array, seconds: number): void {
  for (let k = 0; k < current.length; k++) {
    tally.charge[k] = tally.charge[k]! + current[k]! * seconds;
    tally.energy[k] = tally.energy[k]! + current[k]! * seconds * tally.potentials[k]!;
  }
}

function traceInto(
  { trace }: Tally,
  circuit: Circuit,
  path: Trajectory,
  { output, trace: traced }: StartUpOptions,
  before: number,
): void {
  if (!traced) return;
  const index = output >= 0 ? circuit.place[output]! : circuit.nodes + ~output;
  for (let s = 0; s < path.count; s++) {
    if (!isOnCurve(path, s)) continue;
    // The end of one period and the start of the next are one moment; rounding must not turn them round.
    trace.time.push(Math.max(before + path.time[s]!, trace.time.at(-1) ?? 0));
    trace.output.push(path.volts[s * (circuit.nodes + circuit.knowns) + index]!);
    traced.forEach((k, n) => {
      trace.currents[n]!.push(resistorCurrent(circuit, path, k, s));
    });
  }
}

function averageAt(circuit: Circuit, path: Trajectory, output: Terminal): number {
  const index = output >= 0 ? circuit.place[output]! : circuit.nodes + ~output;
  let sum = 0;
  for (let s = 0; s < path.count; s++)
    sum += path.weight[s]! * path.volts[s * (circuit.nodes + circuit.knowns) + index]!;
  return sum / circuit.period;
}

/**
 * Moves `state` to the end of the period, and on over as many further periods as its change, dying away by the
 * derivatives of this one, stays within a small share of the way.
 */
function leapOver(
  circuit: Circuit,
  path: Trajectory,
  state: Float64Array,
  swing: Float64Array,
  elapsed: number,
): { periods: number } | undefined {
  const count = circuit.capacitors.count;
  const d = derivatives(circuit, path.count, []);
  if (!linearPass(circuit, path, state, d)) return undefined;
  const end = (path.count - 1) * count;
  let change = new Float64Array(count);
  for (let k = 0; k < count; k++) change[k] = path.state[end + k]! - state[k]!;
  for (let k = 0; k < count; k++) state[k] = path.state[end + k]!;
  const total = new Float64Array(count);
  let periods = 0;
  const most = Math.floor(leapGrowth * elapsed);
  for (; periods < most; periods++) {
    const next = new Float64Array(count);
    for (let k = 0; k < count; k++)
      for (let j = 0; j < count; j++) next[k] = next[k]! + d.state[(end + k) * d.columns + j]! * change[j]!;
    for (let k = 0; k < count; k++)
      if (Math.abs(total[k]! + next[k]!) > leapShare * swing[k]!) return leapt(state, total, periods);
    for (let k = 0; k < count; k++) total[k] = total[k]! + next[k]!;
    change = next;
  }
  return leapt(state, total, periods);
}

function leapt(state: Float64Array, total: Float64Array, periods: number): { periods: number } {
  for (let k = 0; k < state.length; k++) state[k] = state[k]! + total[k]!;
  return { periods };
}

/** The moment between the last two integrated periods at which the output passed its mark. */
function finish(
  tally: Tally,
  before: { time: number; volts: number } | undefined,
  now: { time: number; volts: number },
  options: StartUpOptions,
  integrated: number,
  periods: number,
): StartUp {
  const mark = options.reach * Math.abs(options.final);
  const [v0, v1] = [Math.abs(before?.volts ?? 0), Math.abs(now.volts)];
  const from = before?.time ?? 0;
  const share = v1 > v0 ? Math.min(Math.max((mark - v0) / (v1 - v0), 0), 1) : 1;
  return {
    time: from + share * (now.time - from),
    energy: [...tally.energy],
    charge: [...tally.charge],
    resistorPeaks: [...tally.resistors],
    diodePeaks: [...tally.diodes],
    capacitorLows: [...tally.lows],
    capacitorHighs: [...tally.highs],
    course: tally.course,
    trace: tally.trace,
    integrated,
    periods,
  };
}
