/**
 * What the product says about a board: one closed list of codes, and findings as plain data.
 * Callers branch on `code`, never on the sentence.
 */
import type { TextEdit } from '../text/edit';
import type { Span } from '../text/span';

export const findingCodes = [
  'syntax',
  'unknown-key',
  'missing-key',
  'unknown-name',
  'duplicate-name',
  'bad-quantity',
  'wrong-unit',
  'rail-cycle',
  'include-failed',
  'rail-low',
  'rail-high',
  'ripple-high',
  'start-slow',
  'rail-stalls',
  'pin-over-absolute',
  'pin-over-recommended',
  'group-over-limit',
  'chip-over-limit',
  'pin-peak',
  'supply-over-limit',
  'regulator-dropout',
  'regulator-over-limit',
  'regulator-hot',
  'battery-short-life',
  'driver-starved',
  'driver-shared-base',
  'driver-shoot-through',
  'driver-over-limit',
  'clock-level',
  'clock-frequency',
  'clock-unreachable',
  'capacitor-rating',
  'capacitor-polarity',
  'capacitor-derated',
  'capacitor-ripple-current',
  'diode-reverse',
  'diode-current',
  'inrush-pin',
  'inrush-supply',
  'stored-charge',
  'over-60-volts',
  'load-voltage',
  'chip-voltage',
  'bench-disagrees',
  'waiver-stale',
  'not-converged',
  'assumed',
  'unused',
  'not-computed',
] as const;

export type FindingCode = (typeof findingCodes)[number];
export type Severity = 'error' | 'warning' | 'information';

export interface Related {
  readonly span: Span;
  readonly message: string;
}

export interface Fix {
  readonly title: string;
  readonly edits: readonly TextEdit[];
  readonly preferred: boolean;
}

export interface Finding {
  readonly code: FindingCode;
  readonly severity: Severity;
  /** Dotted path: `rails.v6.pump.flying`. */
  readonly at: string;
  readonly span: Span;
  readonly message: string;
  /** What the limit or the need is, in words with unit. */
  readonly expected?: string;
  readonly actual?: string;
  /** Where the limit comes from. */
  readonly source?: string;
  readonly related?: readonly Related[];
  readonly fixes?: readonly Fix[];
}

/** A finding that the file accepts on purpose. */
export interface Waived {
  readonly finding: Finding;
  readonly because: string;
  /** A date, or a remark such as `rev D`. */
  readonly until?: string;
}
