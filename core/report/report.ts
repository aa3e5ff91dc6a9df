/**
 * The report: plain numbers in SI units under the names that outside readers rely on.
 * `null` means not computed (a finding says why); it is never replaced by 0.
 */
import type { FindingCode, Severity } from '../checks/finding';
import type { Band } from '../quantity/figure';

export interface Drop {
  readonly in: string;
  readonly volts: number;
}

export interface RailReport {
  readonly voltage: Band | null;
  /** Peak to peak. */
  readonly ripple: Band | null;
  /** Average into the loads, ampere. */
  readonly current: number | null;
  /** Average out of the rail it stands on, ampere. */
  readonly inputCurrent: number | null;
  readonly power: number | null;
  readonly efficiency: number | null;
  /** Intercept of the load line at the operating point. */
  readonly openCircuit: number | null;
  readonly outputResistance: number | null;
  /** Volts left at the worst corner above the lower edge of `needs.voltage` and above what `needs.swing` asks (in magnitude). */
  readonly headroom: number | null;
  readonly drops: readonly Drop[] | null;
  readonly startTime: number | null;
  readonly dischargeTime: number | null;
  readonly storedEnergy: number | null;
  readonly modes: Readonly<
    Record<string, { readonly voltage: number | null; readonly current: number | null }>
  >;
}

export interface PinReport {
  readonly sourceAverage: number | null;
  readonly sinkAverage: number | null;
  readonly rms: number | null;
  readonly peakSource: number | null;
  readonly peakSink: number | null;
  readonly inrushPeak: number | null;
  readonly limit: number | null;
  /** Share of the limit that is used, 1 = at the limit. */
  readonly use: number | null;
}

export interface GroupReport {
  readonly source: number | null;
  readonly sink: number | null;
  readonly use: number | null;
}

export interface ChipReport {
  readonly voltage: Band | null;
  readonly current: Band | null;
  readonly sourceTotal: number | null;
  readonly sinkTotal: number | null;
  readonly use: number | null;
}

export interface ClockReport {
  readonly frequency: Band | null;
  readonly duty: Band | null;
  readonly high: number | null;
  readonly low: number | null;
}

export interface DriverReport {
  readonly baseCurrent: number | null;
  readonly forcedGain: number | null;
  readonly dissipation: number | null;
  readonly inputCurrent: number | null;
}

export interface SupplyReport {
  readonly current: Band | null;
  readonly power: number | null;
  readonly use: number | null;
  /** s at typical values; null for what does not run down. */
  readonly life: number | null;
}

/** Capacitors have voltage, rmsCurrent, effective; diodes have reverse, average, peak. */
export type PartReport =
  | {
      readonly voltage: number | null;
      readonly rmsCurrent: number | null;
      readonly effective: number | null;
    }
  | { readonly reverse: number | null; readonly average: number | null; readonly peak: number | null };

/** One quantity that, moved within its tolerance, would explain a measurement. */
export interface BenchMoveReport {
  readonly by: string;
  /** Path of the place in the file that it belongs to. */
  readonly at: string;
  readonly value: number;
  readonly unit: string;
  readonly typical: number;
  /** Which of the two measured figures it brings to the prediction. */
  readonly explains: 'voltage' | 'ripple' | 'both';
}

/** A measured point against the prediction at the same load. */
export interface BenchReport {
  readonly rail: string | null;
  readonly load: number | null;
  readonly unit: 'A' | 'ohm' | null;
  readonly measured: { readonly voltage: number | null; readonly ripple: number | null };
  readonly predicted: { readonly voltage: Band | null; readonly ripple: Band | null };
  /** Measured minus predicted, typical values. */
  readonly deviation: { readonly voltage: number | null; readonly ripple: number | null };
  /** True when all that was measured lies between the corners. */
  readonly inside: boolean | null;
  /** Alternatives, most plausible first; with `together` all of them at once. */
  readonly explained: readonly BenchMoveReport[];
  readonly together: boolean;
  readonly note: string | null;
}

export interface Position {
  /** 1-based. */
  readonly line: number;
  /** 1-based, UTF-16 code units. */
  readonly column: number;
  readonly offset: number;
}

export interface FindingReport {
  readonly code: FindingCode;
  readonly severity: Severity;
  readonly at: string;
  readonly range: { readonly start: Position; readonly end: Position };
  readonly message: string;
  readonly expected: string | null;
  readonly actual: string | null;
  readonly source: string | null;
  readonly fixes: readonly {
    readonly title: string;
    readonly edits: readonly { readonly start: number; readonly end: number; readonly text: string }[];
  }[];
}

export interface Report {
  readonly format: 1;
  readonly tool: string;
  readonly file: string;
  readonly board: string | null;
  readonly rails: Readonly<Record<string, RailReport>>;
  readonly pins: Readonly<Record<string, PinReport>>;
  readonly groups: Readonly<Record<string, GroupReport>>;
  readonly chips: Readonly<Record<string, ChipReport>>;
  readonly clocks: Readonly<Record<string, ClockReport>>;
  readonly drivers: Readonly<Record<string, DriverReport>>;
  readonly supplies: Readonly<Record<string, SupplyReport>>;
  readonly parts: Readonly<Record<string, PartReport>>;
  /** In the order of the file. */
  readonly bench: readonly BenchReport[];
  /** |power in - power out - losses| / power in, the worst of all pumps. */
  readonly balance: number | null;
  readonly findings: readonly FindingReport[];
  /** Findings that the file accepts on purpose; they do not stand in `findings`. */
  readonly waived: readonly (FindingReport & { readonly because: string; readonly until: string | null })[];
}
