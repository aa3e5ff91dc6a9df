/**
 * A number with its unit, its tolerance band and the place it comes from: the only form in which
 * figures of the user's file and of the catalogue travel through the core.
 */
import type { Span } from '../text/span';

/** `min <= typical <= max`, SI units. */
export interface Band {
  readonly min: number;
  readonly typical: number;
  readonly max: number;
}

/** SI unit symbols in which values are kept inside; temperatures are kelvin, charge capacity is coulomb. */
export type Unit = 'V' | 'A' | 'ohm' | 'F' | 'H' | 'Hz' | 's' | 'K' | 'W' | 'C' | 'K/W' | 'S' | '1';

/** Where a figure comes from; `note` names the data sheet, standard or reason in words. */
export interface Origin {
  readonly kind:
    | 'file'
    | 'data sheet'
    | 'standard'
    | 'common practice'
    | 'from memory: confirm'
    | 'derived'
    | 'assumed';
  readonly note?: string;
  /** Test conditions, in words: `VCC = 5 V, 25 degC`. */
  readonly conditions?: string;
}

export interface Figure extends Band {
  readonly unit: Unit;
  readonly origin: Origin;
  /** Present when the figure stands in the user's file. */
  readonly span?: Span;
}

export function exactly(value: number): Band {
  return { min: value, typical: value, max: value };
}

export function figure(band: Band | number, unit: Unit, origin: Origin, span?: Span): Figure {
  const { min, typical, max } = typeof band === 'number' ? exactly(band) : band;
  return span === undefined ? { min, typical, max, unit, origin } : { min, typical, max, unit, origin, span };
}
