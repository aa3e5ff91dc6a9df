/**
 * The board as typed data: every section of `rails.yaml` with the place in the text where each thing stands.
 * Built from any text, however broken: what could not be read is absent here and stands in the issues.
 */
import type {
  BatteryData,
  CapacitorKind,
  ChipData,
  DiodeData,
  GateData,
  MosfetData,
  SupplyData,
  TimerData,
  TransistorData,
} from '../catalog/part';
import type { Figure } from '../quantity/figure';
import type { Span } from '../text/span';

/** A name written in the file that points to something else. */
export interface Ref {
  readonly name: string;
  readonly span: Span;
}

/** A resolved use of part data; `ref` is absent when the figures stand in place. */
export interface Use<T> {
  readonly ref?: Ref;
  readonly span: Span;
  /** Absent when the name is unknown or the figures in place are incomplete (an issue says so). */
  readonly data?: T;
}

/** Every named entry: where its name stands, and the whole entry, and its dotted path. */
export interface Entry {
  readonly name: string;
  readonly nameSpan: Span;
  readonly span: Span;
  /** Dotted path as findings use it: `rails.v6`. */
  readonly path: string;
  /** Spans of the keys that were written, by key: where a finding about a missing effect can point. */
  readonly keys: ReadonlyMap<string, Span>;
}

export interface Supply extends Entry {
  readonly standard?: Use<SupplyData>;
  readonly battery?: Use<BatteryData>;
  readonly cells?: Figure;
  readonly voltage?: Figure;
  readonly current?: Figure;
  readonly resistance?: Figure;
  readonly capacity?: Figure;
  /** Time that it must last. */
  readonly life?: Figure;
  readonly bulk?: Figure;
}

/** A current, in all modes or in the one named. */
export interface Draw {
  readonly mode?: Ref;
  readonly current: Figure;
}

export interface ChipPin extends Entry {
  /** Drive setting as written, for example `12 mA`. */
  readonly strength?: Ref;
  readonly sources?: Figure;
  readonly sinks?: Figure;
}

export interface Chip extends Entry {
  readonly part?: Use<ChipData>;
  readonly rail?: Ref;
  readonly draws: readonly Draw[];
  readonly pins: ReadonlyMap<string, ChipPin>;
}

/** `mcu.GP15`, split; `span` covers the whole. */
export interface PinRef {
  readonly chip: string;
  readonly pin: string;
  readonly span: Span;
}

export interface TimerRegisters {
  readonly span: Span;
  readonly input?: Figure;
  readonly prescaler?: Figure;
  readonly top?: Figure;
  readonly compare?: Figure;
}

export interface Clock extends Entry {
  readonly pin?: PinRef;
  readonly frequency?: Figure;
  /** Share of the period that the output is high, 0..1. */
  readonly duty?: Figure;
  readonly timer?: TimerRegisters;
  readonly astable?: {
    readonly span: Span;
    readonly charge?: Figure;
    readonly discharge?: Figure;
    readonly timing?: Figure;
    readonly part?: Use<TimerData>;
  };
  readonly schmitt?: {
    readonly span: Span;
    readonly resistor?: Figure;
    readonly capacitor?: Figure;
    readonly part?: Use<GateData>;
  };
  readonly external?: {
    readonly span: Span;
    readonly frequency?: Figure;
    readonly duty?: Figure;
    readonly high?: Figure;
    readonly low?: Figure;
    readonly resistance?: Figure;
  };
  readonly rail?: Ref;
  readonly rise?: Figure;
  readonly fall?: Figure;
  readonly inverseOf?: Ref;
}

export type DriverStage =
  | {
      readonly kind: 'push-pull';
      readonly span: Span;
      readonly npn?: Use<TransistorData>;
      readonly pnp?: Use<TransistorData>;
      readonly base?: { readonly npn?: Figure; readonly pnp?: Figure };
      readonly sharedBase?: Figure;
    }
  | {
      readonly kind: 'follower';
      readonly span: Span;
      readonly npn?: Use<TransistorData>;
      readonly pnp?: Use<TransistorData>;
    }
  | {
      readonly kind: 'mosfet-pair';
      readonly span: Span;
      readonly nmos?: Use<MosfetData>;
      readonly pmos?: Use<MosfetData>;
      readonly gate?: Figure;
    }
  | {
      readonly kind: 'gates';
      readonly span: Span;
      readonly part?: Use<GateData>;
      readonly parallel?: Figure;
    }
  | { readonly kind: 'pins'; readonly span: Span; readonly pins: readonly PinRef[] };

export interface Driver extends Entry {
  readonly input?: Ref;
  readonly rail?: Ref;
  readonly stage?: DriverStage;
}

export interface Capacitor {
  readonly span: Span;
  /** Dotted path: `rails.v6.pump.flying` or, in a list, `rails.v6.pump.flying[0]`. */
  readonly path: string;
  /** Nominal value; the band holds what the file said, the kind's tolerance is not in it yet. */
  readonly value?: Figure;
  /** True when the file itself gave a band for the value. */
  readonly toleranceGiven: boolean;
  readonly kind: Use<CapacitorKind> & { readonly assumed: boolean };
  readonly rated?: Figure;
  /** From the file, or the kind's typical value (origin says which). */
  readonly esr?: Figure;
  /** Rated ripple current, rms, A. */
  readonly ripple?: Figure;
  readonly size?: Ref;
  readonly negativeTo?: Ref;
}

export interface Diode extends Use<DiodeData> {
  readonly path: string;
}

export type Topology = 'doubler' | 'multiplier' | 'ladder' | 'inverter';

export interface Pump {
  readonly span: Span;
  readonly keys: ReadonlyMap<string, Span>;
  readonly topology?: Topology;
  readonly topologySpan?: Span;
  readonly stages?: Figure;
  readonly polarity: 'positive' | 'negative';
  /** A rail's name, or `ground`. */
  readonly input?: Ref;
  /** Clocks or drivers, one or two. */
  readonly drive: readonly Ref[];
  readonly flying: readonly Capacitor[];
  readonly smoothing: readonly Capacitor[];
  readonly reservoir?: Capacitor;
  /** One for all positions, or one for each. */
  readonly diodes: readonly Diode[];
  readonly series?: Figure;
}

export interface Regulator {
  readonly span: Span;
  readonly keys: ReadonlyMap<string, Span>;
  readonly from?: Ref;
  readonly output?: Figure;
  readonly dropout?: Figure;
  readonly ground?: Figure;
  readonly limit?: Figure;
  readonly kind?: 'linear' | 'switching';
  readonly efficiency?: Figure;
  readonly thermal?: Figure;
}

export interface Filter {
  readonly span: Span;
  readonly keys: ReadonlyMap<string, Span>;
  readonly from?: Ref;
  readonly resistor?: Figure;
  readonly inductor?: Figure;
  readonly capacitor?: Capacitor;
}

export type RailOrigin =
  | { readonly kind: 'supply'; readonly supply: Ref }
  | { readonly kind: 'regulator'; readonly regulator: Regulator }
  | { readonly kind: 'pump'; readonly pump: Pump }
  | { readonly kind: 'filter'; readonly filter: Filter };

export interface Needs {
  readonly span: Span;
  readonly keys: ReadonlyMap<string, Span>;
  /** The window the rail must stay in; signed as the rail is. `typical` has no meaning here. */
  readonly voltage?: Figure;
  readonly ripple?: Figure;
  readonly start?: Figure;
  readonly swing?: Figure;
  readonly headroom?: Figure;
  readonly discharge?: Figure;
}

export interface Load extends Entry {
  readonly current?: Figure;
  readonly resistance?: Figure;
  readonly power?: Figure;
  /** Modes in which it draws; absent: all. */
  readonly modes?: readonly Ref[];
  readonly least?: Figure;
  readonly most?: Figure;
  readonly amplifier?: {
    readonly span: Span;
    readonly quiescent?: Figure;
    readonly output?: Figure;
    readonly count?: Figure;
  };
}

export interface Rail extends Entry {
  readonly origin?: RailOrigin;
  readonly needs?: Needs;
  readonly loads: ReadonlyMap<string, Load>;
  readonly bleeder?: Figure;
}

export interface Mode extends Entry {
  /** Share of the time, 0..1. */
  readonly share?: Figure;
}

export interface BenchPoint {
  readonly span: Span;
  readonly path: string;
  readonly rail?: Ref;
  readonly load?: Figure;
  readonly voltage?: Figure;
  readonly ripple?: Figure;
  readonly note?: string;
}

export interface Waiver {
  readonly span: Span;
  readonly path: string;
  readonly finding?: Ref;
  readonly at?: Ref;
  readonly because?: string;
  readonly until?: string;
}

/** What may be used when a rail is sized; a key that is left out has a usual value. */
export interface Stock {
  readonly series?: 'E3' | 'E6' | 'E12' | 'E24';
  /** F. */
  readonly capacitors?: readonly number[];
  readonly kinds?: readonly CapacitorKind[];
  /** V. */
  readonly rated?: readonly number[];
  readonly diodes?: readonly DiodeData[];
  readonly transistors?: readonly TransistorData[];
  readonly gates?: readonly GateData[];
  readonly mosfets?: readonly MosfetData[];
  readonly stages?: Figure;
  /** Hz. */
  readonly frequencies?: readonly number[];
  readonly preferred?: readonly string[];
  readonly rails?: readonly string[];
}

/** A file with shared parts, as written. */
export interface Include extends Ref {
  readonly path: string;
}

export interface Board {
  readonly title?: string;
  readonly titleSpan?: Span;
  /** Kelvin; absent in the file: 25 degC exactly, origin `assumed`. */
  readonly ambient: Figure;
  readonly supplies: ReadonlyMap<string, Supply>;
  readonly chips: ReadonlyMap<string, Chip>;
  readonly clocks: ReadonlyMap<string, Clock>;
  readonly drivers: ReadonlyMap<string, Driver>;
  readonly rails: ReadonlyMap<string, Rail>;
  readonly modes: ReadonlyMap<string, Mode>;
  readonly bench: readonly BenchPoint[];
  readonly waivers: readonly Waiver[];
  readonly stock: Stock;
  readonly includes: readonly Include[];
}
