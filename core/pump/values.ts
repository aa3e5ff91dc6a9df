/**
 * A pump as plain numbers at one operating point: what the network is built from. SI units.
 */

export interface CapacitorValues {
  readonly farads: number;
  readonly ohms: number;
}

export interface DiodeValues {
  readonly saturation: number;
  /** Ideality times thermal voltage, V. */
  readonly slope: number;
  readonly ohms: number;
}

/** What the pump's drive terminal is connected to: two levels behind their resistances. */
export interface DriveValues {
  readonly high: number;
  readonly low: number;
  readonly highOhms: number;
  readonly lowOhms: number;
}

export type LoadValues =
  | { readonly name: string; readonly kind: 'resistance'; readonly ohms: number }
  | { readonly name: string; readonly kind: 'current'; readonly amps: number }
  /** `knee`: the lowest voltage at which it still takes its power, V. */
  | { readonly name: string; readonly kind: 'power'; readonly watts: number; readonly knee: number };

export interface PumpValues {
  readonly topology: 'chain' | 'ladder';
  /** 1 or more. A doubler is a chain of one stage, an inverter a negative chain of one. */
  readonly stages: number;
  readonly negative: boolean;
  /** Potential that the first diode starts from, V; 0 for ground. */
  readonly input: number;
  readonly frequency: number;
  /** Share of the period in which the first drive is high, 0..1 exclusive. */
  readonly duty: number;
  /** One drive, or two of which the second is high while the first is low. */
  readonly drives: readonly DriveValues[];
  /** Resistor between drive and capacitors, ohm; 0 for none. */
  readonly series: number;
  readonly flying: readonly CapacitorValues[];
  /** Second column of a ladder, from ground up. */
  readonly smoothing: readonly CapacitorValues[];
  readonly reservoir?: CapacitorValues;
  /** One for each position, from the input to the output. */
  readonly diodes: readonly DiodeValues[];
  readonly loads: readonly LoadValues[];
}

/**
 * Voltage at which a constant-current load lets go: the current falls in proportion below about this, V.
 * Common practice, no source: a current mirror or an amplifier's bias needs a few tenths of a volt.
 */
export const loadKnee = 0.2;

/** Output voltage without load and with perfect parts, V. */
export function idealVoltage(pump: PumpValues): number {
  const sign = pump.negative ? -1 : 1;
  const swing = (k: number) => {
    const drive = pump.drives[k % pump.drives.length];
    return drive ? drive.high - drive.low : 0;
  };
  let sum = pump.input;
  for (let k = 0; k < pump.stages; k++) sum += sign * swing(pump.topology === 'ladder' ? 0 : k);
  return sum;
}
