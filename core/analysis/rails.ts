/**
 * Everything about each rail, put together from its voltage, its pump and its currents.
 */
import type { Board, Filter, Rail } from '../model/board';
import type { Band } from '../quantity/figure';
import type { WeightedMode } from './board-modes';
import { overModes } from './chips';
import type { CurrentCases, Currents } from './currents';
import { pumpLoadLine, pumpWaveform } from './curves';
import { filterFarads, filterOhms, filterRipple } from './filters';
import { isGap } from './gap';
import { headroomOf } from './headroom';
import { once } from './once';
import type { PumpModel } from './pump-model';
import type { ModeModel } from './pump-result';
import type { RailVoltages } from './rail-voltages';
import { regulatorInput } from './regulators';
import { pumpTransients } from './transients';
import type { PumpResult, RailResult } from './types';

export function railResults(
  board: Board,
  solved: RailVoltages,
  currents: CurrentCases,
  modes: readonly WeightedMode[],
): Map<string, RailResult> {
  const results = new Map<string, RailResult>();
  for (const rail of board.rails.values()) results.set(rail.name, railResult(rail, solved, currents, modes));
  // A filter's ripple is made of the curve of the rail in front, wherever in the file that stands.
  for (const [name, result] of results) {
    const { origin } = result.rail;
    if (origin?.kind === 'filter') results.set(name, filteredRail(result, origin.filter, results));
  }
  return results;
}

function filteredRail(
  result: RailResult,
  filter: Filter,
  results: ReadonlyMap<string, RailResult>,
): RailResult {
  const { voltage, current } = result;
  const front = filter.from && results.get(filter.from.name);
  if (!voltage || current === null) return result;
  const farads = filterFarads(filter, voltage.typical)?.typical;
  const wave = front?.waveform?.();
  const fall = filter.resistor ? filter.resistor.typical * current : undefined;
  const { typical } = filterOhms(filter);
  const ripple = wave ? filterRipple(filter, wave, voltage.typical, current) : null;
  return {
    ...result,
    ripple,
    headroom: headroomOf({ ...result, ripple }),
    inputCurrent: current,
    efficiency: front?.voltage?.typical ? voltage.typical / front.voltage.typical : null,
    storedEnergy: farads === undefined ? null : (farads * voltage.typical ** 2) / 2,
    filter: {
      drops: fall === undefined ? [] : [{ in: 'filter resistor', volts: fall }],
      outputResistance:
        front?.pump === undefined
          ? filter.resistor
            ? typical
            : null
          : front.pump.heaviest.outputResistance + typical,
      openCircuit: front?.pump ? front.pump.heaviest.openCircuit : null,
    },
  };
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
  const ripple = pump ? rippleBand(pump) : null;
  return {
    rail,
    voltage,
    ripple,
    current: current?.typical ?? null,
    inputCurrent: pump ? average((mode) => at(mode)?.inputCurrent) : regulatorIn,
    power: powerOut,
    efficiency: pump
      ? powerIn !== null && powerOut !== null && powerIn > 0
        ? powerOut / powerIn
        : null
      : regulatorEfficiency(rail, solved, regulatorIn, powerOut),
    headroom: headroomOf({ rail, voltage, ripple, ...(pump ? { pump } : {}) }),
    storedEnergy: pump ? storedEnergy(pump) : null,
    modes: new Map(
      stated.map((mode) => [
        mode.name!,
        {
          voltage: solved.at(rail.name, mode.name) ?? (pump ? null : (voltage?.typical ?? null)),
          current: pump ? (at(mode.name)?.loadCurrent ?? null) : currents.rail(rail.name, mode.name),
        },
      ]),
    ),
    ...(pump ? { pump, ...onDemand(pump, solved.models.get(rail.name) ?? []) } : {}),
    ...(found && isGap(found) ? { because: found.because } : {}),
  };
}

const switched = new WeakMap<PumpModel, NonNullable<RailResult['transients']>>();

/** What costs more than the steady state, in the heaviest mode, computed at the first call. */
function onDemand(
  pump: PumpResult,
  models: readonly ModeModel[],
): Pick<RailResult, 'transients' | 'waveform' | 'loadLine'> {
  const model = models.find(({ mode }) => mode === pump.heaviest.mode);
  if (!model) return {};
  // A memory hands the same model on from one analysis to the next.
  const transients = switched.get(model.model) ?? once(() => pumpTransients(model));
  switched.set(model.model, transients);
  return {
    transients,
    waveform: once(() => pumpWaveform(model)),
    loadLine: (most = 2 * pump.heaviest.askedCurrent || 1e-3, points = 17) =>
      pumpLoadLine(model, most, points),
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

/** J, all capacitors of the pump at their largest voltage. */
function storedEnergy(pump: PumpResult): number {
  return pump.heaviest.capacitors.reduce(
    (sum, { effective, voltage }) => sum + (effective * voltage ** 2) / 2,
    0,
  );
}
