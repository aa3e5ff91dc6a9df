/**
 * A ceramic keeps the less of its value the more direct voltage it bears, and what it bears is a result: the pump is
 * solved with whole capacitors first and again with what that leaves of them, until both agree.
 */
import type { Capacitor, Pump } from '../model/board';
import { biasOf } from './pump-capacitors';
import { type PumpModel, typicalPoint } from './pump-model';
import { type NoPoint, type SolvedPoint, solvePoint } from './pump-point';

export interface SettledPump {
  readonly model: PumpModel;
  /** The pump at typical values. */
  readonly at: SolvedPoint | NoPoint;
}

/** Average voltage across each capacitor, magnitude, V, by its key in the report. */
export type Bears = ReadonlyMap<string, number>;

/** A change of a capacitor's voltage below this share moves the result by less than the solver's own error. */
const settled = 2e-3;
const mostRounds = 5;

/** Undefined when a part of the pump has no usable value. */
export function settlePump(
  pump: Pump,
  mode: string | undefined,
  assemble: (bears: Bears | undefined) => PumpModel | undefined,
  /** What a pump much like this one bears: a good guess saves a solution. */
  guess?: Bears,
): SettledPump | undefined {
  let bears: Bears | undefined = losesValue(pump) ? guess : undefined;
  for (let round = 1; ; round++) {
    const model = assemble(bears);
    if (!model) return undefined;
    const at = solvePoint(model, typicalPoint(model), mode);
    if ('reason' in at || !losesValue(pump) || round === mostRounds) return { model, at };
    const next: Bears = new Map(at.point.capacitors.map(({ key, average }) => [key, Math.abs(average)]));
    if (bears && agree(bears, next)) return { model, at };
    bears = next;
  }
}

function losesValue(pump: Pump): boolean {
  const all: readonly (Capacitor | undefined)[] = [...pump.flying, ...pump.smoothing, pump.reservoir];
  return all.some((capacitor) => capacitor && biasOf(capacitor, 1) !== undefined);
}

function agree(before: Bears, after: Bears): boolean {
  return [...after].every(([key, volts]) => {
    const known = before.get(key);
    return known !== undefined && Math.abs(volts - known) <= settled * Math.max(volts, 0.1);
  });
}
