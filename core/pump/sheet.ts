/**
 * Collects the elements of a pump's network and remembers where each part went.
 */
import type {
  Capacitor,
  Course,
  CurrentLoad,
  Diode,
  Known,
  Network,
  PowerLoad,
  Resistor,
  Terminal,
} from '../engine';
import type { Phase, Phases } from './phases';
import { type CapacitorValues, idealVoltage, loadKnee, type PumpValues } from './values';

export const ground: Terminal = ~0;

export interface LoadPlace {
  readonly kind: 'resistor' | 'load';
  readonly index: number;
}

export interface RailPlace {
  readonly terminal: Terminal;
  readonly known: number;
  /** Present when the rail has a source resistance. */
  readonly resistor?: number;
}

/** A capacitor, and the resistor that is its leakage. */
export interface StoredPlace {
  readonly index: number;
  readonly leak?: number;
}

/** A diode of the pump, with its leakage (a resistor) and its junction (a capacitor). */
export interface DiodePlace extends StoredPlace {
  readonly junction?: number;
}

export class Sheet {
  readonly pump: PumpValues;
  readonly phases: readonly Phase[];
  readonly rails: readonly RailPlace[];
  readonly #segments: Phases['segments'];
  readonly #nodes: string[] = [];
  readonly #knowns: Known[] = [];
  readonly #resistors: Resistor[] = [];
  readonly #capacitors: Capacitor[] = [];
  readonly #diodes: Diode[] = [];
  readonly #loads: (CurrentLoad | PowerLoad)[] = [];

  constructor(pump: PumpValues, { segments, phases }: Phases) {
    this.pump = pump;
    this.phases = phases;
    this.#segments = segments;
    this.#known('ground', 0);
    this.rails = pump.rails.map(({ name, volts, ohms }) => {
      const known = this.#known(`rail ${name}`, volts);
      if (!(ohms > 0)) return { terminal: ~known, known };
      const terminal = this.node(`rail ${name}`);
      return { terminal, known, resistor: this.resistor(`rail ${name}`, ~known, terminal, ohms) };
    });
  }

  node(name: string): Terminal {
    return this.#nodes.push(name) - 1;
  }

  resistor(name: string, a: Terminal, b: Terminal, ohms: number): number {
    return this.switched(name, a, b, { ohms: this.phases.map(() => ohms) });
  }

  switched(
    name: string,
    a: Terminal,
    b: Terminal,
    course: { readonly ohms: readonly number[]; readonly drop?: readonly Course[] },
  ): number {
    return this.#resistors.push({ name, a, b, ...course }) - 1;
  }

  capacitor(
    name: string,
    a: Terminal,
    b: Terminal,
    { farads, ohms, leakOhms }: CapacitorValues,
  ): StoredPlace {
    return {
      index: this.#capacitors.push({ name, a, b, farads, ohms }) - 1,
      ...(leakOhms === undefined ? {} : { leak: this.resistor(`${name} leakage`, a, b, leakOhms) }),
    };
  }

  junction(diode: Diode): number {
    return this.#diodes.push(diode) - 1;
  }

  /** A diode of the pump; a negative pump has every one the other way round. */
  diode(position: number, from: Terminal, to: Terminal): DiodePlace {
    const [a, b] = this.pump.negative ? [to, from] : [from, to];
    const name = `diode ${position + 1}`;
    const { leakOhms, junctionFarads, ...law } = this.pump.diodes[position]!;
    return {
      index: this.junction({ name, a, b, ...law }),
      ...(leakOhms === undefined ? {} : { leak: this.resistor(`${name} leakage`, a, b, leakOhms) }),
      ...(junctionFarads === undefined
        ? {}
        : {
            junction: this.capacitor(`${name} junction`, a, b, { farads: junctionFarads, ohms: law.ohms })
              .index,
          }),
    };
  }

  load(output: Terminal, load: PumpValues['loads'][number]): LoadPlace {
    const { name } = load;
    const [a, b] = this.pump.negative ? [ground, output] : [output, ground];
    if (load.kind === 'resistance') return { kind: 'resistor', index: this.resistor(name, a, b, load.ohms) };
    const made =
      load.kind === 'current'
        ? { name, a, b, amps: load.amps, knee: loadKnee }
        : {
            name,
            a,
            b,
            watts: load.watts,
            knee: load.knee,
            start: Math.max(Math.abs(idealVoltage(this.pump)), load.knee),
          };
    return { kind: 'load', index: this.#loads.push(made) - 1 };
  }

  network(): Network {
    return {
      segments: this.#segments,
      nodeNames: this.#nodes,
      knowns: this.#knowns,
      resistors: this.#resistors,
      capacitors: this.#capacitors,
      diodes: this.#diodes,
      loads: this.#loads,
    };
  }

  #known(name: string, volts: number): number {
    return this.#knowns.push({ name, volts: this.phases.map(() => volts) }) - 1;
  }
}
