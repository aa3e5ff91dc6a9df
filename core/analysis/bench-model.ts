/**
 * A rail with the load that stood on it at the bench, and nothing else: the quantities that its voltage depends on,
 * and what it comes to at any values of them.
 */
import type { Board, Pump } from '../model/board';
import type { Band, Unit } from '../quantity/figure';
import type { Memory } from './memory';
import { once } from './once';
import type { Target } from './pump-corners';
import type { Variable } from './pump-model';
import type { RailVoltages } from './rail-voltages';

/** The board that was measured, as far as it is computed. */
export interface BenchSite {
  readonly board: Board;
  readonly solved: RailVoltages;
  readonly memory: Memory;
}

export interface BenchReading {
  readonly voltage: number;
  /** Null for a rail that no pump makes. */
  readonly ripple: number | null;
  /** Change per unit of each variable; NaN where only trying tells. */
  readonly slopes: Readonly<Record<Target, readonly number[]>>;
}

export interface BenchModel {
  readonly variables: readonly Variable[];
  readonly mode: string | undefined;
  /** The pump that makes the rail, or feeds its filter. */
  readonly pump?: Pump;
  /** Solved at the first call: the bands need no derivatives. */
  typical(): BenchReading;
  /** With the variables at `values`; undefined where no steady state is found. */
  at(values: readonly number[]): BenchReading | undefined;
  /** Typical values and extremes over tolerance and temperature. */
  bands(): { readonly voltage: Band; readonly ripple: Band | null };
  /** Voltage at typical values with an instrument of that resistance beside the load; undefined where not solved. */
  withProbe(ohms: number): number | undefined;
}

/** A closed form that rises or falls steadily with each variable, so that its extremes are at ends of bands. */
export function plainModel(
  variables: readonly Variable[],
  volts: (values: readonly number[]) => number,
): BenchModel {
  const read = (values: readonly number[]): BenchReading => ({
    voltage: volts(values),
    ripple: null,
    slopes: { voltage: slopesOf(volts, values), ripple: values.map(() => 0) },
  });
  const typical = once(() => read(typicals(variables)));
  const ends = variables.reduce<number[][]>(
    (points, { band }) => points.flatMap((point) => [band.min, band.max].map((end) => [...point, end])),
    [[]],
  );
  const extremes = ends.map(volts);
  return {
    variables,
    mode: undefined,
    typical,
    at: read,
    bands: () => ({
      voltage: {
        min: Math.min(...extremes),
        typical: volts(typicals(variables)),
        max: Math.max(...extremes),
      },
      ripple: null,
    }),
    // What gives way by ohms does not feel megohms.
    withProbe: () => volts(typicals(variables)),
  };
}

function slopesOf(volts: (values: readonly number[]) => number, at: readonly number[]): number[] {
  return at.map((value, k) => {
    const step = 1e-5 * Math.max(Math.abs(value), 1e-3);
    const moved = (by: number) => volts(at.map((other, n) => (n === k ? other + by : other)));
    return (moved(step) - moved(-step)) / (2 * step);
  });
}

export function variable(label: string, path: string, unit: Unit, { min, typical, max }: Band): Variable {
  return { label, path, unit, band: { min, typical, max } };
}

export function typicals(variables: readonly Variable[]): number[] {
  return variables.map(({ band }) => band.typical);
}
