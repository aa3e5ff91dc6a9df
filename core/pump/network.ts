/**
 * From a pump's values to the network that the engine solves, and where to find its parts again.
 */
import type { Capacitor, CurrentLoad, Diode, Known, Network, PowerLoad, Resistor, Terminal } from '../engine';
import { type CapacitorValues, idealVoltage, loadKnee, type PumpValues } from './values';

/** Places of the pump's parts in the network: indices into its lists. */
export interface PumpNetwork {
  readonly network: Network;
  readonly output: Terminal;
  readonly ground: Terminal;
  readonly input: Terminal;
  /** Known potentials and resistors that stand for each drive. */
  readonly drives: readonly { readonly known: number; readonly resistor: number; readonly series?: number }[];
  readonly flying: readonly number[];
  readonly smoothing: readonly number[];
  readonly reservoir?: number;
  readonly diodes: readonly number[];
  /** Index among the resistors or among the current loads. */
  readonly loads: readonly { readonly kind: 'resistor' | 'load'; readonly index: number }[];
}

const ground = ~0;
const input = ~1;

export function pumpNetwork(pump: PumpValues): PumpNetwork {
  const sheet = new Sheet(pump);
  const drives = pump.drives.map((_, d) => sheet.drive(d));
  const parts = pump.topology === 'ladder' ? ladder(sheet, drives[0]!.node) : chain(sheet, drives);
  const reservoir = pump.reservoir && sheet.capacitor('reservoir', parts.output, ground, pump.reservoir);
  const loads = pump.loads.map((load) => sheet.load(load.name, parts.output, load));
  return {
    network: sheet.network(),
    output: parts.output,
    ground,
    input,
    drives: drives.map(({ known, resistor, series }) => ({
      known,
      resistor,
      ...(series === undefined ? {} : { series }),
    })),
    flying: parts.flying,
    smoothing: parts.smoothing,
    ...(reservoir === undefined ? {} : { reservoir }),
    diodes: parts.diodes,
    loads,
  };
}

interface Parts {
  readonly output: Terminal;
  readonly flying: number[];
  readonly smoothing: number[];
  readonly diodes: number[];
}

/** Diodes in a row from the input to the output; each node between them is pumped by a capacitor. */
function chain(sheet: Sheet, drives: readonly { node: Terminal }[]): Parts {
  const { pump } = sheet;
  const flying: number[] = [];
  const diodes: number[] = [];
  let from: Terminal = input;
  for (let k = 0; k <= pump.stages; k++) {
    const to = sheet.node(k === pump.stages ? 'output' : `pumped ${k + 1}`);
    diodes.push(sheet.diode(k, from, to));
    if (k < pump.stages)
      flying.push(sheet.capacitor(`flying ${k + 1}`, to, drives[k % drives.length]!.node, pump.flying[k]!));
    from = to;
  }
  return { output: from, flying, smoothing: [], diodes };
}

/** Half-wave ladder: a coupling column on the drive, a smoothing column on ground, diodes between them. */
function ladder(sheet: Sheet, drive: Terminal): Parts {
  const { pump } = sheet;
  const parts: Parts = { output: ground, flying: [], smoothing: [], diodes: [] };
  let coupled = drive;
  let smooth: Terminal = input;
  let foot: Terminal = ground;
  for (let k = 0; k < pump.stages; k++) {
    const pumped = sheet.node(`pumped ${k + 1}`);
    const held = sheet.node(k === pump.stages - 1 ? 'output' : `held ${k + 1}`);
    parts.diodes.push(sheet.diode(2 * k, smooth, pumped), sheet.diode(2 * k + 1, pumped, held));
    parts.flying.push(sheet.capacitor(`flying ${k + 1}`, pumped, coupled, pump.flying[k]!));
    parts.smoothing.push(sheet.capacitor(`smoothing ${k + 1}`, held, foot, pump.smoothing[k]!));
    coupled = pumped;
    smooth = held;
    foot = held;
  }
  return { ...parts, output: smooth };
}

/** Collects the elements; a negative pump has every diode and load the other way round. */
class Sheet {
  readonly pump: PumpValues;
  readonly #nodes: string[] = [];
  readonly #knowns: Known[];
  readonly #resistors: Resistor[] = [];
  readonly #capacitors: Capacitor[] = [];
  readonly #diodes: Diode[] = [];
  readonly #loads: (CurrentLoad | PowerLoad)[] = [];

  constructor(pump: PumpValues) {
    this.pump = pump;
    this.#knowns = [
      { name: 'ground', volts: [0, 0] },
      { name: 'input', volts: [pump.input, pump.input] },
    ];
  }

  node(name: string): Terminal {
    return this.#nodes.push(name) - 1;
  }

  drive(d: number) {
    const { high, low, highOhms, lowOhms } = this.pump.drives[d]!;
    const name = `drive ${d + 1}`;
    const first = <T>(a: T, b: T) => (d === 0 ? [a, b] : [b, a]);
    const known = this.#knowns.push({ name, volts: first(high, low) }) - 1;
    const node = this.node(name);
    const resistor = this.#resistors.push({ name, a: ~known, b: node, ohms: first(highOhms, lowOhms) }) - 1;
    if (this.pump.series <= 0) return { known, node, resistor };
    const behind = this.node(`behind series ${d + 1}`);
    const series = this.#resistor(`series ${d + 1}`, node, behind, this.pump.series);
    return { known, node: behind, resistor, series };
  }

  capacitor(name: string, a: Terminal, b: Terminal, values: CapacitorValues): number {
    return this.#capacitors.push({ name, a, b, ...values }) - 1;
  }

  diode(position: number, from: Terminal, to: Terminal): number {
    const [a, b] = this.pump.negative ? [to, from] : [from, to];
    return this.#diodes.push({ name: `diode ${position + 1}`, a, b, ...this.pump.diodes[position]! }) - 1;
  }

  load(name: string, output: Terminal, load: PumpValues['loads'][number]): PumpNetwork['loads'][number] {
    const [a, b] = this.pump.negative ? [ground, output] : [output, ground];
    if (load.kind === 'resistance') return { kind: 'resistor', index: this.#resistor(name, a, b, load.ohms) };
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
    const { duty, frequency } = this.pump;
    return {
      segments: [{ duration: duty / frequency }, { duration: (1 - duty) / frequency }],
      nodeNames: this.#nodes,
      knowns: this.#knowns,
      resistors: this.#resistors,
      capacitors: this.#capacitors,
      diodes: this.#diodes,
      loads: this.#loads,
    };
  }

  #resistor(name: string, a: Terminal, b: Terminal, ohms: number): number {
    return this.#resistors.push({ name, a, b, ohms: [ohms, ohms] }) - 1;
  }
}
