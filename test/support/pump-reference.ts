/**
 * The periodic state of a pump by a general-purpose ODE package: its own equations integrated over one period, Newton's
 * method on "a period changes nothing" with differences for derivatives, then one more period that collects figures.
 */
import { solveInPlace } from './gauss';
import { odeSolver } from './odex';
import { atTransistor, instants, outputCurrent } from './operating-point';
import type { Equations } from './pump-equations';

export interface PumpFigures {
  /** V, signed as the rail is. */
  readonly average: number;
  /** Peak to peak, V. */
  readonly ripple: number;
  /** Of each clock's output, A. */
  readonly pinRms: readonly number[];
  /** Of each transistor's collector, A. */
  readonly collectorRms: readonly number[];
  /** Average current out of each rail's source, A. */
  readonly railAmps: readonly number[];
}

export interface PumpReference extends PumpFigures {
  /** Last correction of Newton's method, V: how far from periodic the state still was. */
  readonly correction: number;
}

/** Error that the package allows itself in each step, relative, or absolute in V and mA. */
const tolerance = 1e-9;

/** `guess` is a start for the capacitor voltages; where the iteration ends does not depend on it. */
export function periodicState(equations: Equations, guess: readonly number[]): PumpReference {
  const after = period(equations);
  let states = [...guess];
  let jacobian = closing(after, states);
  let correction = Number.POSITIVE_INFINITY;
  for (let round = 0; round < 30 && correction > 1e-7; round++) {
    const move = Float64Array.from(after(states), (v, k) => v - states[k]!);
    solveInPlace(jacobian.slice(), move, states.length);
    const largest = move.reduce((most, v) => Math.max(most, Math.abs(v)), 0);
    const damping = Math.min(1, 0.5 / largest);
    states = states.map((v, k) => v + damping * move[k]!);
    // Slow progress means that the derivatives belong to a state too far away.
    if (round > 0 && largest > 0.1 * correction && largest > 1e-5) jacobian = closing(after, states);
    correction = largest;
  }
  return { ...figures(equations, states), correction };
}

type Period = (states: readonly number[]) => number[];

function period(equations: Equations): Period {
  const slopes = stateSlopes(equations);
  return (states) => {
    let y = [...states];
    equations.seconds.forEach((_, segment) => {
      const solver = odeSolver(y.length, tolerance, 1e-4);
      y = solver.solve((share, now) => slopes(now, segment, share).slopes, 0, y, 1).y;
    });
    return y;
  };
}

/** Unit matrix less the derivative of a period's end by its start. */
function closing(after: Period, states: readonly number[]): Float64Array {
  const n = states.length;
  const base = after(states);
  const jacobian = new Float64Array(n * n);
  const step = 1e-4;
  for (let column = 0; column < n; column++) {
    const moved = after(states.map((v, k) => (k === column ? v + step : v)));
    for (let row = 0; row < n; row++)
      jacobian[row * n + column] = (row === column ? 1 : 0) - (moved[row]! - base[row]!) / step;
  }
  return jacobian;
}

/** Derivatives of the states by the share of the segment that has passed, so that each runs from 0 to 1. */
function stateSlopes(equations: Equations) {
  const at = instants(equations);
  return (states: readonly number[], segment: number, share: number) => {
    const instant = at(states, segment, share);
    const slopes = equations.capacitors.map(({ a, b, values: { farads, ohms } }, k) => {
      const across = instant.volts[a]! - instant.volts[b]!;
      return (equations.seconds[segment]! * (across - states[k]!)) / (ohms * farads);
    });
    return { slopes, instant };
  };
}

/** One period from the periodic state, cut into pieces at whose ends extremes are looked for. */
function figures(equations: Equations, start: readonly number[]): PumpFigures {
  const { seconds, outputs, transistors, fixed, output } = equations;
  const at = stateSlopes(equations);
  const whole = seconds.reduce((sum, length) => sum + length, 0);
  const n = start.length;
  let [low, high] = [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];
  let states = [...start];
  const note = (segment: number, share: number) => {
    const volts = at(states, segment, share).instant.volts[output]!;
    low = Math.min(low, volts);
    high = Math.max(high, volts);
  };
  // Currents in milliampere, so that one absolute tolerance suits all components.
  const watched = (now: readonly number[], segment: number, share: number) => {
    const { slopes, instant } = at(now, segment, share);
    const { volts, leaving } = instant;
    return [
      ...slopes,
      volts[output]!,
      ...outputs.map((pin) => (1e3 * outputCurrent(pin, volts, segment, share)[2]) ** 2),
      ...transistors.map((transistor) => (1e3 * atTransistor(transistor, volts).collector) ** 2),
      ...Array.from(leaving.subarray(1, fixed.length), (amps) => 1e3 * amps),
    ];
  };
  const sums = new Array<number>(outputs.length + transistors.length + fixed.length).fill(0);
  seconds.forEach((length, segment) => {
    note(segment, 0);
    for (const [from, to] of pieces()) {
      const y = [...states, ...sums.map(() => 0)];
      const solver = odeSolver(y.length, tolerance, (to - from) / 100);
      const done = solver.solve((share, now) => watched(now.slice(0, n), segment, share), from, y, to).y;
      states = done.slice(0, n);
      sums.forEach((sum, k) => {
        sums[k] = sum + (length / whole) * done[n + k]!;
      });
      note(segment, to);
    }
  });
  const firstTransistor = 1 + outputs.length;
  const firstRail = firstTransistor + transistors.length;
  const rms = (square: number) => 1e-3 * Math.sqrt(square);
  return {
    average: sums[0]!,
    ripple: high - low,
    pinRms: sums.slice(1, firstTransistor).map(rms),
    collectorRms: sums.slice(firstTransistor, firstRail).map(rms),
    railAmps: sums.slice(firstRail).map((amps) => 1e-3 * amps),
  };
}

/** Pieces of [0, 1], short at the beginning where currents fall fastest. */
function pieces(): readonly [number, number][] {
  const count = 60;
  return Array.from({ length: count }, (_, i) => [(i / count) ** 3, ((i + 1) / count) ** 3]);
}
