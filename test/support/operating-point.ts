/**
 * Node voltages of a pump at one instant, for given voltages of its capacitors: Kirchhoff's current law with the
 * exponentials as they are, by Newton's method in the voltages. A step that goes too far is done again with a brake, a
 * conductance that holds every node where it is: a stage between two transistors that are neither off nor saturated
 * finds its way like that, since nothing there resists it until one of them gives.
 */
import { solveInPlace } from './gauss';
import { diodeCurrent, transistorCurrents } from './junctions';
import { loadCurrent } from './load-current';
import type { Element, Equations } from './pump-equations';

export interface Instant {
  /** By terminal, V. Overwritten by the next instant. */
  readonly volts: Float64Array;
  /** What flows out of each terminal into the elements, A: nothing from a node, the supply's current from a source. */
  readonly leaving: Float64Array;
}

/** From every node to ground, S: as the engine has it, so that no node floats. */
const leak = 1e-12;
/** No node moves farther in one step, V. */
const farthest = 0.5;
/** Sum of squared currents that is rounding and no more, A^2. */
const leastWrong = 1e-24;

/** Solves instants one after the other; each starts from the last. `share` is how much of the segment has passed. */
export function instants(
  equations: Equations,
): (states: ArrayLike<number>, segment: number, share: number) => Instant {
  const { fixed, terminals, elements } = equations;
  const sources = fixed.length;
  const count = terminals - sources;
  const volts = new Float64Array(terminals);
  volts.set(fixed);
  const leaving = new Float64Array(terminals);
  const slopes = new Float64Array(count * count);
  const held = new Float64Array(count * count);
  const move = new Float64Array(count);

  const balance = (at: Float64Array, states: ArrayLike<number>, segment: number, share: number) => {
    leaving.fill(0);
    slopes.fill(0);
    const flow = (a: number, b: number, amps: number) => {
      leaving[a] = leaving[a]! + amps;
      leaving[b] = leaving[b]! - amps;
    };
    const slope = (row: number, column: number, siemens: number) => {
      if (row < sources || column < sources) return;
      const index = (row - sources) * count + column - sources;
      slopes[index] = slopes[index]! + siemens;
    };
    const branch = (a: number, b: number, amps: number, siemens: number) => {
      flow(a, b, amps);
      slope(a, a, siemens);
      slope(a, b, -siemens);
      slope(b, b, siemens);
      slope(b, a, -siemens);
    };
    for (const element of elements) add(element, at, states, segment, share, { flow, slope, branch });
    let sum = 0;
    for (let t = sources; t < terminals; t++) {
      branch(t, 0, leak * at[t]!, leak);
      sum += leaving[t]! ** 2;
    }
    return sum;
  };

  return (states, segment, share) => {
    let brake = 0;
    for (let round = 0; round < 1000; round++) {
      const wrong = balance(volts, states, segment, share);
      let change: number;
      for (;;) {
        held.set(slopes);
        for (let n = 0; n < count; n++) {
          move[n] = -leaving[sources + n]!;
          held[n * count + n] = held[n * count + n]! + brake;
        }
        solveInPlace(held, move, count);
        change = move.reduce((most, v) => Math.max(most, Math.abs(v)), 0);
        if (change < farthest) break;
        brake = Math.max(4 * brake, 1e-9);
      }
      const damping = admissible(elements, volts, move, sources);
      for (let n = 0; n < count; n++) volts[sources + n] = volts[sources + n]! + damping * move[n]!;
      if ((damping === 1 && change < 1e-7 && brake === 0) || wrong < leastWrong) {
        balance(volts, states, segment, share);
        return { volts, leaving };
      }
      if (change < farthest / 2) brake = brake > 1e-9 ? brake / 8 : 0;
    }
    throw new Error('the reference found no operating point');
  };
}

interface Books {
  flow(a: number, b: number, amps: number): void;
  slope(row: number, column: number, siemens: number): void;
  branch(a: number, b: number, amps: number, siemens: number): void;
}

function add(
  element: Element,
  volts: Float64Array,
  states: ArrayLike<number>,
  segment: number,
  share: number,
  { flow, slope, branch }: Books,
): void {
  switch (element.kind) {
    case 'resistor': {
      const { a, b, ohms } = element;
      branch(a, b, (volts[a]! - volts[b]!) / ohms, 1 / ohms);
      return;
    }
    case 'output': {
      const { ohms } = element.levels[segment]!;
      const [a, b, amps] = outputCurrent(element, volts, segment, share);
      branch(a, b, amps, 1 / ohms);
      return;
    }
    case 'capacitor': {
      const { a, b, values, state } = element;
      branch(a, b, (volts[a]! - volts[b]! - states[state]!) / values.ohms, 1 / values.ohms);
      return;
    }
    case 'diode': {
      const { a, b, saturation, ohms } = element;
      const { amps, siemens } = diodeCurrent(saturation, element.slope, ohms, volts[a]! - volts[b]!);
      branch(a, b, amps, siemens);
      return;
    }
    case 'load': {
      const { a, b } = element;
      const { amps, siemens } = loadCurrent(element.load, volts[a]! - volts[b]!);
      branch(a, b, amps, siemens);
      return;
    }
    case 'transistor': {
      const { base, collector, emitter, sign } = element;
      const i = atTransistor(element, volts);
      flow(collector, emitter, sign * i.collector);
      flow(base, emitter, sign * i.base);
      // Both currents leave through the emitter; their slopes do not depend on the sign.
      const row = (end: number, byBe: number, byBc: number) => {
        slope(end, base, byBe + byBc);
        slope(end, emitter, -byBe);
        slope(end, collector, -byBc);
      };
      row(collector, i.collectorByBe, i.collectorByBc);
      row(base, i.baseByBe, i.baseByBc);
      row(emitter, -i.collectorByBe - i.baseByBe, -i.collectorByBc - i.baseByBc);
    }
  }
}

type Part<K extends Element['kind']> = Extract<Element, { kind: K }>;

/** Ends and current of an output: from its rail into the node, or from the node to ground. */
export function outputCurrent(
  { rail, node, levels }: Part<'output'>,
  volts: Float64Array,
  segment: number,
  share: number,
): [from: number, to: number, amps: number] {
  const { up, ohms, first, last } = levels[segment]!;
  const drop = first + share * (last - first);
  const [from, to] = up ? [rail, node] : [node, 0];
  return [from, to, (volts[from]! - volts[to]! - drop) / ohms];
}

/** Currents of a transistor, counted as for npn. */
export function atTransistor(transistor: Part<'transistor'>, volts: Float64Array) {
  const { base, collector, emitter, sign, values } = transistor;
  const be = sign * (volts[base]! - volts[emitter]!);
  const bc = sign * (volts[base]! - volts[collector]!);
  return transistorCurrents(values.saturation, values.slope, values.gain, values.reverseGain, be, bc);
}

/** Largest share of a move that lifts no junction of a transistor by more than two e-folds where it conducts. */
function admissible(
  elements: readonly Element[],
  volts: Float64Array,
  move: Float64Array,
  sources: number,
): number {
  let share = 1;
  const lift = (t: number) => (t < sources ? 0 : move[t - sources]!);
  for (const element of elements) {
    if (element.kind !== 'transistor') continue;
    const { base, collector, emitter, sign, values } = element;
    const knee = values.slope * Math.log(values.slope / values.saturation) - 4 * values.slope;
    for (const end of [emitter, collector]) {
      const now = sign * (volts[base]! - volts[end]!);
      const more = sign * (lift(base) - lift(end));
      const room = Math.max(knee - now, 0) + 2 * values.slope;
      if (more > room) share = Math.min(share, room / more);
    }
  }
  return share;
}
