/**
 * A pump with every quantity that it depends on as a named variable with its band, so that corners, derivatives
 * and explanations all speak of the same things.
 */
import type { Parameter } from '../engine';
import type { PumpNetwork } from '../pump/network';
import type { PumpValues } from '../pump/values';
import type { Band, Unit } from '../quantity/figure';

export interface Variable {
  readonly label: string;
  readonly path: string;
  readonly unit: Unit;
  readonly band: Band;
  /** Of a load: +1 when a larger value draws more current, -1 when it draws less. */
  readonly draws?: 1 | -1;
  /** -1 when a smaller value makes the same charge flow in shorter and higher pulses. */
  readonly sharpens?: -1;
  /** True when it moves neither the voltage nor the ripple, only what the pump takes from its sources. */
  readonly still?: true;
}

/** How an engine parameter moves with a variable: `d parameter / d variable` at the given point. */
export interface Contribution {
  readonly variable: number;
  readonly parameter: Parameter;
  readonly weight: number;
}

export interface PumpModel {
  readonly variables: readonly Variable[];
  /** Values of the pump at a point: one number for each variable. */
  values(point: readonly number[]): PumpValues;
  contributions(point: readonly number[], at: PumpNetwork): readonly Contribution[];
  /** Report keys of the parts, in the order of the network. */
  readonly keys: {
    readonly flying: readonly string[];
    readonly smoothing: readonly string[];
    readonly reservoir: string;
    readonly diodes: readonly string[];
  };
}

export const typicalPoint = (model: PumpModel): number[] => model.variables.map((v) => v.band.typical);

export const hasBand = (variable: Variable): boolean => variable.band.max > variable.band.min;
