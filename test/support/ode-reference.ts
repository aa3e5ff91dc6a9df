/**
 * The same pump, integrated by a general-purpose ODE package (Hairer and Wanner's extrapolation code) instead of the
 * engine. Nothing of the engine is used. State: the two capacitor voltages; the loop currents follow at each instant
 * from one scalar equation in the current of the output diode. An inverter is computed as its mirror image, a doubler
 * that stands on ground, so one set of equations serves both.
 */
import { fallingRoot } from './falling-root';
import { type OdeSolver, odeSolver } from './odex';
import { kneeV, type SimplePump } from './simple-pump';

export interface Reference {
  /** V, signed as the rail is. */
  readonly average: number;
  /** Peak to peak, V. */
  readonly ripple: number;
  /** Average current out of the input, A (of an inverter: into ground through its first diode). */
  readonly inputA: number;
  /** Average current out of the pin and into it, both A and positive; over the whole period. */
  readonly pinSourceA: number;
  readonly pinSinkA: number;
  readonly pinRmsA: number;
  /** What one period changes in the state it was found in, V: shows that it is periodic. */
  readonly drift: number;
}

interface Instant {
  readonly outV: number;
  /** Out of the pin's resistance into the flying capacitor. */
  readonly flyingA: number;
  readonly firstA: number;
  readonly reservoirA: number;
}

/** One clock phase of the mirrored circuit. */
interface Phase {
  readonly seconds: number;
  readonly driveV: number;
  readonly ohm: number;
}

type State = readonly [flyingV: number, reservoirV: number];

export function integrate(pump: SimplePump): Reference {
  const phases = phasesOf(pump);
  let state = settle(pump, phases);
  let drift = Number.POSITIVE_INFINITY;
  for (let round = 0; round < 25 && drift > 1e-9; round++) {
    state = shoot(pump, phases, state);
    const after = onePeriod(pump, phases, state);
    drift = Math.max(Math.abs(after[0] - state[0]), Math.abs(after[1] - state[1]));
  }
  return { ...observe(pump, phases, state), drift };
}

function phasesOf(pump: SimplePump): readonly Phase[] {
  const sign = pump.topology === 'doubler' ? 1 : -1;
  const period = 1 / pump.frequencyHz;
  return [
    { seconds: pump.highShare * period, driveV: sign * pump.highV, ohm: pump.highOhm + pump.flyingOhm },
    { seconds: (1 - pump.highShare) * period, driveV: sign * pump.lowV, ohm: pump.lowOhm + pump.flyingOhm },
  ];
}

/** A rough start: what ideal diodes would leave on the capacitors, then three periods. */
function settle(pump: SimplePump, phases: readonly Phase[]): State {
  const levels = phases.map((phase) => phase.driveV);
  const charged = pump.inputV - Math.min(...levels);
  let state: State = [charged, 0.8 * (charged + Math.max(...levels))];
  for (let i = 0; i < 3; i++) state = onePeriod(pump, phases, state);
  return state;
}

/** One Newton step on "a period changes nothing", with differences for derivatives. */
function shoot(pump: SimplePump, phases: readonly Phase[], state: State): State {
  const change = (s: State): State => {
    const after = onePeriod(pump, phases, s);
    return [after[0] - s[0], after[1] - s[1]];
  };
  const step = 1e-5;
  const base = change(state);
  const byFlying = change([state[0] + step, state[1]]);
  const byReservoir = change([state[0], state[1] + step]);
  const a = (byFlying[0] - base[0]) / step;
  const b = (byReservoir[0] - base[0]) / step;
  const c = (byFlying[1] - base[1]) / step;
  const d = (byReservoir[1] - base[1]) / step;
  const determinant = a * d - b * c;
  const flying = (-base[0] * d + base[1] * b) / determinant;
  const reservoir = (-base[1] * a + base[0] * c) / determinant;
  const limit = Math.min(1, 1 / Math.max(Math.abs(flying), Math.abs(reservoir)));
  return [state[0] + limit * flying, state[1] + limit * reservoir];
}

function onePeriod(pump: SimplePump, phases: readonly Phase[], state: State): State {
  const at = instant(pump);
  let y: number[] = [...state];
  for (const phase of phases) {
    const solver = tight(2);
    const right = (_: number, [flying = 0, reservoir = 0]: number[]) =>
      slopes(pump, phase, at(phase, flying, reservoir));
    y = solver.solve(right, 0, y, 1).y;
  }
  return [y[0]!, y[1]!];
}

/** Derivatives by the share of the phase that has passed, so that every phase runs from 0 to 1. */
function slopes(pump: SimplePump, phase: Phase, now: Instant): number[] {
  return [(-phase.seconds * now.flyingA) / pump.flyingF, (phase.seconds * now.reservoirA) / pump.reservoirF];
}

/** One more period, cut into short pieces that also collect averages and extremes. */
function observe(pump: SimplePump, phases: readonly Phase[], state: State): Omit<Reference, 'drift'> {
  const at = instant(pump);
  const sign = pump.topology === 'doubler' ? 1 : -1;
  const sum = { volts: 0, input: 0, positive: 0, negative: 0, square: 0 };
  let [low, high] = [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];
  let y: number[] = [...state];
  const note = (phase: Phase) => {
    const { outV } = at(phase, y[0]!, y[1]!);
    low = Math.min(low, outV);
    high = Math.max(high, outV);
  };
  for (const phase of phases) {
    const share = phase.seconds * pump.frequencyHz;
    note(phase);
    for (const [from, to] of pieces()) {
      const right = (_: number, [flying = 0, reservoir = 0]: number[]) => {
        const now = at(phase, flying, reservoir);
        // Currents in milliampere, so that one absolute tolerance suits all components.
        const milli = 1e3 * now.flyingA;
        return [
          ...slopes(pump, phase, now),
          now.outV,
          1e3 * now.firstA,
          Math.max(milli, 0),
          Math.max(-milli, 0),
          milli * milli,
        ];
      };
      const done = tight(7).solve(right, from, [y[0]!, y[1]!, 0, 0, 0, 0, 0], to).y;
      y = done.slice(0, 2);
      sum.volts += share * done[2]!;
      sum.input += 1e-3 * share * done[3]!;
      sum.positive += 1e-3 * share * done[4]!;
      sum.negative += 1e-3 * share * done[5]!;
      sum.square += 1e-6 * share * done[6]!;
      note(phase);
    }
  }
  const [source, sink] = sign === 1 ? [sum.positive, sum.negative] : [sum.negative, sum.positive];
  return {
    average: sign * sum.volts,
    ripple: high - low,
    inputA: sum.input,
    pinSourceA: source,
    pinSinkA: sink,
    pinRmsA: Math.sqrt(sum.square),
  };
}

/** Pieces of [0, 1], short at the beginning where currents fall fastest. */
function pieces(): readonly [number, number][] {
  const count = 48;
  return Array.from({ length: count }, (_, i) => [(i / count) ** 3, ((i + 1) / count) ** 3]);
}

function tight(dimension: number): OdeSolver {
  return odeSolver(dimension, 1e-10, 1e-6);
}

/**
 * All currents at one instant. Unknown is `x = ln(1 + i2/Is)` of the output diode: it fixes the output and then the
 * middle node; what the flying capacitor and the first diode bring there must equal i2. The mismatch falls steadily with x.
 */
function instant(pump: SimplePump) {
  let last = 5;
  const { saturationA: is, slopeV, diodeOhm } = pump;
  return (phase: Phase, flyingV: number, reservoirV: number): Instant => {
    const all = (x: number) => {
      const secondA = is * Math.expm1(x);
      const outV = outputVoltage(pump, reservoirV, secondA);
      const middleV = outV + slopeV * x + diodeOhm * secondA;
      const firstA = throughDiode(is, slopeV, diodeOhm, pump.inputV - middleV);
      const flyingA = (phase.driveV + flyingV - middleV) / phase.ohm;
      return { outV, secondA, firstA, flyingA, mismatch: flyingA + firstA - secondA };
    };
    last = fallingRoot((x) => all(x).mismatch, last);
    const { outV, secondA, firstA, flyingA } = all(last);
    return { outV, firstA, flyingA, reservoirA: secondA - loadCurrent(pump, outV) };
  };
}

/** Output whose reservoir takes what the load leaves: `v = u + r (i2 - load(v))`, a few fixed-slope steps. */
function outputVoltage(pump: SimplePump, reservoirV: number, secondA: number): number {
  const ohm = pump.reservoirOhm;
  const conductance = pump.loadOhm === undefined ? 0 : 1 / pump.loadOhm;
  const current = pump.loadA ?? 0;
  let volts = (reservoirV + ohm * (secondA - current)) / (1 + ohm * conductance);
  for (let i = 0; i < 40; i++) {
    const steady = current * steadyShare(volts);
    const next = (reservoirV + ohm * (secondA - steady)) / (1 + ohm * conductance);
    if (Math.abs(next - volts) < 1e-15) return next;
    volts = next;
  }
  return volts;
}

function loadCurrent(pump: SimplePump, volts: number): number {
  const resistive = pump.loadOhm === undefined ? 0 : volts / pump.loadOhm;
  return resistive + (pump.loadA ?? 0) * steadyShare(volts);
}

function steadyShare(volts: number): number {
  return volts > 0 ? 1 - Math.exp(-volts / kneeV) : volts / kneeV;
}

/** `v = a ln(1 + i/Is) + R i` solved for i, by Newton in the logarithm: convex, so it closes in from one side. */
function throughDiode(is: number, slopeV: number, ohm: number, volts: number): number {
  if (ohm === 0) return is * Math.expm1(volts / slopeV);
  const reach = Math.max(volts, 0) / ohm;
  let x = Math.min(volts / slopeV, Math.log1p(reach / is));
  for (let i = 0; i < 60; i++) {
    const grown = Math.exp(x);
    const step = (slopeV * x + ohm * is * (grown - 1) - volts) / (slopeV + ohm * is * grown);
    x -= step;
    if (Math.abs(step) < 1e-14 * Math.max(1, Math.abs(x))) break;
  }
  return is * Math.expm1(x);
}
