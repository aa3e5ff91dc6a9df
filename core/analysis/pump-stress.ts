/**
 * Each part of a pump beside what it bears: in the heaviest mode at typical values, and at most over all modes and
 * corners that were solved.
 */
import type { Capacitor, Diode } from '../model/board';
import type { CapacitorFigures, DiodeFigures, PumpPoint, PumpResult, RailResult } from './types';

export interface StressedCapacitor {
  readonly capacitor: Capacitor;
  readonly figures: CapacitorFigures;
  /** Largest over all corners: voltage in magnitude, V, rms current, A, and heat, W. */
  readonly highest: number;
  readonly highestRms: number;
  readonly highestHeat: number;
  /** Smallest value that works at any corner, F. */
  readonly leastEffective: number;
}

export interface StressedDiode {
  readonly diode: Diode;
  readonly figures: DiodeFigures;
  /** Largest over all corners. */
  readonly highest: number;
  readonly highestAverage: number;
  readonly highestPeak: number;
}

/** Every operating point of a pump that was solved: all modes at typical values, and all corners. */
export function solvedPoints(pump: PumpResult): readonly PumpPoint[] {
  const ends = [pump.voltage.lowest, pump.voltage.highest, pump.ripple.lowest, pump.ripple.highest];
  return [
    ...pump.points,
    ...ends.flatMap(({ point }) => (point ? [point] : [])),
    ...pump.draws.flatMap(({ most, least, sharpest }) =>
      [most, least, sharpest].flatMap((each) => (each ? [each.point] : [])),
    ),
  ];
}

export interface StressedParts {
  readonly capacitors: readonly StressedCapacitor[];
  readonly diodes: readonly StressedDiode[];
}

/** Several rules ask for the same rail. */
const known = new WeakMap<RailResult, StressedParts>();

/** Empty for rails that no pump makes. A part that serves several stages comes once for each of them. */
export function stressedParts(result: RailResult): StressedParts {
  const found = known.get(result) ?? stressOf(result);
  known.set(result, found);
  return found;
}

function stressOf({ rail, pump }: RailResult): StressedParts {
  const origin = rail.origin?.kind === 'pump' ? rail.origin.pump : undefined;
  if (!origin || !pump) return { capacitors: [], diodes: [] };
  const points = solvedPoints(pump);
  const find = <T>(list: readonly T[], index: number) => (list.length === 1 ? list[0] : list[index]);
  return {
    capacitors: pump.heaviest.capacitors.flatMap((figures, k) => {
      const { column, index } = placeOf(figures.key);
      const list =
        column === 'reservoir'
          ? origin.reservoir
            ? [origin.reservoir]
            : []
          : column === 'smoothing' && origin.smoothing.length > 0
            ? origin.smoothing
            : origin.flying;
      const capacitor = find(list, index);
      if (!capacitor) return [];
      const most = (of: (item: CapacitorFigures) => number) =>
        Math.max(...points.map((point) => of(point.capacitors[k]!)));
      return [
        {
          capacitor,
          figures,
          highest: most(({ voltage }) => voltage),
          highestRms: most(({ rmsCurrent }) => rmsCurrent),
          highestHeat: most(({ heat }) => heat),
          leastEffective: -most(({ effective }) => -effective),
        },
      ];
    }),
    diodes: pump.heaviest.diodes.flatMap((figures, k) => {
      const diode = find(origin.diodes, placeOf(figures.key).index);
      if (!diode) return [];
      const most = (of: (item: DiodeFigures) => number) =>
        Math.max(...points.map((point) => of(point.diodes[k]!)));
      return [
        {
          diode,
          figures,
          highest: most(({ reverse }) => reverse),
          highestAverage: most(({ average }) => average),
          highestPeak: most(({ peak }) => peak),
        },
      ];
    }),
  };
}

/** `v6.flying[1]`: column and index. */
function placeOf(key: string): { column: string; index: number } {
  const match = /\.(flying|smoothing|reservoir|diode)(?:\[(\d+)\])?$/.exec(key);
  return { column: match?.[1] ?? '', index: Number(match?.[2] ?? 0) };
}
