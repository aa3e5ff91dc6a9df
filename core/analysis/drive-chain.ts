/**
 * Everything between a clock and a pump's terminal, from the name in `drive`: the clock's output, the driver behind
 * it, and the chip's pins that carry the current.
 */
import type { Board, Driver, Pump, Rail } from '../model/board';
import { type ClockSource, clockSource } from './clock-source';
import type { DriveSource } from './drive-source';
import { driverStage, type PinShare } from './driver-stage';
import { type Gap, isGap } from './gap';
import type { GateDrive } from './mosfet-stage';
import type { RailVoltage } from './pump-solution';

export interface DriveChain {
  /** As written in `drive`. */
  readonly name: string;
  readonly clock: ClockSource;
  readonly driver?: Driver;
  readonly source: DriveSource;
  readonly pins: readonly PinShare[];
  /** Of a driver of MOSFETs: what its gates ask of the clock. */
  readonly gates?: GateDrive;
  /** True when the pump's terminal is high while the clock that sets the timing is high. */
  readonly inPhase: boolean;
}

/** One for a pump of one phase, two for one of two; or the reason why they are not known. */
export function driveChains(
  board: Board,
  rail: Rail,
  pump: Pump,
  voltage: RailVoltage,
): readonly DriveChain[] | Gap {
  if (pump.drive.length === 0) return { because: 'it has no drive' };
  const chains: DriveChain[] = [];
  for (const { name } of pump.drive) {
    const chain = driveChain(board, name, voltage);
    if (isGap(chain)) return chain;
    chains.push(chain);
  }
  return inOrder(rail, pump, chains);
}

function driveChain(board: Board, name: string, voltage: RailVoltage): DriveChain | Gap {
  const driver = board.drivers.get(name);
  const clockName = driver ? driver.input?.name : name;
  if (clockName === undefined) return { because: `the driver ${name} has no input` };
  const clock = clockSource(board, clockName, voltage);
  if (isGap(clock)) return clock;
  const { output } = clock;
  const railName = output.railName ?? externalRail(clockName);
  const own: DriveSource = {
    label: output.label,
    path: output.path,
    railName,
    ...(output.highVolts ? { highVolts: output.highVolts } : {}),
    opposite: clock.opposite,
    highDrop: output.highDrop,
    highOhms: output.highOhms,
    lowVolts: output.lowVolts,
    lowOhms: output.lowOhms,
  };
  const clockPins = clock.pin ? [{ chip: clock.pin.chip.name, pin: clock.pin.pin, share: 1 }] : [];
  if (!driver) return { name, clock, source: own, pins: clockPins, inPhase: !clock.opposite };
  const stage = driverStage(board, driver, clock, railName, voltage);
  if (isGap(stage)) return stage;
  return {
    name,
    clock,
    driver,
    source: stage.stage
      ? { ...own, driver: stage.stage }
      : { ...stage.output!, opposite: clock.opposite !== stage.inverts },
    pins: stage.pins ?? (stage.stage ? clockPins : []),
    ...(stage.gates ? { gates: stage.gates } : {}),
    inPhase: clock.opposite === stage.inverts,
  };
}

/** Edges of the timing that all chains share, s: a driver whose gates charge slowly lengthens them. */
export function chainEdges(chains: readonly DriveChain[]): { readonly rise: number; readonly fall: number } {
  let { rise, fall } = chains[0]!.clock;
  for (const { gates, clock } of chains) {
    if (!gates) continue;
    // An inverse clock falls while the one that sets the timing rises.
    rise = Math.max(rise, clock.opposite ? gates.fall : gates.rise);
    fall = Math.max(fall, clock.opposite ? gates.rise : gates.fall);
  }
  return { rise, fall };
}

/** Name of the potential behind an external generator, which is no rail of the board. */
export function externalRail(clock: string): string {
  return `the generator of ${clock}`;
}

/** A pump whose stages take turns needs two drives of opposite phase on one timing; any other has one drive. */
function inOrder(rail: Rail, pump: Pump, chains: readonly DriveChain[]): readonly DriveChain[] | Gap {
  const [first, second] = chains;
  const stages = Math.round(pump.stages?.typical ?? 1);
  if (pump.topology !== 'multiplier' || stages < 2) return [first!];
  const refuse = (message: string): Gap => ({
    because: 'its phases do not fit',
    finding: {
      code: second ? 'clock-frequency' : 'missing-key',
      severity: 'error',
      at: `${rail.path}.pump.drive`,
      span: pump.keys.get('drive') ?? rail.nameSpan,
      message,
    },
  });
  if (!second)
    return refuse(
      `A multiplier of ${stages} stages needs two phases: give drive a list of two clocks, the second one with inverse-of: ${first!.clock.clock.name}.`,
    );
  if (first!.clock.root.name !== second.clock.root.name || first!.inPhase === second.inPhase)
    return refuse(
      `${first!.name} and ${second.name} are not opposite phases of one clock: write inverse-of: ${first!.clock.clock.name} for the second one, and drive both through stages of the same kind.`,
    );
  return [first!, second];
}
