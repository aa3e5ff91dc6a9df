/**
 * Average currents up the tree of rails, mode by mode: what loads, chips, regulators and pumps take from each rail.
 * Once with everything typical, once with everything that takes most, once with what takes least.
 */
import type { Board, Chip, Rail } from '../model/board';
import type { Band } from '../quantity/figure';
import { activeIn } from './board-modes';
import { type Consumers, consumersOf, type Driven } from './consumers';
import { isGap } from './gap';
import { loadAmps } from './load-current';
import type { RailVoltages } from './rail-voltages';
import { regulatorInput } from './regulators';
import type { PumpPoint } from './types';

export type Case = 'typical' | 'most' | 'least';

export interface Currents {
  /** Into the rail's own loads and bleeder, A; null when the rail has no voltage to tell. */
  loads(rail: Rail, mode: string | undefined): number | null;
  /** Out of the rail in all, A; null when a part of it is not known. */
  rail(name: string, mode: string | undefined): number | null;
  /** What a chip takes from its rail, its pins included, A. */
  chip(chip: Chip, mode: string | undefined): number | null;
}

export interface CurrentCases extends Currents {
  readonly most: Currents;
  readonly least: Currents;
}

export function boardCurrents(board: Board, solved: RailVoltages): CurrentCases {
  const consumers = consumersOf(board, solved);
  const of = (which: Case) => currentsOf(board, solved, consumers, which);
  return { ...of('typical'), most: of('most'), least: of('least') };
}

/** The end of a band that belongs to the case, and the opposite one, for what takes less the larger it is. */
const ends = { typical: 'typical', most: 'max', least: 'min' } as const;
const opposite = { typical: 'typical', most: 'min', least: 'max' } as const;

function currentsOf(board: Board, solved: RailVoltages, consumers: Consumers, which: Case): Currents {
  const end = ends[which];
  const other = opposite[which];
  const memo = new Map<string, number | null>();
  const open = new Set<string>();
  const point = (name: string, mode: string | undefined) => pumpPoint(solved, name, mode, which);

  /** Magnitude of a rail's voltage in the mode, at the end that is asked for. */
  const volts = (name: string, mode: string | undefined, at: keyof Band): number | undefined => {
    const voltage = solved.voltages.get(name);
    if (!voltage || isGap(voltage)) return undefined;
    if (at === 'typical') return Math.abs(solved.at(name, mode) ?? voltage.typical);
    const sizes = [Math.abs(voltage.min), Math.abs(voltage.max)];
    return at === 'max' ? Math.max(...sizes) : Math.min(...sizes);
  };

  const loads = (rail: Rail, mode: string | undefined): number | null => {
    if (rail.origin?.kind === 'pump') {
      const at = point(rail.name, mode);
      return at ? at.loadCurrent - at.belowCurrent : null;
    }
    let sum = rail.bleeder ? share(volts(rail.name, mode, end), rail.bleeder[other]) : 0;
    for (const load of rail.loads.values()) {
      if (!activeIn(mode, load.modes)) continue;
      sum += loadAmps(load, end, (at) => volts(rail.name, mode, at));
    }
    return Number.isNaN(sum) ? null : sum;
  };

  /** Pumps that the chip's pins drive take their charge from the chip's rail. */
  const drive = (chip: Chip, mode: string | undefined): number | null =>
    total(
      (consumers.drivenBy.get(chip.name) ?? []).map(({ railName, index, share: part }) => {
        const at = point(railName, mode);
        return at ? part * (at.drives[index]?.sourceAverage ?? 0) : null;
      }),
    );

  /** What a pump takes from a rail past the pins of chips, which are counted with their chips. */
  const pump = (item: Rail, name: string, mode: string | undefined): number | null => {
    const at = point(item.name, mode);
    if (!at) return null;
    const past = (pin: Driven) => pin.chipRail === name;
    const byPins = (consumers.pinsOf.get(item.name) ?? [])
      .filter(past)
      .reduce((sum, pin) => sum + pin.share * (at.drives[pin.index]?.sourceAverage ?? 0), 0);
    return (at.railCurrents.get(name) ?? 0) + (at.besideCurrents.get(name) ?? 0) - byPins;
  };

  const chip = (item: Chip, mode: string | undefined): number | null => {
    const driven = drive(item, mode);
    if (driven === null) return null;
    const fallback = item.draws.length === 0 ? (item.part?.data?.draws?.[end] ?? 0) : 0;
    const own = item.draws
      .filter((draw) => activeIn(mode, draw.mode && [draw.mode]))
      .reduce((sum, draw) => sum + draw.current[end], fallback);
    const pins = [...item.pins.values()].reduce((sum, pin) => sum + (pin.sources?.[end] ?? 0), 0);
    const gates = (consumers.gatesOf.get(item.name) ?? []).reduce((sum, amps) => sum + amps[end], 0);
    return own + pins + driven + gates;
  };

  const regulated = (made: Rail, name: string, mode: string | undefined): number | null => {
    const { origin } = made;
    if (origin?.kind !== 'regulator') return null;
    const out = rail(made.name, mode);
    const input = volts(name, mode, other);
    const output = volts(made.name, mode, end);
    if (out === null || input === undefined || output === undefined) return null;
    return regulatorInput(origin.regulator, output, input, out, which) ?? null;
  };

  const rail = (name: string, mode: string | undefined): number | null => {
    const key = `${name}\n${mode ?? ''}`;
    const known = memo.get(key);
    if (known !== undefined) return known;
    const item = board.rails.get(name);
    if (!item || open.has(name)) return null;
    open.add(name);
    const on = consumers.on.get(name);
    const sum = total([
      loads(item, mode),
      ...(on?.chips ?? []).map((each) => chip(each, mode)),
      ...(on?.regulated ?? []).map((each) => regulated(each, name, mode)),
      ...(on?.filtered ?? []).map((each) => rail(each.name, mode)),
      ...(on?.pumped ?? []).map((each) => pump(each, name, mode)),
      ...(on?.oscillators ?? []).map((band) => band[end]),
    ]);
    open.delete(name);
    memo.set(key, sum);
    return sum;
  };

  return { loads, rail, chip };
}

/** The pump in that mode: typical, or where it draws most or least. */
function pumpPoint(
  solved: RailVoltages,
  name: string,
  mode: string | undefined,
  which: Case,
): PumpPoint | undefined {
  const pump = solved.pumps.get(name);
  const index = pump?.points.findIndex((each) => each.mode === mode) ?? -1;
  if (!pump || index < 0) return undefined;
  return which === 'typical' ? pump.points[index] : pump.draws[index]?.[which]?.point;
}

function share(above: number | undefined, below: number | undefined): number {
  return above === undefined || below === undefined ? Number.NaN : above / below;
}

function total(parts: readonly (number | null)[]): number | null {
  return parts.reduce<number | null>((sum, part) => (sum === null || part === null ? null : sum + part), 0);
}
