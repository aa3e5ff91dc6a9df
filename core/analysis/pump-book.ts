/**
 * Collects the variables of a pump, and for each part how it reads its values and how it is tied to the engine.
 */
import type { Parameter } from '../engine';
import type { PumpNetwork } from '../pump/network';
import type { Band, Unit } from '../quantity/figure';
import type { Contribution, Variable } from './pump-model';

/** Values of all variables at a point. */
export type Point = readonly number[];

/** Ties a variable to a parameter; the weight is 1/value (relative parameters) when left out. */
export type Tie = (variable: number | undefined, parameter: Parameter, weight?: number) => void;

type Tying = (point: Point, at: PumpNetwork, tie: Tie) => void;

/** Labels under which a pump's model holds a rail's voltage and its source resistance. */
export const railLabel = (name: string): string => `rail ${name}`;
export const sourceLabel = (name: string): string => `rail ${name} source resistance`;

export class Book {
  readonly variables: Variable[] = [];
  readonly #rails = new Map<string, number>();
  readonly #ties: Tying[] = [];

  add(
    label: string,
    path: string,
    unit: Unit,
    { min, typical, max }: Band,
    traits: Pick<Variable, 'draws' | 'sharpens'> = {},
  ): number {
    return this.variables.push({ label, path, unit, band: { min, typical, max }, ...traits }) - 1;
  }

  /** A quantity that costs current but moves neither the voltage nor the ripple; a larger one costs more. */
  still(label: string, path: string, unit: Unit, { min, typical, max }: Band): number {
    const band = { min, typical, max };
    return this.variables.push({ label, path, unit, band, draws: 1, still: true }) - 1;
  }

  /** A rail that serves twice is one variable, since it cannot sit at both ends of its band. */
  rail(name: string, band: Band): number {
    const known = this.#rails.get(name);
    if (known !== undefined) return known;
    const index = this.add(railLabel(name), `rails.${name}`, 'V', band);
    this.#rails.set(name, index);
    return index;
  }

  /** Says how a part's variables reach the engine. */
  ties(tying: Tying): void {
    this.#ties.push(tying);
  }

  contributions(point: Point, at: PumpNetwork): Contribution[] {
    const list: Contribution[] = [];
    const tie: Tie = (variable, parameter, weight) => {
      if (variable === undefined) return;
      const each = weight ?? 1 / point[variable]!;
      if (Number.isFinite(each) && each !== 0) list.push({ variable, parameter, weight: each });
    };
    for (const tying of this.#ties) tying(point, at, tie);
    return list;
  }
}
