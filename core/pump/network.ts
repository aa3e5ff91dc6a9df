/**
 * From a pump's values to the network that the engine solves, and where to find its parts again.
 */
import type { Network, Terminal } from '../engine';
import { addDrive, type DrivePlace } from './drive';
import { clockPhases, type Phase } from './phases';
import { type DiodePlace, ground, type LoadPlace, type RailPlace, Sheet, type StoredPlace } from './sheet';
import type { PumpValues } from './values';

/** Places of the pump's parts in the network: indices into its lists. */
export interface PumpNetwork {
  readonly network: Network;
  /** What each segment is for the first clock. */
  readonly phases: readonly Phase[];
  readonly output: Terminal;
  readonly ground: Terminal;
  readonly rails: readonly RailPlace[];
  readonly drives: readonly DrivePlace[];
  readonly flying: readonly number[];
  readonly smoothing: readonly number[];
  readonly reservoir?: number;
  readonly diodes: readonly number[];
  readonly loads: readonly LoadPlace[];
  /** Resistors that are leakage, beside each part of the same place in its list. */
  readonly leaks: {
    readonly flying: readonly (number | undefined)[];
    readonly smoothing: readonly (number | undefined)[];
    readonly reservoir?: number;
    readonly diodes: readonly (number | undefined)[];
  };
  /** Capacitors that are junctions of the diodes. */
  readonly junctions: readonly (number | undefined)[];
}

/** Undefined when the clock's edges leave no room for its levels. */
export function pumpNetwork(pump: PumpValues): PumpNetwork | undefined {
  const phases = clockPhases(pump);
  if (!phases) return undefined;
  const sheet = new Sheet(pump, phases);
  const drives = pump.drives.map((drive, d) => addDrive(sheet, drive, d));
  const input = pump.input === undefined ? ground : sheet.rails[pump.input]!.terminal;
  const parts = pump.topology === 'ladder' ? ladder(sheet, input, drives[0]!) : chain(sheet, input, drives);
  const reservoir = pump.reservoir && sheet.capacitor('reservoir', parts.output, ground, pump.reservoir);
  const loads = pump.loads.map((load) => sheet.load(parts.output, load));
  return {
    network: sheet.network(),
    phases: phases.phases,
    output: parts.output,
    ground,
    rails: sheet.rails,
    drives,
    flying: parts.flying.map(indexOf),
    smoothing: parts.smoothing.map(indexOf),
    ...(reservoir === undefined ? {} : { reservoir: reservoir.index }),
    diodes: parts.diodes.map(indexOf),
    loads,
    leaks: {
      flying: parts.flying.map(leakOf),
      smoothing: parts.smoothing.map(leakOf),
      ...(reservoir?.leak === undefined ? {} : { reservoir: reservoir.leak }),
      diodes: parts.diodes.map(leakOf),
    },
    junctions: parts.diodes.map(({ junction }) => junction),
  };
}

const indexOf = ({ index }: StoredPlace): number => index;
const leakOf = ({ leak }: StoredPlace): number | undefined => leak;

interface Parts {
  readonly output: Terminal;
  readonly flying: StoredPlace[];
  readonly smoothing: StoredPlace[];
  readonly diodes: DiodePlace[];
}

/** Diodes in a row from the input to the output; each node between them is pumped by a capacitor. */
function chain(sheet: Sheet, input: Terminal, drives: readonly DrivePlace[]): Parts {
  const { pump } = sheet;
  const flying: StoredPlace[] = [];
  const diodes: DiodePlace[] = [];
  let from = input;
  for (let k = 0; k <= pump.stages; k++) {
    const to = sheet.node(k === pump.stages ? 'output' : `pumped ${k + 1}`);
    diodes.push(sheet.diode(k, from, to));
    if (k < pump.stages)
      flying.push(sheet.capacitor(`flying ${k + 1}`, to, drives[k % drives.length]!.output, pump.flying[k]!));
    from = to;
  }
  return { output: from, flying, smoothing: [], diodes };
}

/** Half-wave ladder: a coupling column on the drive, a smoothing column on ground, diodes between them. */
function ladder(sheet: Sheet, input: Terminal, drive: DrivePlace): Parts {
  const { pump } = sheet;
  const flying: StoredPlace[] = [];
  const smoothing: StoredPlace[] = [];
  const diodes: DiodePlace[] = [];
  let coupled = drive.output;
  let smooth = input;
  let foot: Terminal = ground;
  for (let k = 0; k < pump.stages; k++) {
    const pumped = sheet.node(`pumped ${k + 1}`);
    const held = sheet.node(k === pump.stages - 1 ? 'output' : `held ${k + 1}`);
    diodes.push(sheet.diode(2 * k, smooth, pumped), sheet.diode(2 * k + 1, pumped, held));
    flying.push(sheet.capacitor(`flying ${k + 1}`, pumped, coupled, pump.flying[k]!));
    smoothing.push(sheet.capacitor(`smoothing ${k + 1}`, held, foot, pump.smoothing[k]!));
    coupled = pumped;
    smooth = held;
    foot = held;
  }
  return { output: smooth, flying, smoothing, diodes };
}
