/**
 * From a pump rail of the board to its solved pump, or to the reason why there is none.
 */

import type { Board, Pump, Rail } from '../model/board';
import { type Band, exactly } from '../quantity/figure';
import { weightedModes } from './board-modes';
import type { DriveSource } from './drive-source';
import { type Gap, isGap } from './gap';
import { pinResistance } from './pin-resistance';
import { assemblePump, type RailSource } from './pump-assembly';
import { driveData, type PinDrive, pumpDrives } from './pump-drive';
import { type ModeModel, solvePump } from './pump-result';
import type { PumpResult } from './types';

/** Voltage of another rail, or why it has none. */
export type RailVoltage = (name: string) => Band | Gap;

const computedTopologies: ReadonlySet<string> = new Set(['doubler', 'inverter']);

/** The pump's models in each mode, for solving and for sizing; `drives` are the pins behind it. */
export interface PumpSetup {
  readonly models: readonly ModeModel[];
  readonly drives: readonly PinDrive[];
}

export function setUpPump(board: Board, rail: Rail, pump: Pump, voltage: RailVoltage): PumpSetup | Gap {
  const { topology } = pump;
  if (!topology) return { because: 'it has no topology' };
  if (!computedTopologies.has(topology)) return { because: `a ${topology} is not computed yet` };
  const drives = pumpDrives(board, rail, pump);
  if (isGap(drives)) return drives;
  const first = drives[0]!;
  const sources: DriveSource[] = [];
  for (const drive of drives) {
    const source = driveSource(drive, voltage);
    if (isGap(source)) return source;
    sources.push(source);
  }
  const input = inputRail(pump, voltage);
  if (input && isGap(input)) return input;
  const rails = new Map<string, RailSource>();
  for (const name of [...sources.map((source) => source.railName), ...(input ? [input.railName] : [])]) {
    const band = voltage(name);
    if (isGap(band)) return band;
    rails.set(name, { name, band });
  }
  const models: ModeModel[] = [];
  for (const { name } of weightedModes(board)) {
    const model = assemblePump({
      rail,
      pump,
      mode: name,
      stages: 1,
      ambient: board.ambient,
      rails: [...rails.values()],
      input: input?.railName,
      drives: sources,
      clock: {
        label: first.clock.name,
        path: first.clock.path,
        frequency: first.frequency,
        duty: first.duty,
        rise: 0,
        fall: 0,
      },
    });
    if (!model) return { because: 'a capacitor or a diode of it has no usable value' };
    models.push({ mode: name, model });
  }
  return { models, drives };
}

export function solveRailPump(board: Board, rail: Rail, pump: Pump, voltage: RailVoltage): PumpResult | Gap {
  const setup = setUpPump(board, rail, pump, voltage);
  if (isGap(setup)) return setup;
  const result = solvePump(pump.topology!, setup.models);
  if (!('reason' in result)) return result;
  return {
    because: `no steady state was found: ${result.reason}`,
    finding: {
      code: 'not-converged',
      severity: 'error',
      at: `${rail.path}.pump`,
      span: rail.nameSpan,
      message:
        `${rail.name}: no steady state was found (${result.reason}), so it has no voltage. ` +
        'Look for a value that is far off, such as a capacitor or a frequency with a wrong prefix.',
    },
  };
}

/** Undefined when the pump stands on ground. */
function inputRail(pump: Pump, voltage: RailVoltage): { railName: string; band: Band } | Gap | undefined {
  if (!pump.input || pump.input.name === 'ground') {
    return pump.topology === 'doubler' && !pump.input ? { because: 'it has no input' } : undefined;
  }
  const band = voltage(pump.input.name);
  return isGap(band) ? band : { railName: pump.input.name, band };
}

function driveSource(drive: PinDrive, voltage: RailVoltage): DriveSource | Gap {
  const band = voltage(drive.railName);
  if (isGap(band)) return band;
  const data = driveData(drive);
  const high = data && pinResistance(data, 'high', band.typical);
  const low = data && pinResistance(data, 'low', band.typical);
  if (!high || !low) return noResistance(drive);
  return {
    label: drive.key,
    path: `${drive.chip.path}.pins.${drive.pin}`,
    railName: drive.railName,
    opposite: false,
    highDrop: exactly(0),
    lowVolts: exactly(0),
    highOhms: high,
    lowOhms: low,
  };
}

function noResistance({ chip, pin, key, clock }: PinDrive): Gap {
  return {
    because: `the output resistance of ${key} is not known`,
    finding: {
      code: 'missing-key',
      severity: 'error',
      at: chip.part ? `${chip.path}.part` : chip.path,
      span: chip.part?.span ?? chip.nameSpan,
      message:
        `${key} drives ${clock.name}, but its output resistance is not known. Name a catalogue part, or give ` +
        `high-resistance and low-resistance for ${pin} under parts.chips.`,
      related: [{ span: clock.nameSpan, message: `${clock.name} is driven from here` }],
    },
  };
}
