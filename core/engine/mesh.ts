/**
 * The meshes on which a period is solved: a coarse one of backward-Euler steps that needs no guess, and a
 * fine one laid by integrating once over the period with error control.
 */
import type { Circuit } from './circuit';
import { copyLines, moveLines, openLines, solveStage } from './stage';
import { gamma, grown, placeStep, Step, type Trajectory, trajectory } from './trajectory';

/** `steps` equal backward-Euler steps in each segment, all lines at their opening. */
export function coarseMesh(circuit: Circuit, steps: number): Trajectory {
  const path = trajectory(circuit, circuit.segments * steps);
  let start = 0;
  circuit.network.segments.forEach((segment, index) => {
    const length = segment.duration / steps;
    for (let n = 0; n < steps; n++)
      path.count = placeStep(circuit, path, path.count, Step.euler, index, start + n * length, length);
    start += segment.duration;
  });
  for (let s = 0; s < path.count; s++) openLines(circuit, path, s);
  return path;
}

export interface MeshSettings {
  /** Error of a step as a share of each capacitor's `swing`. */
  readonly tolerance: number;
  /** Largest error of a diode's straight line, V. */
  readonly lineError: number;
  /** Steps in one segment that are never exceeded. */
  readonly mostSteps: number;
}

/**
 * Integrates one period from `start`. `swing` is the voltage that each capacitor moves by in a period, V.
 * `coarse` lends the lines that each segment begins with. Undefined when a stage does not converge.
 */
export function fineMesh(
  circuit: Circuit,
  start: Float64Array,
  swing: Float64Array,
  coarse: Trajectory,
  settings: MeshSettings,
): Trajectory | undefined {
  const count = circuit.capacitors.count;
  let path = trajectory(circuit, 64);
  const state = Float64Array.from(start);
  const rate = new Float64Array(count);
  let time = 0;
  let s = 0;
  for (let segment = 0; segment < circuit.segments; segment++) {
    const duration = circuit.network.segments[segment]!.duration;
    placeStep(circuit, path, s, Step.probe, segment, time, 0);
    copyLines(circuit, coarse, coarseStage(coarse, segment), path, s);
    path.origin.set(state, s * count);
    if (!iterateStage(circuit, path, s, settings.lineError)) return undefined;
    probeRates(circuit, path, s, rate);
    let length = firstLength(duration, rate, swing);
    let done = 0;
    s++;
    for (let tries = 0; done < duration; tries++) {
      if (tries > settings.mostSteps) return undefined;
      const left = duration - done;
      const final = length >= left * 0.999;
      if (final) length = left;
      else if (length > left / 2) length = left / 2;
      // Two stages for this step and the probe of the next segment.
      if (s + 3 > path.capacity) path = grown(circuit, path);
      placeStep(circuit, path, s, Step.sdirk, segment, time + done, length);
      const error = tryStep(circuit, path, s, state, rate, swing, settings);
      const growth = error > 0 ? 0.9 * Math.cbrt(1 / error) : 5;
      if (!(error <= 1) && length > 1e-9 * duration) {
        length *= error === Number.POSITIVE_INFINITY ? 0.1 : Math.min(Math.max(growth, 0.1), 0.8);
        continue;
      }
      if (!Number.isFinite(error)) return undefined;
      acceptStep(path, s, state, rate, count);
      done = final ? duration : done + length;
      s += 2;
      length *= Math.min(Math.max(growth, 0.3), 5);
    }
    time += duration;
  }
  path.count = s;
  return path;
}

/** Largest error of any step of a solved path, in units of what was allowed. */
export function meshError(
  circuit: Circuit,
  path: Trajectory,
  swing: Float64Array,
  settings: MeshSettings,
): number {
  const count = circuit.capacitors.count;
  const rate = new Float64Array(count);
  let worst = 0;
  for (let s = 0; s < path.count; s++) {
    if (path.kind[s] === Step.probe) probeRates(circuit, path, s, rate);
    else if (path.last[s]) {
      worst = Math.max(worst, stepError(path, s - 1, rate, swing, settings.tolerance, count, circuit));
      storeRate(path, s, rate, count);
    }
  }
  return worst;
}

function coarseStage(coarse: Trajectory, segment: number): number {
  let found = 0;
  for (let s = 0; s < coarse.count; s++) if (coarse.segment[s] === segment) found = s;
  return found;
}

/** A step in which no capacitor moves by more than a small share of its swing. */
function firstLength(duration: number, rate: Float64Array, swing: Float64Array): number {
  let length = 0.02 * duration;
  for (let k = 0; k < rate.length; k++)
    if (rate[k] !== 0) length = Math.min(length, (0.15 * swing[k]!) / Math.abs(rate[k]!));
  return Math.max(length, 1e-7 * duration);
}

function iterateStage(circuit: Circuit, path: Trajectory, s: number, tolerance: number): boolean {
  for (let n = 0; n < 100; n++) {
    if (!solveStage(circuit, path, s)) return false;
    if (moveLines(circuit, path, s) <= tolerance) return true;
  }
  return false;
}

/** Solves both stages of the step at `s`; returns its error in units of what is allowed. */
function tryStep(
  circuit: Circuit,
  path: Trajectory,
  s: number,
  state: Float64Array,
  rate: Float64Array,
  swing: Float64Array,
  settings: MeshSettings,
): number {
  const count = circuit.capacitors.count;
  const ratio = (1 - gamma) / gamma;
  path.origin.set(state, s * count);
  copyLines(circuit, path, s - 1, path, s);
  if (!iterateStage(circuit, path, s, settings.lineError)) return Number.POSITIVE_INFINITY;
  for (let k = 0; k < count; k++)
    path.origin[(s + 1) * count + k] = state[k]! + ratio * (path.state[s * count + k]! - state[k]!);
  copyLines(circuit, path, s, path, s + 1);
  if (!iterateStage(circuit, path, s + 1, settings.lineError)) return Number.POSITIVE_INFINITY;
  return stepError(path, s, rate, swing, settings.tolerance, count, circuit);
}

// Weights of the three known rates (start, first stage, end) in the difference between the integral of the
// parabola through them and what the step itself adds up.
const weightStart = (gamma / 2 - 1 / 6) / gamma;
const weightFirst = 1 / (6 * gamma * (1 - gamma)) - (1 - gamma);
const weightEnd = (1 / 3 - gamma / 2) / (1 - gamma) - gamma;

function stepError(
  path: Trajectory,
  s: number,
  rate: Float64Array,
  swing: Float64Array,
  tolerance: number,
  count: number,
  circuit: Circuit,
): number {
  const length = path.length[s]!;
  let worst = 0;
  for (let k = 0; k < count; k++) {
    const first = path.state[s * count + k]! - path.origin[s * count + k]!;
    const end = path.state[(s + 1) * count + k]! - path.origin[(s + 1) * count + k]!;
    const error = Math.abs(weightStart * rate[k]! * length + (weightFirst * first + weightEnd * end) / gamma);
    const share = error / (tolerance * swing[k]!);
    if (!(share <= worst)) worst = share;
  }
  let charge = 0;
  for (let k = 0; k < count; k++) charge = Math.max(charge, circuit.farads[k]! * swing[k]!);
  const nd = circuit.diodes.count;
  for (let k = 0; k < nd; k++) {
    if (circuit.alpha[k] === 0) continue;
    const i = path.lines.i;
    const error =
      length *
      Math.abs(
        weightStart * i[(s - 1) * nd + k]! + weightFirst * i[s * nd + k]! + weightEnd * i[(s + 1) * nd + k]!,
      );
    const share = error / (tolerance * charge);
    if (!(share <= worst)) worst = share;
  }
  return worst;
}

function probeRates(circuit: Circuit, path: Trajectory, s: number, rate: Float64Array): void {
  const { capacitors, nodes, knowns } = circuit;
  const v0 = s * (nodes + knowns);
  for (let k = 0; k < capacitors.count; k++) {
    const across = path.volts[v0 + capacitors.a[k]!]! - path.volts[v0 + capacitors.b[k]!]!;
    rate[k] = (across - path.origin[s * capacitors.count + k]!) / (circuit.esr[k]! * circuit.farads[k]!);
  }
}

function storeRate(path: Trajectory, lastStage: number, rate: Float64Array, count: number): void {
  const reach = path.reach[lastStage]!;
  for (let k = 0; k < count; k++)
    rate[k] = (path.state[lastStage * count + k]! - path.origin[lastStage * count + k]!) / reach;
}

function acceptStep(
  path: Trajectory,
  s: number,
  state: Float64Array,
  rate: Float64Array,
  count: number,
): void {
  for (let k = 0; k < count; k++) state[k] = path.state[(s + 1) * count + k]!;
  storeRate(path, s + 1, rate, count);
}
