/**
 * A pump as plain numbers at one operating point: what the network is built from. SI units.
 */

export interface CapacitorValues {
  readonly farads: number;
  readonly ohms: number;
  /** Leakage as a resistance beside it, ohm; absent for none. */
  readonly leakOhms?: number;
}

export interface DiodeValues {
  readonly saturation: number;
  /** Ideality times thermal voltage, V. */
  readonly slope: number;
  readonly ohms: number;
  /** Reverse leakage as a resistance beside it, ohm; absent for none. */
  readonly leakOhms?: number;
  /** Junction capacitance, F; absent where it makes no difference. */
  readonly junctionFarads?: number;
}

/** A rail that the pump stands on or is driven from, as the pump sees it. */
export interface RailValues {
  readonly name: string;
  /** Voltage when the pump draws nothing, V. */
  readonly volts: number;
  /** Source resistance, ohm; 0 for a rail that does not give way. */
  readonly ohms: number;
}

/** An output that switches between its rail and ground: a pin, a gate, a timer, a MOSFET pair. */
export interface OutputValues {
  /** Index into the pump's rails. */
  readonly rail: number;
  /** What the high level stays below the rail even without load, V. */
  readonly highDrop: number;
  readonly highOhms: number;
  /** What the low level stays above ground even without load, V. */
  readonly lowVolts: number;
  readonly lowOhms: number;
}

/** Ebers-Moll transistor with ohmic resistances. */
export interface TransistorValues {
  readonly saturation: number;
  readonly slope: number;
  readonly gain: number;
  readonly reverseGain: number;
  readonly baseOhms: number;
  readonly collectorOhms: number;
  readonly emitterOhms: number;
  /** Storage time of its data sheet, s: no part of the network; absent where it is not known. */
  readonly storageSeconds?: number;
}

/** A stage of two transistors between a clock and the pump. */
export interface DriverValues {
  /** `push-pull`: common emitters, inverting. `follower`: common collectors, not inverting. */
  readonly kind: 'push-pull' | 'follower';
  readonly rail: number;
  readonly npn: TransistorValues;
  readonly pnp: TransistorValues;
  /** Resistor of each base, ohm; for `shared` one resistor to both bases joined. A follower has none (0). */
  readonly base: { readonly npn: number; readonly pnp: number } | { readonly shared: number };
}

export interface DriveValues {
  readonly clock: OutputValues;
  /** True when the clock's output is high while the first drive's is low. */
  readonly opposite: boolean;
  readonly driver?: DriverValues;
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
  readonly rails: readonly RailValues[];
  /** Rail that the first diode starts from, as an index; absent for ground. */
  readonly input?: number;
  readonly frequency: number;
  /** Share of the period in which the first clock is high, taken at the middle of its edges, 0..1 exclusive. */
  readonly duty: number;
  /** Length of the edges, s; 0 for none. */
  readonly rise: number;
  readonly fall: number;
  /** One drive, or two of opposite phase for a chain whose stages take turns. */
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

/** Rail that decides the swing of a drive: the driver's, or the clock's own. */
export function swingRail(pump: Pick<PumpValues, 'rails'>, drive: DriveValues): RailValues {
  return pump.rails[drive.driver?.rail ?? drive.clock.rail]!;
}

/** True when the pump's terminal goes up while the first clock is high. */
export function inPhase(drive: DriveValues): boolean {
  return drive.opposite === (drive.driver?.kind === 'push-pull');
}

/** Output voltage without load and with perfect parts, every drive swinging from ground to its rail, V. */
export function idealVoltage(
  pump: Pick<PumpValues, 'topology' | 'stages' | 'negative' | 'rails' | 'input' | 'drives'>,
): number {
  const sign = pump.negative ? -1 : 1;
  let sum = pump.input === undefined ? 0 : pump.rails[pump.input]!.volts;
  for (let k = 0; k < pump.stages; k++) {
    const drive = pump.drives[pump.topology === 'ladder' ? 0 : k % pump.drives.length]!;
    sum += sign * swingRail(pump, drive).volts;
  }
  return sum;
}
