/**
 * The shapes of part data: the same for the catalogue's own entries and for `parts` in the user's file.
 * Figures hold at 25 degC. A figure that nobody gave is absent, never zero.
 */
import type { Figure } from '../quantity/figure';

export interface PartEntry {
  /** Key used in `rails.yaml`. */
  readonly key: string;
  /** A few words for people. */
  readonly title: string;
  /** Where the entry as a whole comes from. */
  readonly source: string;
}

/** One line of a data sheet's output table: at this current the pin sits at this voltage. */
export interface TestPoint {
  /** Magnitude, ampere. */
  readonly current: Figure;
  /** Voltage of the pin against ground. */
  readonly voltage: Figure;
  /** Supply at which the line holds; for `high` the drop is `supply - voltage`. */
  readonly supply: Figure;
}

export interface PinData {
  readonly highResistance?: Figure;
  readonly lowResistance?: Figure;
  readonly high?: readonly TestPoint[];
  readonly low?: readonly TestPoint[];
  /** Current at which the data sheet still guarantees the levels. */
  readonly recommended?: Figure;
  /** Absolute maximum rating of the pin's current. */
  readonly absolute?: Figure;
  /** Named drive settings, for example `12 mA`. */
  readonly strengths?: Readonly<Record<string, PinData>>;
}

export interface PinGroup {
  readonly name: string;
  readonly pins: readonly string[];
  readonly source?: Figure;
  readonly sink?: Figure;
}

export interface ChipData extends PartEntry {
  readonly supply?: Figure;
  /** Holds for every pin without an entry of its own. */
  readonly pins: PinData;
  readonly pin: Readonly<Record<string, PinData>>;
  /** Names of the pins that can drive something, as the maker writes them; absent: not listed here. */
  readonly names?: readonly string[];
  readonly groups: readonly PinGroup[];
  readonly total: { readonly source?: Figure; readonly sink?: Figure };
  readonly draws?: Figure;
}

export interface DiodeData extends PartEntry {
  readonly kind: 'silicon' | 'schottky';
  readonly saturation: Figure;
  readonly ideality: Figure;
  readonly resistance: Figure;
  readonly junction?: Figure;
  readonly reverse?: Figure;
  readonly average?: Figure;
  readonly peak?: Figure;
  readonly leakage?: Figure;
}

export interface CapacitorKind extends PartEntry {
  /** Relative change of the value, for example min -0.2, max 0.2. */
  readonly tolerance: Figure;
  /** Relative change of the value over the kind's own temperature range. */
  readonly temperature?: Figure;
  /** Value left, as a share, at a share of the rating: `[{ share: 0.5, left: 0.6 }]`. */
  readonly bias?: readonly { readonly share: number; readonly left: Figure }[];
  /** Loss factor at 120 Hz, from which ESR follows when `esr` is not given. */
  readonly loss?: Figure;
  readonly esr?: Figure;
  /** Leakage current at the rated voltage. */
  readonly leakage?: Figure;
  /** Leakage current over capacitance and voltage, 1/s: `0.01` is the rule of 0.01 uA per uF and V. */
  readonly leakageRate?: Figure;
  /** Heat that a part of usual size bears, W: what its ripple current is judged by without a rating of its own. */
  readonly heat?: Figure;
  readonly polarised: boolean;
}

export interface TransistorData extends PartEntry {
  readonly polarity: 'npn' | 'pnp';
  readonly saturation: Figure;
  readonly gain: Figure;
  readonly reverseGain?: Figure;
  readonly baseResistance?: Figure;
  readonly collectorResistance?: Figure;
  readonly emitterResistance?: Figure;
  readonly storage?: Figure;
  readonly current?: Figure;
}

export interface MosfetData extends PartEntry {
  readonly channel: 'n' | 'p';
  readonly threshold: Figure;
  readonly onResistance: Figure;
  readonly gateCharge?: Figure;
  /** Gate voltage at which resistance and charge hold, magnitude. */
  readonly gateVoltage?: Figure;
  readonly current?: Figure;
}

export interface GateData extends PartEntry {
  readonly supply?: Figure;
  readonly output: PinData;
  readonly absolute?: Figure;
  readonly total?: Figure;
  readonly rising?: Figure;
  readonly falling?: Figure;
  /** Supply at which `rising` and `falling` hold; at another supply they move in proportion. */
  readonly thresholdSupply?: Figure;
  readonly draws?: Figure;
}

export interface TimerData extends PartEntry {
  readonly supply?: Figure;
  readonly highDrop?: Figure;
  readonly highResistance?: Figure;
  readonly lowVoltage?: Figure;
  readonly lowResistance?: Figure;
  readonly draws?: Figure;
  readonly fastest?: Figure;
}

/** Energy entering the board: standards of ports and kinds of batteries. */
export interface SupplyData extends PartEntry {
  readonly voltage: Figure;
  readonly current?: Figure;
  readonly resistance?: Figure;
  readonly bulk?: Figure;
}

/** Open voltage of a cell at a share of its usable charge left, 1 full and 0 empty. */
export interface OpenPoint {
  readonly left: number;
  readonly volts: Figure;
}

/** Internal resistance of a cell at a share of its usable charge left. */
export interface ResistancePoint {
  readonly left: number;
  readonly ohms: Figure;
}

/** One cell of a kind of battery: a supply that runs down. */
export interface BatteryData extends SupplyData {
  /** Nameplate. */
  readonly capacity: Figure;
  /** Part of the nameplate that may be counted on. */
  readonly usable: Figure;
  /** Share of the nameplate that a cell loses by itself in a year of 8760 h. */
  readonly selfDischarge: Figure;
  /** From full to empty, straight lines between. */
  readonly openVoltage: readonly OpenPoint[];
  /** From full to empty, straight lines between. `resistance` is the one figure for a cell of unknown state. */
  readonly agedResistance: readonly ResistancePoint[];
  /** What can go wrong with it, in plain words. */
  readonly caution: string;
}

export interface Catalogue {
  readonly chips: readonly ChipData[];
  readonly diodes: readonly DiodeData[];
  readonly capacitors: readonly CapacitorKind[];
  readonly transistors: readonly TransistorData[];
  readonly mosfets: readonly MosfetData[];
  readonly gates: readonly GateData[];
  readonly timers: readonly TimerData[];
  readonly standards: readonly SupplyData[];
  /** Per cell. */
  readonly batteries: readonly BatteryData[];
}
