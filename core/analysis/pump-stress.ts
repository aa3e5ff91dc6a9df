/**
 * Each part of a pump beside what it bears in the heaviest mode and at the highest corner.
 */
import type { Capacitor, Diode } from '../model/board';
import type { CapacitorFigures, DiodeFigures, RailResult } from './types';

export interface StressedCapacitor {
  readonly capacitor: Capacitor;
  readonly figures: CapacitorFigures;
  /** Voltage across it, scaled to the rail's strongest corner, V. */
  readonly highest: number;
}

export interface StressedDiode {
  readonly diode: Diode;
  readonly figures: DiodeFigures;
  readonly highest: number;
}

/** Empty for rails that no pump makes. A part that serves several stages comes once for each of them. */
export function stressedParts({ rail, pump }: RailResult): {
  readonly capacitors: readonly StressedCapacitor[];
  readonly diodes: readonly StressedDiode[];
} {
  const origin = rail.origin?.kind === 'pump' ? rail.origin.pump : undefined;
  if (!origin || !pump) return { capacitors: [], diodes: [] };
  const { lowest, highest } = pump.voltage;
  const strongest = Math.max(Math.abs(lowest.value), Math.abs(highest.value));
  // All voltages of a pump grow together with its output from the heaviest point to its strongest corner.
  const factor = Math.max(1, strongest / Math.max(Math.abs(pump.heaviest.voltage), 1e-9));
  const capped = Math.min(factor, 3);
  const find = <T>(list: readonly T[], index: number) => (list.length === 1 ? list[0] : list[index]);
  return {
    capacitors: pump.heaviest.capacitors.flatMap((figures) => {
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
      return capacitor ? [{ capacitor, figures, highest: figures.voltage * capped }] : [];
    }),
    diodes: pump.heaviest.diodes.flatMap((figures) => {
      const diode = find(origin.diodes, placeOf(figures.key).index);
      return diode ? [{ diode, figures, highest: figures.reverse * capped }] : [];
    }),
  };
}

/** `v6.flying[1]`: column and index. */
function placeOf(key: string): { column: string; index: number } {
  const match = /\.(flying|smoothing|reservoir|diode)(?:\[(\d+)\])?$/.exec(key);
  return { column: match?.[1] ?? '', index: Number(match?.[2] ?? 0) };
}
