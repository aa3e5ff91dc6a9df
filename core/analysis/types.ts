/**
 * What is known about a board after reading and computing it once: immutable, and the only thing that checks,
 * reports and editor features read. `null` stands for "not computed"; the board's findings say why.
 */
import type { ChipData, PinData } from '../catalog/part';
import type { Finding } from '../checks/finding';
import type { BenchPoint, Chip, Clock, Driver, Rail, Regulator, Supply } from '../model/board';
import type { BoardReading } from '../model/build';
import type { Band, Figure, Unit } from '../quantity/figure';
import type { BatteryLife } from './battery';
import type { ClockSource } from './clock-source';
import type { LoadPoint, Waveform } from './curves';
import type { Gap } from './gap';
import type { GateDrive } from './mosfet-stage';

/** One quantity of a corner and the end of its band at which it was taken. */
export interface CornerSetting {
  /** In the user's words: `flying capacitor`, `ambient`, `mcu.GP15 high resistance`. */
  readonly label: string;
  /** Dotted path of the place in the file that the quantity belongs to. */
  readonly path: string;
  readonly value: number;
  readonly unit: Unit;
  readonly end: 'lowest' | 'highest';
}

/** The extreme of a result over tolerance and temperature, and the corner that made it. */
export interface CornerEnd {
  readonly value: number;
  /** Most influential first. Empty when nothing has a band. */
  readonly settings: readonly CornerSetting[];
  /** Of a pump: everything else at that corner. */
  readonly point?: PumpPoint;
}

/** A pump solved at a corner. */
export interface CornerPoint {
  readonly point: PumpPoint;
  readonly settings: readonly CornerSetting[];
}

export interface Drop {
  readonly in: string;
  readonly volts: number;
}

/** Current of one drive of a pump into the pump, A: source positive. */
export interface DriveFigures {
  readonly sourceAverage: number;
  readonly sinkAverage: number;
  readonly rms: number;
  readonly peakSource: number;
  readonly peakSink: number;
}

/** A stage of two transistors between the clock and the pump, of one drive. */
export interface DriverFigures {
  /** Largest current that the clock must give to the bases, magnitude, A. */
  readonly baseCurrent: number;
  /** Collector over base current, averages over the time that the transistor is on; the larger of the two. */
  readonly forcedGain: number;
  /** Heat in both transistors, W. */
  readonly dissipation: number;
  /** Average out of the driver's rail, A. */
  readonly railCurrent: number;
  /** Average that flows through both transistors at once, A, and the same as charge per edge, C. */
  readonly crossCurrent: number;
  readonly crossCharge: number;
  /**
   * The part of it that flows after each edge until the charge of saturation is gone, A, and the longer of the times
   * that this takes, s. It is no part of the solved network: heat, charge and currents here hold it, drops do not.
   */
  readonly overlapCurrent: number;
  readonly overlapTime: number;
  /** Largest collector currents in the solved period, without the overlap, A. */
  readonly collectorPeaks: { readonly npn: number; readonly pnp: number };
  /** Volts by which the output still misses its rail or ground at the end of a phase; the larger of the two. */
  readonly shortOf: number;
}

export interface CapacitorFigures {
  /** Key in the report: `v6.flying[0]`, `v6.reservoir`. */
  readonly key: string;
  /** Largest voltage across it, magnitude, V. */
  readonly voltage: number;
  /** Signed, from the pumped or held node to the drive or to ground, V. */
  readonly average: number;
  readonly lowest: number;
  readonly highest: number;
  readonly rmsCurrent: number;
  /** Turned into heat in its series resistance, W. */
  readonly heat: number;
  /** Value that works: at its temperature and direct voltage, F. */
  readonly effective: number;
}

export interface DiodeFigures {
  /** Key in the report: `v6.diode[0]`. */
  readonly key: string;
  readonly reverse: number;
  readonly average: number;
  readonly peak: number;
}

/** A pump at typical values in one mode. Voltages carry the rail's sign. */
export interface PumpPoint {
  /** Absent when the board has no modes. */
  readonly mode?: string;
  readonly voltage: number;
  /** Lowest and highest momentary output in the period. */
  readonly lowest: number;
  readonly highest: number;
  readonly ripple: number;
  /** Average into all loads and the bleeder, magnitude, A. */
  readonly loadCurrent: number;
  /** The part of it that other rails and chips on this one take, A. */
  readonly belowCurrent: number;
  /** Average that the loads ask for, A: more than `loadCurrent` when the rail stalls. */
  readonly askedCurrent: number;
  /** Average out of the input rail, A; 0 when it stands on ground. */
  readonly inputCurrent: number;
  /** Power taken from input and drives, W. */
  readonly powerIn: number;
  readonly powerOut: number;
  readonly ideal: number;
  readonly openCircuit: number;
  readonly outputResistance: number;
  readonly drops: readonly Drop[];
  readonly balance: number;
  /** True when a load of constant power had to be taken as the resistor of the same average power. */
  readonly powerAveraged: boolean;
  readonly drives: readonly DriveFigures[];
  /** In the order of `drives`; null for a drive without a driver of transistors. */
  readonly drivers: readonly (DriverFigures | null)[];
  /** Average out of every rail that the pump stands on or is driven from, by name, A. */
  readonly railCurrents: ReadonlyMap<string, number>;
  /** Beside it, out of the rails of its stages of transistors: what their switching takes, A. */
  readonly besideCurrents: ReadonlyMap<string, number>;
  /** Heat in the two switches of each drive's clock output, or of its gates or MOSFETs, W. */
  readonly driveHeat: readonly number[];
  readonly capacitors: readonly CapacitorFigures[];
  readonly diodes: readonly DiodeFigures[];
  /** Solver effort: iterations and steps. */
  readonly effort: { readonly iterations: number; readonly steps: number };
}

/** Closed forms beside the solution: for explanation and as a check. */
export interface PumpEstimate {
  readonly ideal: number;
  /** Slow and fast switching limits of the output resistance and their combination, ohm. */
  readonly slowLimit: number;
  readonly fastLimit: number;
  readonly resistance: number;
  /** Drop of one diode at the effective current, V. */
  readonly diodeDrop: number;
  readonly voltage: number;
}

export interface PumpResult {
  /** One for each mode, or a single one. */
  readonly points: readonly PumpPoint[];
  /** The point with the largest load. */
  readonly heaviest: PumpPoint;
  /** Extremes over modes and corners: `lowest` is the smaller number. */
  readonly voltage: { readonly lowest: CornerEnd; readonly highest: CornerEnd };
  readonly ripple: { readonly lowest: CornerEnd; readonly highest: CornerEnd };
  /** In the order of `points`: where the pump draws most and least in that mode; null where it has no solution. */
  readonly draws: readonly {
    readonly most: CornerPoint | null;
    readonly least: CornerPoint | null;
    /** As `most`, with the highest pulses. */
    readonly sharpest: CornerPoint | null;
  }[];
  readonly estimate: PumpEstimate | null;
  /** Quantities that move the output, most influential first: change of voltage over the quantity's band, V. */
  readonly influences: readonly { readonly label: string; readonly path: string; readonly volts: number }[];
}

/** Switch-on from empty capacitors and switch-off of a pump, typical values. */
export interface Transients {
  readonly mode?: string;
  /** Time to 90 % of the final voltage, s; null when it could not be followed. */
  readonly startTime: number | null;
  readonly startCourse: readonly { readonly time: number; readonly volts: number }[];
  /** Largest current of each drive's clock output, A. */
  readonly inrush: readonly number[] | null;
  readonly diodePeaks: readonly number[] | null;
  /** Largest collector currents of each drive's stage of transistors, A; null for a drive without one. */
  readonly transistorPeaks: readonly ({ readonly npn: number; readonly pnp: number } | null)[] | null;
  /** Output and drive currents on the way up, at the solver's own points of the periods that it integrated. */
  readonly startTrace: Waveform | null;
  /** Taken from each rail until `startTime`, C and J. */
  readonly railCharge: ReadonlyMap<string, number>;
  readonly railEnergy: ReadonlyMap<string, number>;
  /** Lowest and highest voltage of each capacitor while switching on and off, signed as in the steady figures, V. */
  readonly capacitors:
    | readonly { readonly key: string; readonly lowest: number; readonly highest: number }[]
    | null;
  /** Time to fall below `dischargeLevel` volt with everything off, s; null when nothing discharges it in 115 days. */
  readonly dischargeTime: number | null;
  readonly dischargeLevel: number;
}

export interface RailResult {
  readonly rail: Rail;
  readonly voltage: Band | null;
  readonly ripple: Band | null;
  readonly current: number | null;
  readonly inputCurrent: number | null;
  readonly power: number | null;
  readonly efficiency: number | null;
  readonly headroom: number | null;
  readonly storedEnergy: number | null;
  /** Only of a filter: its part of the load line. */
  readonly filter?: {
    readonly drops: readonly Drop[];
    readonly outputResistance: number | null;
    readonly openCircuit: number | null;
  };
  /** By mode; empty when the board has no modes. */
  readonly modes: ReadonlyMap<string, { readonly voltage: number | null; readonly current: number | null }>;
  readonly pump?: PumpResult;
  /** Of a pump: computed at the first call. */
  readonly transients?: () => Transients | undefined;
  readonly waveform?: () => Waveform | undefined;
  /** From no load to twice the heaviest one, or to `most` ampere. */
  readonly loadLine?: (most?: number, points?: number) => readonly LoadPoint[];
  /** One sentence when something is null. */
  readonly because?: string;
}

export interface PinResult {
  /** `mcu.GP15`. */
  readonly key: string;
  readonly chip: Chip;
  readonly name: string;
  readonly data: PinData;
  /** Resistances used, ohm. */
  readonly highResistance: Figure | null;
  readonly lowResistance: Figure | null;
  /** Worst mode, typical values. */
  readonly sourceAverage: number | null;
  readonly sinkAverage: number | null;
  readonly rms: number | null;
  readonly peakSource: number | null;
  readonly peakSink: number | null;
  /** The same where it carries most over all modes and corners. */
  readonly corner: (DriveFigures & { readonly settings: readonly CornerSetting[] }) | null;
  /** The limit that `use` is measured against, and which of the data sheet's limits it is. */
  readonly limit: Figure | null;
  readonly limitKind: 'recommended' | 'absolute' | null;
  readonly use: number | null;
  /** Drivers of MOSFETs whose gates this pin charges. */
  readonly charges: readonly string[];
  /** Rails whose pump this pin drives. */
  readonly drives: readonly string[];
  /** The same, with the place among the pump's drives and the pin's share of its current. */
  readonly pumps: readonly { readonly railName: string; readonly index: number; readonly share: number }[];
}

export interface GroupResult {
  /** `mcu.port B`. */
  readonly key: string;
  readonly chip: Chip;
  readonly source: number;
  readonly sink: number;
  /** At the corners of its pins that carry most, A. */
  readonly sourceMost: number;
  readonly sinkMost: number;
  readonly sourceLimit: Figure | null;
  readonly sinkLimit: Figure | null;
  readonly use: number | null;
  readonly pins: readonly string[];
}

export interface ChipResult {
  readonly chip: Chip;
  readonly data: ChipData | null;
  readonly voltage: Band | null;
  readonly current: Band | null;
  /** Sums over its pins in the worst mode, A. */
  readonly sourceTotal: number;
  readonly sinkTotal: number;
  /** At the corners of its pins that carry most, A. */
  readonly sourceMost: number;
  readonly sinkMost: number;
  readonly use: number | null;
}

export interface ClockResult {
  readonly clock: Clock;
  readonly frequency: Band | null;
  readonly duty: Band | null;
  readonly high: number | null;
  readonly low: number | null;
}

/** One pump behind a driver, in that pump's heaviest mode. */
export interface DriverUse {
  readonly railName: string;
  /** Place among the pump's drives. */
  readonly index: number;
  readonly mode?: string;
  readonly clock: ClockSource;
  /** Rail that supplies the driver. */
  readonly driverRail: string;
  /** Current of the driver's output into the pump; of a stage of transistors that of the clock into the stage. */
  readonly drive: DriveFigures;
  /** Null for gates, MOSFETs and pins, which have no bases. */
  readonly stage: DriverFigures | null;
  /** Null for all but MOSFETs. */
  readonly gates: GateDrive | null;
  /** Null for all but MOSFETs, and where a gate charge is not known. */
  readonly pair: PairFigures | null;
  /** Average that charging gates takes from the clock, A. */
  readonly gateCurrent: number | null;
  /** Average that the stage takes from its clock, A. */
  readonly clockCurrent: number | null;
}

/** A pair of MOSFETs between the clock and one pump. */
export interface PairFigures {
  /** Heat in both, W. */
  readonly dissipation: number;
  /** Average out of the driver's rail, A. */
  readonly railCurrent: number;
  /** Average that flows through both at once, A, and the same as charge per edge, C: without a load, which makes it less. */
  readonly crossCurrent: number;
  readonly crossCharge: number;
  /** The longer edge of the gates, s. */
  readonly edgeTime: number;
}

export interface DriverResult {
  readonly driver: Driver;
  readonly uses: readonly DriverUse[];
}

export interface RegulatorResult {
  readonly rail: Rail;
  readonly regulator: Regulator;
  readonly input: Band;
  readonly output: Band;
  /** Largest over the modes, A, and that mode. */
  readonly current: number;
  readonly mode?: string;
  /** With the highest input and the lowest output, W; null when its efficiency is not given. */
  readonly heat: number | null;
  /** At the hottest ambient, K; null without a thermal resistance. */
  readonly junction: number | null;
}

export interface SupplyResult {
  readonly supply: Supply;
  readonly voltage: Band | null;
  /** min and max over the modes, typical weighted by their share, A. */
  readonly current: Band | null;
  readonly power: number | null;
  readonly limit: Figure | null;
  readonly use: number | null;
  /** Mode by mode, at typical values and where everything takes most, A; null when not known. */
  readonly modes:
    | readonly { readonly mode?: string; readonly typical: number; readonly most: number }[]
    | null;
  /** Of a supply that runs down: computed at the first call. */
  readonly life?: () => BatteryLife | Gap;
}

/** A measured quantity beside its prediction at the same load. Voltages carry the rail's sign. */
export interface BenchComparison {
  /** What was read, no finer than instruments read. */
  readonly measured: Band;
  /** Typical values, and the lowest and highest corner. */
  readonly predicted: Band;
  /** Measured minus predicted, V. */
  readonly deviation: number;
  /** V beyond the nearer end of the predicted band, with the deviation's sign; 0 inside it. */
  readonly outside: number;
}

/** One quantity away from its typical value, so that the prediction meets what was measured. */
export interface BenchMove {
  /** In the user's words, as in `CornerSetting`. */
  readonly label: string;
  readonly path: string;
  readonly unit: Unit;
  readonly value: number;
  readonly typical: number;
  /** The end of its band on that side. */
  readonly end: number;
  /** Part of the way from typical to that end; more than 1 has left the band. */
  readonly share: number;
  /** What it was moved for, and whether the other measured figure comes in with it. */
  readonly explains: 'voltage' | 'ripple';
  readonly both: boolean;
}

export interface BenchExplanation {
  /** Within tolerance: alternatives, most plausible first; with `together` all of them at once. */
  readonly moves: readonly BenchMove[];
  readonly together: boolean;
  /** When no two quantities do: the part of the way to the corner that all have to go at once. */
  readonly all: number | null;
  /** For what lies outside the band: single quantities that would have to leave theirs, the least far first. */
  readonly beyond: readonly BenchMove[];
}

/** An entry of `bench` against the prediction at its own load. */
export interface BenchResult {
  readonly point: BenchPoint;
  /** Absent when the board has no such rail. */
  readonly rail?: Rail;
  /** The mode in which the rest of the board counts; absent for a board without modes. */
  readonly mode?: string;
  readonly predicted: { readonly voltage: Band; readonly ripple: Band | null } | null;
  /** Null when not measured or not predicted. */
  readonly voltage: BenchComparison | null;
  readonly ripple: BenchComparison | null;
  /** Null when nothing could be compared. */
  readonly inside: boolean | null;
  /** Computed at the first call. */
  readonly explanation?: () => BenchExplanation;
  /** Clauses: what usually makes such a difference on a bench; empty for what lies inside the band. */
  readonly causes?: (of: 'voltage' | 'ripple') => readonly string[];
  /** One clause when nothing is predicted. */
  readonly because?: string;
}

export interface BoardAnalysis {
  readonly text: string;
  readonly file: string;
  readonly reading: BoardReading;
  readonly rails: ReadonlyMap<string, RailResult>;
  readonly pins: ReadonlyMap<string, PinResult>;
  readonly groups: ReadonlyMap<string, GroupResult>;
  readonly chips: ReadonlyMap<string, ChipResult>;
  readonly clocks: ReadonlyMap<string, ClockResult>;
  readonly drivers: ReadonlyMap<string, DriverResult>;
  /** By the rail that they make. */
  readonly regulators: ReadonlyMap<string, RegulatorResult>;
  readonly supplies: ReadonlyMap<string, SupplyResult>;
  /** In the order of the file, computed at the first call. */
  readonly bench: () => readonly BenchResult[];
  /** Worst of all pumps. */
  readonly balance: number | null;
  /** What the computation itself has to say: missing data, no convergence, figures assumed. */
  readonly problems: readonly Finding[];
}
