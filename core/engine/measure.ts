/**
 * What a solved period says about every node and element: averages, extremes, losses, and the energy balance.
 */
import { type Branches, type Circuit, dropAt } from './circuit';
import { loadCurrent } from './load';
import { nodeLeak } from './network';
import { Step, type Trajectory } from './trajectory';

export interface NodeFigures {
  readonly name: string;
  /** V. */
  readonly average: number;
  readonly min: number;
  readonly max: number;
}

/** Current from `a` to `b`, A; averages over the whole period. */
export interface ElementFigures {
  readonly name: string;
  readonly average: number;
  /** Average of the positive part and of the negative part (both >= 0). */
  readonly averagePositive: number;
  readonly averageNegative: number;
  readonly rms: number;
  readonly max: number;
  readonly min: number;
  /** Average power turned into heat (or taken by a load), W. */
  readonly loss: number;
  /** Voltage from `a` to `b`, for a capacitor without its series resistance, V. */
  readonly voltage: { readonly average: number; readonly min: number; readonly max: number };
}

export interface KnownFigures {
  readonly name: string;
  /** Average current out of the potential into the network, A. */
  readonly average: number;
  /** Average power delivered, W. */
  readonly power: number;
}

export interface Measures {
  readonly nodes: readonly NodeFigures[];
  readonly resistors: readonly ElementFigures[];
  readonly capacitors: readonly ElementFigures[];
  readonly diodes: readonly ElementFigures[];
  readonly loads: readonly ElementFigures[];
  readonly knowns: readonly KnownFigures[];
  /** |power in - losses - power into loads| / power in: the error of the integration seen as energy. */
  readonly balance: number;
}

export function measure(circuit: Circuit, path: Trajectory): Measures {
  const { nodes, knowns, period, network } = circuit;
  const width = nodes + knowns;
  const delivered = new Float64Array(knowns);
  const deliveredPower = new Float64Array(knowns);
  let losses = 0;
  const book = (index: number, current: number, s: number) => {
    if (index < nodes) return;
    const share = (current * path.weight[s]!) / period;
    delivered[index - nodes] = delivered[index - nodes]! + share;
    deliveredPower[index - nodes] = deliveredPower[index - nodes]! + share * path.volts[s * width + index]!;
  };
  const collect = (
    list: readonly { name: string }[],
    branches: Branches,
    current: (s: number, k: number, across: number) => number,
    stored?: (s: number, k: number) => number,
  ) =>
    list.map((element, k) => {
      const a = branches.a[k]!;
      const b = branches.b[k]!;
      const sum = newSum();
      for (let s = 0; s < path.count; s++) {
        const across = path.volts[s * width + a]! - path.volts[s * width + b]!;
        const i = current(s, k, across);
        const voltage = stored ? stored(s, k) : across;
        addTo(
          sum,
          path.weight[s]! / period,
          isOnCurve(path, s),
          i,
          voltage,
          (across - (stored ? voltage : 0)) * i,
        );
        book(a, i, s);
        book(b, -i, s);
        if (branches === circuit.diodes && circuit.alpha[k] !== 0) {
          const moved = circuit.alpha[k]! * i;
          const from = circuit.collector[k]!;
          const to = circuit.baseEnd[k]!;
          const fall = path.volts[s * width + from]! - path.volts[s * width + to]!;
          sum.loss += (path.weight[s]! / period) * fall * moved;
          book(from, moved, s);
          book(to, -moved, s);
        }
      }
      losses += sum.loss;
      return finish(element.name, sum);
    });
  const resistors = collect(network.resistors, circuit.resistors, (s, k) =>
    resistorCurrent(circuit, path, k, s),
  );
  const count = circuit.capacitors.count;
  const capacitors = collect(
    network.capacitors,
    circuit.capacitors,
    (s, k, across) =>
      (across - path.origin[s * count + k]!) / (path.reach[s]! / circuit.farads[k]! + circuit.esr[k]!),
    (s, k) => path.state[s * count + k]!,
  );
  const diodes = collect(
    network.diodes,
    circuit.diodes,
    (s, k) => path.lines.i[s * circuit.diodes.count + k]!,
  );
  const loads = collect(network.loads, circuit.loads, (_s, k, across) =>
    loadCurrent(circuit.laws[k]!, across),
  );
  const nodeFigures = network.nodeNames.map((name, n) => {
    const sum = newSum();
    for (let s = 0; s < path.count; s++) {
      const v = path.volts[s * width + circuit.place[n]!]!;
      addTo(sum, path.weight[s]! / period, isOnCurve(path, s), 0, v, nodeLeak * v * v);
    }
    losses += sum.loss;
    return { name, average: sum.volts, min: sum.low, max: sum.high };
  });
  const power = deliveredPower.reduce((total, p) => total + p, 0);
  const scale = deliveredPower.reduce((total, p) => total + Math.max(p, 0), 0);
  return {
    nodes: nodeFigures,
    resistors,
    capacitors,
    diodes,
    loads,
    knowns: network.knowns.map((known, k) => ({
      name: known.name,
      average: delivered[k]!,
      power: deliveredPower[k]!,
    })),
    balance: Math.abs(power - losses) / Math.max(scale, lastBits(circuit, capacitors), Number.MIN_VALUE),
  };
}

/**
 * Power that rounding alone may make or lose in large capacitors at high frequency, W: an unloaded pump takes less,
 * and its balance is judged against this instead.
 */
function lastBits(circuit: Circuit, capacitors: readonly ElementFigures[]): number {
  let energy = 0;
  for (let k = 0; k < capacitors.length; k++) {
    const { min, max } = capacitors[k]!.voltage;
    energy += circuit.farads[k]! * Math.max(min * min, max * max);
  }
  return (1e-11 * energy) / circuit.period;
}

/** First stages of a step lie off the curve by more than the step's end does: they count only in averages. */
export function isOnCurve(path: Trajectory, s: number): boolean {
  return path.last[s] === 1 || path.kind[s] === Step.probe;
}

function newSum() {
  return {
    average: 0,
    positive: 0,
    negative: 0,
    square: 0,
    loss: 0,
    volts: 0,
    most: Number.NEGATIVE_INFINITY,
    least: Number.POSITIVE_INFINITY,
    high: Number.NEGATIVE_INFINITY,
    low: Number.POSITIVE_INFINITY,
  };
}

type Sum = ReturnType<typeof newSum>;

function addTo(
  sum: Sum,
  share: number,
  extreme: boolean,
  current: number,
  volts: number,
  loss: number,
): void {
  sum.average += share * current;
  if (current > 0) sum.positive += share * current;
  else sum.negative -= share * current;
  sum.square += share * current * current;
  sum.volts += share * volts;
  sum.loss += share * loss;
  if (!extreme) return;
  if (current > sum.most) sum.most = current;
  if (current < sum.least) sum.least = current;
  if (volts > sum.high) sum.high = volts;
  if (volts < sum.low) sum.low = volts;
}

function finish(name: string, sum: Sum): ElementFigures {
  return {
    name,
    average: sum.average,
    averagePositive: sum.positive,
    averageNegative: sum.negative,
    rms: Math.sqrt(Math.max(sum.square, 0)),
    max: sum.most,
    min: sum.least,
    loss: sum.loss,
    voltage: { average: sum.volts, min: sum.low, max: sum.high },
  };
}

/** Current of resistor `k` from a to b at stage `s` of a solved period, A. */
export function resistorCurrent(circuit: Circuit, path: Trajectory, k: number, s: number): number {
  const at = s * (circuit.nodes + circuit.knowns);
  const segment = path.segment[s]!;
  const across = path.volts[at + circuit.resistors.a[k]!]! - path.volts[at + circuit.resistors.b[k]!]!;
  return circuit.conductance[segment]![k]! * (across - dropAt(circuit, k, segment, path.time[s]!));
}
