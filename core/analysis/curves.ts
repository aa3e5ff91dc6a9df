/**
 * Curves of a pump for plots, computed when somebody asks: one period at the solver's own points, and the load line.
 */
import { resistorCurrent, solve } from '../engine';
import { pumpNetwork } from '../pump/network';
import type { PumpValues } from '../pump/values';
import { typicalPoint } from './pump-model';
import type { ModeModel } from './pump-result';

/** One clock period in the steady state; all lists are as long as `time`. */
export interface Waveform {
  /** s, from the first clock's rising edge. */
  readonly time: readonly number[];
  /** Output, V. */
  readonly output: readonly number[];
  /** Current out of each drive's clock output, A: positive while it sources. */
  readonly drives: readonly (readonly number[])[];
}

export interface LoadPoint {
  /** A, magnitude. */
  readonly current: number;
  /** Average output, V; null where no steady state was found. */
  readonly voltage: number | null;
}

/** Undefined when the pump has no steady state. */
export function pumpWaveform({ model }: ModeModel): Waveform | undefined {
  const placed = pumpNetwork(model.values(typicalPoint(model)));
  const solved = placed && solve(placed.network);
  if (!placed || !solved?.converged) return undefined;
  const { circuit, path } = solved;
  const width = circuit.nodes + circuit.knowns;
  const place = circuit.place[placed.output]!;
  // First stages of a step lie beside the curve.
  const stages = Array.from({ length: path.count }, (_, s) => s).filter((s) => path.last[s] === 1);
  return {
    time: stages.map((s) => path.time[s]!),
    output: stages.map((s) => path.volts[s * width + place]!),
    drives: placed.drives.map(({ high, low }) =>
      stages.map((s) => resistorCurrent(circuit, path, high, s) - resistorCurrent(circuit, path, low, s)),
    ),
  };
}

/** Average output for currents from nothing to `most` ampere, the loads of the file put aside. */
export function pumpLoadLine({ model }: ModeModel, most: number, points: number): readonly LoadPoint[] {
  const values = model.values(typicalPoint(model));
  return Array.from({ length: points }, (_, k) => {
    const current = (most * k) / Math.max(points - 1, 1);
    return { current, voltage: voltageAt(values, current) };
  });
}

function voltageAt(values: PumpValues, amps: number): number | null {
  const loads: PumpValues['loads'] = amps > 0 ? [{ name: 'load line', kind: 'current', amps }] : [];
  return pumpVoltage({ ...values, loads }) ?? null;
}

/** Average output of a pump; undefined where no steady state was found. */
export function pumpVoltage(values: PumpValues): number | undefined {
  const placed = pumpNetwork(values);
  const solved = placed && solve(placed.network);
  return placed && solved?.converged ? solved.nodes[placed.output]!.average : undefined;
}
