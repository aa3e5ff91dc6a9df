/**
 * Everything about each rail, put together from its voltage, its pump and its currents.
 */
import type { Board, Rail } from '../model/board';
import type { Band } from '../quantity/figure';
import type { WeightedMode } from './board-modes';
import { overModes } from './chips';
import type { Currents } from './currents';
import { pumpLoadLine, pumpWaveform } from './curves';
import { isGap } from './gap';
import type { ModeModel } from './pump-result';
import type { RailVoltages } from './rail-voltages';
import { regulatorInput } from './regulators';
import { pumpTransients } from './transients';
import type { PumpResult, RailResult } from './types';

export function railResults(
  board: Board,
  solved: RailVoltages,
  currents: Currents,
  modes: readonly WeightedMode[],
): Map<string, RailResult> {
  const results = new Map<string, RailResult>();
  for (const rail of board.rails.values()) results.set(rail.name, railResult(rail, solved, currents, modes));
  return results;
}

function railResult(
  rail: Rail,
  solved: RailVoltages,
  currents: Currents,
  modes: readonly WeightedMode[],
): RailResult {
  const found = solved.voltages.get(rail.name);
  const voltage: Band | null = found && !isGap(found) ? found : null;
  const pump = solved.pumps.get(rail.name);
  const at = (mode: string | undefined) => pump?.points.find((point) => point.mode === mode);
  // What a pump's output feeds are its own loads; any other rail also carries the rails and chips below it.
  const current = overModes(modes, (mode) =>
    pump ? (at(mode)?.loadCurrent ?? null) : currents.rail(rail.name, mode),
  );
  const average = (value: (mode: string | undefined) => number | undefined) =>
    overModes(modes, (mode) => value(mode) ?? null)?.typical ?? null;
  const powerIn = pump ? average((mode) => at(mode)?.powerIn) : null;
  const powerOut = pump
    ? average((mode) => at(mode)?.powerOut)
    : voltage && current
      ? Math.abs(voltage.typical) * current.typical
      : null;
  const regulatorIn = regulatorCurrent(rail, solved, currents, modes);
  const stated = modes.filter((mode) => mode.name !== undefined);
  return {
    rail,
    voltage,
    ripple: pump ? rippleBand(pump) : null,
    current: current?.typical ?? null,
    inputCurrent: pump ? average((mode) => at(mode)?.inputCurrent) : regulatorIn,
    power: powerOut,
    efficiency: pump
      ? powerIn !== null && powerOut !== null && powerIn > 0
        ? powerOut / powerIn
        : null
      : regulatorEfficiency(rail, solved, regulatorIn, powerOut),
    headroom: voltage ? headroom(rail, voltage) : null,
    storedEnergy: pump ? storedEnergy(rail, pump) : null,
    modes: new Map(
      stated.map((mode) => [
        mode.name!,
        {
          voltage: pump ? (at(mode.name)?.voltage ?? null) : (voltage?.typical ?? null),
          current: pump ? (at(mode.name)?.loadCurrent ?? null) : currents.rail(rail.name, mode.name),
        },
      ]),
    ),
    ...(pump ? { pump, ...onDemand(pump, solved.models.get(rail.name) ?? []) } : {}),
    ...(found && isGap(found) ? { because: found.because } : {}),
  };
}

/** What costs more than the steady state, in the heaviest mode, computed at the first call. */
function onDemand(
  pump: PumpResult,
  models: readonly ModeModel[],
): Pick<RailResult, 'transients' | 'waveform' | 'loadLine'> {
  const model = models.find(({ mode }) => mode === pump.heaviest.mode);
  if (!model) return {};
  return {
    transients: once(() => pumpTransients(model)),
    waveform: once(() => pumpWaveform(model)),
    loadLine: (most = 2 * pump.heaviest.askedCurrent || 1e-3, points = 17) =>
      pumpLoadLine(model, most, points),
  };
}

/** The value of the first call for all further ones. */
function once<T>(compute: () => T): () => T {
  let known: { readonly value: T } | undefined;
  return () => {
    known ??= { value: compute() };
    return known.value;
  };
}

function regulatorCurrent(
  rail: Rail,
  solved: RailVoltages,
  currents: Currents,
  modes: readonly WeightedMode[],
): number | null {
  if (rail.origin?.kind !== 'regulator') return null;
  const { regulator } = rail.origin;
  const input = regulator.from && solved.voltages.get(regulator.from.name);
  const output = solved.voltages.get(rail.name);
  if (!input || isGap(input) || !output || isGap(output)) return null;
  const taken = overModes(modes, (mode) => {
    const out = currents.rail(rail.name, mode);
    return out === null ? null : (regulatorInput(regulator, output.typical, input.typical, out) ?? null);
  });
  return taken?.typical ?? null;
}

/** Share of what a regulator takes in that reaches its rail. */
function regulatorEfficiency(
  rail: Rail,
  solved: RailVoltages,
  taken: number | null,
  powerOut: number | null,
): number | null {
  const input = rail.origin?.kind === 'regulator' && rail.origin.regulator.from;
  const voltage = input ? solved.voltages.get(input.name) : undefined;
  if (!voltage || isGap(voltage) || taken === null || powerOut === null) return null;
  const powerIn = voltage.typical * taken;
  return powerIn > 0 ? powerOut / powerIn : null;
}

function rippleBand(pump: PumpResult): Band {
  return {
    min: pump.ripple.lowest.value,
    typical: pump.heaviest.ripple,
    max: pump.ripple.highest.value,
  };
}

/**
 * Volts between the weakest corner and the edge of the window it must not fall below, in magnitude: for a negative
 * rail the edge nearer to zero.
 */
function headroom(rail: Rail, voltage: Band): number | null {
  const window = rail.needs?.voltage;
  if (!window) return null;
  return window.max <= 0 ? window.max - voltage.max : voltage.min - window.min;
}

/** J, all capacitors of the pump at their largest voltage. */
function storedEnergy(rail: Rail, pump: PumpResult): number | null {
  if (rail.origin?.kind !== 'pump') return null;
  const { flying, smoothing, reservoir } = rail.origin.pump;
  const farads = new Map<string, number>();
  for (const [name, list] of [
    ['flying', flying],
    ['smoothing', smoothing.length > 0 ? smoothing : flying],
  ] as const)
    for (let k = 0; k < 10; k++) {
      const capacitor = list.length === 1 ? list[0] : list[k];
      if (capacitor?.value) farads.set(`${rail.name}.${name}[${k}]`, capacitor.value.typical);
    }
  if (reservoir?.value) farads.set(`${rail.name}.reservoir`, reservoir.value.typical);
  let sum = 0;
  for (const capacitor of pump.heaviest.capacitors) {
    const value = farads.get(capacitor.key);
    if (value === undefined) return null;
    sum += (value * capacitor.voltage ** 2) / 2;
  }
  return sum;
}
