/**
 * Drives in the network: a clock's output as two switches, and a stage of two transistors behind it.
 */
import type { Terminal } from '../engine';
import { lowerSwitch, oppositePhase, upperSwitch } from './phases';
import { ground, type Sheet } from './sheet';
import type { DriverValues, DriveValues, OutputValues, TransistorValues } from './values';

/** Resistors and junctions of a transistor, as indices; `sign` tells npn from pnp. */
export interface TransistorPlace {
  readonly base: number;
  readonly collector: number;
  readonly emitterJunction: number;
  readonly collectorJunction: number;
}

export interface DrivePlace {
  /** Upper and lower switch of the clock's output: resistors. */
  readonly high: number;
  readonly low: number;
  /** Node of the clock's output. */
  readonly clock: Terminal;
  /** Node that the pump's capacitors stand on. */
  readonly output: Terminal;
  readonly series?: number;
  readonly driver?: {
    readonly npn: TransistorPlace;
    readonly pnp: TransistorPlace;
    readonly shared?: number;
    /** Output of the stage, before the series resistor. */
    readonly stage: Terminal;
  };
}

export function addDrive(sheet: Sheet, drive: DriveValues, index: number): DrivePlace {
  const name = `drive ${index + 1}`;
  const clock = addOutput(sheet, name, drive.clock, drive.opposite);
  const driver = drive.driver && addDriver(sheet, name, drive.driver, clock.node);
  const before = driver?.stage ?? clock.node;
  const placed = { high: clock.high, low: clock.low, clock: clock.node, ...(driver ? { driver } : {}) };
  if (!(sheet.pump.series > 0)) return { ...placed, output: before };
  const output = sheet.node(`${name} behind series`);
  return { ...placed, output, series: sheet.resistor(`${name} series`, before, output, sheet.pump.series) };
}

function addOutput(sheet: Sheet, name: string, output: OutputValues, opposite: boolean) {
  const rail = sheet.rails[output.rail]!.terminal;
  const { volts } = sheet.pump.rails[output.rail]!;
  const node = sheet.node(`${name} clock`);
  const phases = opposite ? sheet.phases.map(oppositePhase) : sheet.phases;
  const { highOhms, highDrop, lowOhms, lowVolts } = output;
  return {
    node,
    high: sheet.switched(
      `${name} high`,
      rail,
      node,
      upperSwitch(phases, highOhms, highDrop, volts - lowVolts),
    ),
    low: sheet.switched(
      `${name} low`,
      node,
      ground,
      lowerSwitch(phases, lowOhms, lowVolts, volts - highDrop),
    ),
  };
}

function addDriver(
  sheet: Sheet,
  name: string,
  driver: DriverValues,
  clock: Terminal,
): NonNullable<DrivePlace['driver']> {
  const rail = sheet.rails[driver.rail]!.terminal;
  const stage = sheet.node(`${name} stage`);
  const shared = 'shared' in driver.base && driver.base.shared > 0 ? driver.base.shared : undefined;
  const joined = shared === undefined ? clock : sheet.node(`${name} bases`);
  const base = 'shared' in driver.base ? { npn: 0, pnp: 0 } : driver.base;
  const follower = driver.kind === 'follower';
  const npn = addTransistor(sheet, `${name} npn`, driver.npn, false, {
    drive: joined,
    baseOhms: base.npn,
    collector: follower ? rail : stage,
    emitter: follower ? stage : ground,
  });
  const pnp = addTransistor(sheet, `${name} pnp`, driver.pnp, true, {
    drive: joined,
    baseOhms: base.pnp,
    collector: follower ? ground : stage,
    emitter: follower ? stage : rail,
  });
  if (shared === undefined) return { npn, pnp, stage };
  return { npn, pnp, stage, shared: sheet.resistor(`${name} shared base`, clock, joined, shared) };
}

interface Wiring {
  readonly drive: Terminal;
  readonly baseOhms: number;
  readonly collector: Terminal;
  readonly emitter: Terminal;
}

/**
 * Two junctions, each passing most of its current on to the far terminal (injection form of the Ebers-Moll model);
 * resistances of base and collector as resistors, that of the emitter in its junction.
 */
function addTransistor(
  sheet: Sheet,
  name: string,
  values: TransistorValues,
  pnp: boolean,
  { drive, baseOhms, collector, emitter }: Wiring,
): TransistorPlace {
  const base = sheet.node(`${name} base`);
  const inner = sheet.node(`${name} collector`);
  const foot = sheet.node(`${name} emitter`);
  sheet.resistor(`${name} emitter`, foot, emitter, values.emitterOhms);
  const side = pnp ? 'b' : 'a';
  const junction = (far: Terminal) => (pnp ? { a: far, b: base } : { a: base, b: far });
  const forward = values.gain / (values.gain + 1);
  const reverse = values.reverseGain / (values.reverseGain + 1);
  return {
    base: sheet.resistor(`${name} base`, drive, base, baseOhms + values.baseOhms),
    collector: sheet.resistor(`${name} collector`, inner, collector, values.collectorOhms),
    emitterJunction: sheet.junction({
      name: `${name} emitter`,
      ...junction(foot),
      saturation: values.saturation / forward,
      slope: values.slope,
      ohms: 0,
      transfer: { terminal: inner, base: side, alpha: forward },
    }),
    collectorJunction: sheet.junction({
      name: `${name} collector`,
      ...junction(inner),
      saturation: values.saturation / reverse,
      slope: values.slope,
      ohms: 0,
      transfer: { terminal: foot, base: side, alpha: reverse },
    }),
  };
}
