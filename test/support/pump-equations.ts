/**
 * A pump written out once more as equations, for the independent reference: only the values are shared with the code
 * under test. Terminals are numbers: ground is 0, then one for the source of each rail, then the nodes whose voltage
 * is sought.
 */
import type {
  CapacitorValues,
  DriveValues,
  LoadValues,
  PumpValues,
  TransistorValues,
} from '../../core/pump/values';

/** An output in one segment: connected to its rail or to ground behind a drop that moves in a straight line, V. */
export interface Level {
  readonly up: boolean;
  readonly ohms: number;
  readonly first: number;
  readonly last: number;
}

export type Element =
  | { readonly kind: 'resistor'; readonly a: number; readonly b: number; readonly ohms: number }
  | {
      readonly kind: 'output';
      readonly rail: number;
      readonly node: number;
      readonly levels: readonly Level[];
    }
  | {
      readonly kind: 'capacitor';
      readonly a: number;
      readonly b: number;
      readonly values: CapacitorValues;
      readonly state: number;
    }
  | {
      readonly kind: 'diode';
      readonly a: number;
      readonly b: number;
      readonly saturation: number;
      readonly slope: number;
      readonly ohms: number;
    }
  /** `sign` is 1 for npn and -1 for pnp; base, collector and emitter behind their resistances. */
  | {
      readonly kind: 'transistor';
      readonly base: number;
      readonly collector: number;
      readonly emitter: number;
      readonly sign: number;
      readonly values: TransistorValues;
    }
  | { readonly kind: 'load'; readonly a: number; readonly b: number; readonly load: LoadValues };

type Part<K extends Element['kind']> = Extract<Element, { kind: K }>;

export interface Equations {
  /** Seconds of each segment: clock high, its fall, low, its rise; those that have a length. */
  readonly seconds: readonly number[];
  /** Potentials of ground and of the sources of the rails, V. */
  readonly fixed: readonly number[];
  readonly terminals: number;
  readonly elements: readonly Element[];
  /** By state: the flying ones, the smoothing ones, the reservoir. */
  readonly capacitors: readonly Part<'capacitor'>[];
  readonly outputs: readonly Part<'output'>[];
  /** Of each driver: npn, pnp. */
  readonly transistors: readonly Part<'transistor'>[];
  readonly output: number;
}

type Moment = 'high' | 'fall' | 'low' | 'rise';

export function pumpEquations(pump: PumpValues): Equations {
  const fixed = [0, ...pump.rails.map(({ volts }) => volts)];
  const elements: Element[] = [];
  const capacitors: Part<'capacitor'>[] = [];
  const outputs: Part<'output'>[] = [];
  const transistors: Part<'transistor'>[] = [];
  let terminals = fixed.length;
  const node = () => terminals++;
  const resistor = (a: number, b: number, ohms: number) => elements.push({ kind: 'resistor', a, b, ohms });
  /** The far side of a resistor, or the same terminal when there is none. */
  const behind = (from: number, ohms: number) => {
    if (ohms === 0) return from;
    const to = node();
    resistor(from, to, ohms);
    return to;
  };
  const rails = pump.rails.map(({ ohms }, r) => behind(r + 1, ohms));
  const moments = momentsOf(pump);

  const transistor = (values: TransistorValues, sign: number, ends: [base: number, c: number, e: number]) => {
    const [base, collector, emitter] = [values.baseOhms, values.collectorOhms, values.emitterOhms].map(
      (ohms, k) => behind(ends[k]!, ohms),
    ) as [number, number, number];
    const made: Part<'transistor'> = { kind: 'transistor', base, collector, emitter, sign, values };
    elements.push(made);
    transistors.push(made);
  };
  const drives = pump.drives.map((drive) => {
    const clock = node();
    const levels = moments.map(([moment]) => level(pump, drive, moment));
    const output: Part<'output'> = { kind: 'output', rail: rails[drive.clock.rail]!, node: clock, levels };
    elements.push(output);
    outputs.push(output);
    const { driver } = drive;
    if (!driver) return behind(clock, pump.series);
    const stage = node();
    const upper = rails[driver.rail]!;
    const [atNpn, atPnp] =
      'shared' in driver.base
        ? Array<number>(2).fill(behind(clock, driver.base.shared))
        : [behind(clock, driver.base.npn), behind(clock, driver.base.pnp)];
    const push = driver.kind === 'push-pull';
    transistor(driver.npn, 1, push ? [atNpn!, stage, 0] : [atNpn!, upper, stage]);
    transistor(driver.pnp, -1, push ? [atPnp!, stage, upper] : [atPnp!, 0, stage]);
    return behind(stage, pump.series);
  });

  const capacitor = (a: number, b: number, values: CapacitorValues, state: number) => {
    capacitors[state] = { kind: 'capacitor', a, b, values, state };
  };
  const between = (from: number, to: number, position: number) => {
    const [a, b] = pump.negative ? [to, from] : [from, to];
    elements.push({ kind: 'diode', a, b, ...pump.diodes[position]! });
  };
  const start = pump.input === undefined ? 0 : rails[pump.input]!;
  const first = Array.from({ length: pump.stages }, node);
  const ladder = pump.topology === 'ladder';
  const second = ladder ? Array.from({ length: pump.stages }, node) : [node()];
  const output = second[second.length - 1]!;
  first.forEach((pumped, k) => {
    if (ladder) {
      between(k === 0 ? start : second[k - 1]!, pumped, 2 * k);
      between(pumped, second[k]!, 2 * k + 1);
      capacitor(pumped, k === 0 ? drives[0]! : first[k - 1]!, pump.flying[k]!, k);
      capacitor(second[k]!, k === 0 ? 0 : second[k - 1]!, pump.smoothing[k]!, pump.stages + k);
    } else {
      between(k === 0 ? start : first[k - 1]!, pumped, k);
      capacitor(pumped, drives[k % drives.length]!, pump.flying[k]!, k);
    }
  });
  if (!ladder) between(first[first.length - 1]!, output, pump.stages);
  if (pump.reservoir) capacitor(output, 0, pump.reservoir, capacitors.length);
  for (const load of pump.loads) {
    const [a, b] = pump.negative ? [0, output] : [output, 0];
    if (load.kind === 'resistance') resistor(a, b, load.ohms);
    else elements.push({ kind: 'load', a, b, load });
  }
  elements.push(...capacitors);
  const seconds = moments.map(([, length]) => length);
  return { seconds, fixed, terminals, elements, capacitors, outputs, transistors, output };
}

function momentsOf({ frequency, duty, rise, fall }: PumpValues): (readonly [Moment, number])[] {
  const edges = (rise + fall) / 2;
  const all: (readonly [Moment, number])[] = [
    ['high', duty / frequency - edges],
    ['fall', fall],
    ['low', (1 - duty) / frequency - edges],
    ['rise', rise],
  ];
  return all.filter(([, seconds]) => seconds > 0);
}

function level(pump: PumpValues, { clock, opposite }: DriveValues, moment: Moment): Level {
  const up = opposite !== (moment === 'high' || moment === 'rise');
  const moving = moment === 'rise' || moment === 'fall';
  const { volts } = pump.rails[clock.rail]!;
  const [ohms, last, other] = up
    ? [clock.highOhms, clock.highDrop, clock.lowVolts]
    : [clock.lowOhms, clock.lowVolts, clock.highDrop];
  return { up, ohms, first: moving ? volts - other : last, last };
}
