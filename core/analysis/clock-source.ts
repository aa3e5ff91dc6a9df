/**
 * A clock of the board as what drives a pump: real frequency and duty, and its output with levels and resistances.
 */
import type { Board, Chip, Clock } from '../model/board';
import { type Band, exactly } from '../quantity/figure';
import { oscillator } from './clock-oscillators';
import { registerWave } from './clock-registers';
import { type Gap, isGap } from './gap';
import { pinData, pinResistance } from './pin-resistance';
import type { RailVoltage } from './pump-solution';

export interface ClockOutput {
  /** `mcu.GP15`, or the clock's name. */
  readonly label: string;
  readonly path: string;
  /** Rail that the high level comes from; absent for an external generator. */
  readonly railName: string | undefined;
  /** Only of an external generator, V. */
  readonly highVolts: Band | undefined;
  readonly highDrop: Band;
  readonly highOhms: Band;
  readonly lowVolts: Band;
  readonly lowOhms: Band;
}

export interface ClockTiming {
  readonly frequency: Band;
  /** Share of the period that the output is high. */
  readonly duty: Band;
}

export interface ClockSource extends ClockTiming {
  readonly clock: Clock;
  /** The clock that sets frequency and duty: itself, or the one that it is the inverse of. */
  readonly root: Clock;
  /** True when it is high while `root` is low. */
  readonly opposite: boolean;
  /** Edges of `root`, s; 0 when they are not given. */
  readonly rise: number;
  readonly fall: number;
  readonly output: ClockOutput;
  readonly pin?: { readonly chip: Chip; readonly pin: string; readonly key: string };
  /** What the oscillator itself takes from its rail, A; null when it is a pin or not known. */
  readonly ownCurrent: Band | null;
}

export function clockSource(board: Board, name: string, voltage: RailVoltage): ClockSource | Gap {
  const clock = board.clocks.get(name);
  if (!clock) return { because: `its drive ${name} is not known` };
  const chain = rootOf(board, clock);
  if ('because' in chain) return chain;
  const { root, opposite } = chain;
  const timing = clockTiming(root, voltage);
  if (isGap(timing)) return timing;
  const edges = { rise: root.rise?.typical ?? 0, fall: root.fall?.typical ?? 0 };
  const common = { ...timing, ...edges, clock, root, opposite };
  if (clock.pin) {
    const found = pinOutput(board, clock, clock.pin, voltage);
    return isGap(found) ? found : { ...common, ...found, ownCurrent: null };
  }
  const made = oscillator(clock, voltage);
  if (isGap(made)) return made;
  return { ...common, output: made.output, ownCurrent: made.ownCurrent };
}

/** Frequency and duty of a clock that sets its own; duty is half where nothing says otherwise. */
export function clockTiming(clock: Clock, voltage: RailVoltage): ClockTiming | Gap {
  if (!clock.pin) {
    const made = oscillator(clock, voltage);
    return isGap(made) ? made : made.timing;
  }
  if (clock.timer) return registerWave(clock, clock.timer);
  if (!clock.frequency) return { because: `the frequency of ${clock.name} is not known` };
  return { frequency: clock.frequency, duty: clock.duty ?? exactly(0.5) };
}

/** Follows `inverse-of` to the clock that sets the timing. */
function rootOf(board: Board, clock: Clock): { root: Clock; opposite: boolean } | Gap {
  let root = clock;
  let opposite = false;
  const seen = new Set([clock.name]);
  while (root.inverseOf) {
    const next = board.clocks.get(root.inverseOf.name);
    if (!next) return { because: `the clock ${root.inverseOf.name} is not known` };
    if (seen.has(next.name)) return { because: `the clock ${clock.name} is the inverse of itself` };
    seen.add(next.name);
    root = next;
    opposite = !opposite;
  }
  return { root, opposite };
}

function pinOutput(
  board: Board,
  clock: Clock,
  ref: NonNullable<Clock['pin']>,
  voltage: RailVoltage,
): Pick<ClockSource, 'output' | 'pin'> | Gap {
  const chip = board.chips.get(ref.chip);
  if (!chip) return { because: `the chip ${ref.chip} is not known` };
  if (!chip.rail) return { because: `the chip ${chip.name} has no rail` };
  const band = voltage(chip.rail.name);
  if (isGap(band)) return band;
  const key = `${chip.name}.${ref.pin}`;
  const part = chip.part?.data;
  const data = part && pinData(part, ref.pin, chip.pins.get(ref.pin));
  const highOhms = data && pinResistance(data, 'high', band.typical);
  const lowOhms = data && pinResistance(data, 'low', band.typical);
  if (!highOhms || !lowOhms) return noResistance(chip, ref.pin, key, clock);
  return {
    pin: { chip, pin: ref.pin, key },
    output: {
      label: key,
      path: `${chip.path}.pins.${ref.pin}`,
      railName: chip.rail.name,
      highVolts: undefined,
      highDrop: exactly(0),
      highOhms,
      lowVolts: exactly(0),
      lowOhms,
    },
  };
}

function noResistance(chip: Chip, pin: string, key: string, clock: Clock): Gap {
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
