/**
 * What drives a pump: from the name in `drive` to the pin, its chip and the chip's rail.
 */
import type { Board, Chip, Clock, Pump, Rail } from '../model/board';
import type { Figure } from '../quantity/figure';
import type { Gap } from './gap';
import { pinData } from './pin-resistance';

export interface PinDrive {
  readonly clock: Clock;
  readonly frequency: Figure;
  readonly duty: Figure;
  readonly chip: Chip;
  readonly pin: string;
  /** `mcu.GP15`. */
  readonly key: string;
  /** Rail of the chip. */
  readonly railName: string;
}

/** The pins that drive the pump, in the order of its `drive` list; or the reason why they are not known. */
export function pumpDrives(board: Board, rail: Rail, pump: Pump): readonly PinDrive[] | Gap {
  if (pump.drive.length === 0) return { because: `${rail.name} has no drive` };
  const drives: PinDrive[] = [];
  for (const ref of pump.drive) {
    const drive = pinDrive(board, ref.name);
    if ('because' in drive) return drive;
    drives.push(drive);
  }
  return drives;
}

function pinDrive(board: Board, name: string): PinDrive | Gap {
  const clock = board.clocks.get(name);
  if (!clock) {
    return board.drivers.has(name)
      ? { because: `its driver ${name} is not computed yet` }
      : { because: `its drive ${name} is not known` };
  }
  if (!clock.pin || clock.inverseOf) return { because: `the clock ${name} is of a kind not computed yet` };
  if (!clock.frequency || clock.timer) return { because: `the frequency of ${name} is not known` };
  if (!clock.duty) return { because: `the duty of ${name} is not known` };
  const chip = board.chips.get(clock.pin.chip);
  if (!chip) return { because: `the chip ${clock.pin.chip} is not known` };
  if (!chip.rail) return { because: `the chip ${chip.name} has no rail` };
  return {
    clock,
    frequency: clock.frequency,
    duty: clock.duty,
    chip,
    pin: clock.pin.pin,
    key: `${chip.name}.${clock.pin.pin}`,
    railName: chip.rail.name,
  };
}

/** Data of the driving pin; undefined when the chip has no usable part. */
export function driveData(drive: PinDrive) {
  const part = drive.chip.part?.data;
  return part && pinData(part, drive.pin, drive.chip.pins.get(drive.pin));
}
