/**
 * A driver of the board as what the pump sees: a stage of two transistors behind the clock's output, or an output of
 * its own (gates, a MOSFET pair, pins in parallel).
 */
import type { TransistorData } from '../catalog/part';
import type { Board, Driver, PinRef, Use } from '../model/board';
import { type Band, exactly } from '../quantity/figure';
import type { ClockSource } from './clock-source';
import type { DriverSource, DriveSource, TransistorSource } from './drive-source';
import { type Gap, isGap } from './gap';
import { type ClockLevels, type GateDrive, gateDrive, mosfetOhms } from './mosfet-stage';
import { pinData, pinResistance } from './pin-resistance';
import type { RailVoltage } from './pump-solution';

/** A pin of a chip that carries a share of a drive's current. */
export interface PinShare {
  readonly chip: string;
  readonly pin: string;
  readonly share: number;
}

export interface DriverStageResult {
  /** The clock's output replaced by the driver's, for drivers that switch by themselves. */
  readonly output?: Pick<
    DriveSource,
    'label' | 'path' | 'railName' | 'highDrop' | 'highOhms' | 'lowVolts' | 'lowOhms'
  >;
  /** A stage of two transistors that loads the clock's output. */
  readonly stage?: DriverSource;
  readonly inverts: boolean;
  /** Pins that are the driver; absent: the clock's own pin drives it. */
  readonly pins?: readonly PinShare[];
  /** Of a pair of MOSFETs: what its gates ask of the clock. */
  readonly gates?: GateDrive;
}

/** `clockRail` supplies a driver that names no rail of its own, and the high level of the clock. */
export function driverStage(
  board: Board,
  driver: Driver,
  clock: ClockSource,
  clockRail: string,
  voltage: RailVoltage,
): DriverStageResult | Gap {
  const { stage, name } = driver;
  if (!stage) return { because: `the driver ${name} has no stage` };
  const railName = driver.rail?.name ?? clockRail;
  const band = voltage(railName);
  if (isGap(band)) return band;
  const output = (highOhms: Band, lowOhms: Band) => ({
    label: name,
    path: driver.path,
    railName,
    highDrop: exactly(0),
    highOhms,
    lowVolts: exactly(0),
    lowOhms,
  });
  switch (stage.kind) {
    case 'push-pull':
    case 'follower': {
      const npn = transistor(stage.npn, `${driver.path}.${stage.kind}.npn`, `${name} npn`);
      const pnp = transistor(stage.pnp, `${driver.path}.${stage.kind}.pnp`, `${name} pnp`);
      if (!npn || !pnp) return { because: `a transistor of ${name} is not known` };
      const base = stage.kind === 'push-pull' ? pushPullBase(stage) : undefined;
      if (stage.kind === 'push-pull' && !base) return { because: `a base resistor of ${name} is missing` };
      return {
        inverts: stage.kind === 'push-pull',
        stage: { kind: stage.kind, name, path: driver.path, railName, npn, pnp, base },
      };
    }
    case 'mosfet-pair': {
      const [n, p] = [stage.nmos?.data, stage.pmos?.data];
      if (!n || !p) return { because: `a MOSFET of ${name} is not known` };
      const levels = clockLevels(clock, clockRail, voltage);
      if (isGap(levels)) return levels;
      const gates = gateDrive(stage, n, p, band, levels, clock);
      const { high, low } = mosfetOhms(n, p, gates);
      return { inverts: true, gates, output: output(high, low) };
    }
    case 'gates': {
      const data = stage.part?.data;
      const high = data && pinResistance(data.output, 'high', band.typical);
      const low = data && pinResistance(data.output, 'low', band.typical);
      if (!high || !low) return { because: `the output resistance of the gates of ${name} is not known` };
      const count = Math.max(1, Math.round(stage.parallel?.typical ?? 1));
      // Inverters are the usual gates for this work (common practice, no source).
      return { inverts: true, output: output(divided(high, count), divided(low, count)) };
    }
    case 'pins':
      return parallelPins(board, name, stage.pins, voltage, output);
  }
}

function clockLevels({ output }: ClockSource, rail: string, voltage: RailVoltage): ClockLevels | Gap {
  const top = output.highVolts ?? voltage(rail);
  if (isGap(top)) return top;
  const { highDrop, lowVolts } = output;
  return {
    high: {
      min: top.min - highDrop.max,
      typical: top.typical - highDrop.typical,
      max: top.max - highDrop.min,
    },
    low: lowVolts,
  };
}

function transistor(
  use: Use<TransistorData> | undefined,
  path: string,
  label: string,
): TransistorSource | undefined {
  return use?.data && { label: use.ref ? `${label} ${use.ref.name}` : label, path, data: use.data };
}

function pushPullBase(
  stage: Extract<NonNullable<Driver['stage']>, { kind: 'push-pull' }>,
): DriverSource['base'] | undefined {
  if (stage.sharedBase) return { shared: stage.sharedBase };
  const { npn, pnp } = stage.base ?? {};
  return npn && pnp && { npn, pnp };
}

function divided({ min, typical, max }: Band, count: number): Band {
  return { min: min / count, typical: typical / count, max: max / count };
}

/** Pins side by side share the current by their conductance. */
function parallelPins(
  board: Board,
  name: string,
  refs: readonly PinRef[],
  voltage: RailVoltage,
  output: (high: Band, low: Band) => NonNullable<DriverStageResult['output']>,
): DriverStageResult | Gap {
  const high: Band[] = [];
  const low: Band[] = [];
  let railName: string | undefined;
  for (const ref of refs) {
    const chip = board.chips.get(ref.chip);
    const part = chip?.part?.data;
    if (!chip?.rail || !part) return { because: `the chip of ${ref.chip}.${ref.pin} is not known` };
    if (railName !== undefined && railName !== chip.rail.name)
      return { because: `the pins of ${name} are on different rails` };
    railName = chip.rail.name;
    const band = voltage(railName);
    if (isGap(band)) return band;
    const data = pinData(part, ref.pin, chip.pins.get(ref.pin));
    const up = pinResistance(data, 'high', band.typical);
    const down = pinResistance(data, 'low', band.typical);
    if (!up || !down) return { because: `the output resistance of ${ref.chip}.${ref.pin} is not known` };
    high.push(up);
    low.push(down);
  }
  if (railName === undefined) return { because: `the driver ${name} names no pins` };
  const total = parallel(high).typical;
  return {
    inverts: false,
    output: { ...output(parallel(high), parallel(low)), railName },
    pins: refs.map((ref, k) => ({ chip: ref.chip, pin: ref.pin, share: total / high[k]!.typical })),
  };
}

function parallel(list: readonly Band[]): Band {
  const join = (key: keyof Band) => 1 / list.reduce((sum, band) => sum + 1 / band[key], 0);
  return { min: join('min'), typical: join('typical'), max: join('max') };
}
