/**
 * Voltages of all rails, each computed once, a pump after the rails that it stands on and is driven from. What rails
 * give way under load is found by repeating the board with the currents of the round before.
 */
import type { Board, Filter, Rail, Regulator } from '../model/board';
import { type Band, exactly } from '../quantity/figure';
import { weightedModes } from './board-modes';
import { boardCurrents } from './currents';
import { type Drawn, drawnFrom, nothingDrawn } from './drawn';
import type { DriveChain } from './drive-chain';
import { filterOhms } from './filters';
import { type Gap, isGap } from './gap';
import { Memory } from './memory';
import type { PumpParts } from './pump-assembly';
import type { ModeModel } from './pump-result';
import { pumpResultOf, type RailVoltage, type Surroundings, setUpPump, solveParts } from './pump-solution';
import { regulatedVoltage } from './regulators';
import { sag } from './sign';
import { supplyResistance, supplyVoltage } from './supply-voltage';
import type { PumpResult } from './types';

export interface RailVoltages {
  readonly voltages: ReadonlyMap<string, Band | Gap>;
  /** Typical voltage in one mode, V; undefined where it is not known. */
  at(name: string, mode: string | undefined): number | undefined;
  readonly pumps: ReadonlyMap<string, PumpResult>;
  /** Drives of each pump rail whose drives are known, solved or not. */
  readonly chains: ReadonlyMap<string, readonly DriveChain[]>;
  /** Models of each pump, one for each mode. */
  readonly models: ReadonlyMap<string, readonly ModeModel[]>;
  /** What each pump is made of, one for each mode. */
  readonly parts: ReadonlyMap<string, readonly PumpParts[]>;
  /** How the board looks from the pump that makes the rail. */
  around(rail: Rail): Surroundings;
  /** Currents with which the rails that give way were computed. */
  readonly drawn: Drawn;
}

/** Rounds after which a board that still moves is taken as it is. */
const mostRounds = 12;
/** A change of a rail below this share of its voltage is none. */
const settled = 5e-5;

/** All rails of the board, at one operating point for each mode. */
export function railVoltages(board: Board, memory: Memory = new Memory()): RailVoltages {
  let drawn = nothingDrawn;
  for (let round = 1; ; round++) {
    const solver = railSolver(board, memory, drawn);
    for (const name of board.rails.keys()) solver.voltage(name);
    if (round === mostRounds) return solver;
    const next = drawnFrom(board, solver, boardCurrents(board, solver));
    if (!moves(board, solver, drawn, next)) return solver;
    drawn = next;
  }
}

/** Rails on demand: asking for one computes it and those that it depends on. */
export function railSolver(
  board: Board,
  memory: Memory = new Memory(),
  drawn: Drawn = nothingDrawn,
): RailVoltages & { readonly voltage: RailVoltage } {
  const voltages = new Map<string, Band | Gap>();
  const pumps = new Map<string, PumpResult>();
  const chains = new Map<string, readonly DriveChain[]>();
  const models = new Map<string, readonly ModeModel[]>();
  const parts = new Map<string, readonly PumpParts[]>();
  const open = new Set<string>();
  const besides = railsBySupply(board);
  const voltage: RailVoltage = (name) => {
    const known = voltages.get(name);
    if (known) return known;
    const rail = board.rails.get(name);
    if (!rail) return { because: `the rail ${name} is not known` };
    if (open.has(name)) return { because: `${name} depends on itself` };
    open.add(name);
    const found = compute(rail);
    open.delete(name);
    const plain = isGap(found) ? found : plainBand(found);
    voltages.set(name, plain);
    return plain;
  };
  const around = (rail: Rail): Surroundings => ({
    voltage,
    below: (mode) => rounded(drawn.below(rail.name, mode)),
    source: (name, mode) => {
      const band = voltage(name);
      if (isGap(band)) return band;
      const supply = supplyOf(board, name);
      if (!supply?.ohms) return { name, band: rounded(band) };
      const all = onSupply(name, mode);
      const own = drawn.byPump(name, mode, rail.name);
      const others = { min: all.min - own.min, typical: all.typical - own.typical, max: all.max - own.max };
      return { name, band: rounded(sagged(supply.band, supply.ohms, others)), ohms: supply.ohms };
    },
  });
  /** Out of the supply behind a rail: all rails on it pull it down together. */
  const onSupply = (name: string, mode: string | undefined): Band =>
    (besides.get(name) ?? [name])
      .map((each) => drawn.total(each, mode))
      .reduce((a, b) => ({ min: a.min + b.min, typical: a.typical + b.typical, max: a.max + b.max }));
  /** Over all modes: the heaviest makes the typical voltage. */
  const heaviest = (name: string): Band => {
    const draws = weightedModes(board).map(({ name: mode }) => onSupply(name, mode));
    return {
      min: Math.min(...draws.map(({ min }) => min)),
      typical: Math.max(...draws.map(({ typical }) => typical)),
      max: Math.max(...draws.map(({ max }) => max)),
    };
  };
  const regulated = (rail: Rail, regulator: Regulator): Band | Gap => {
    if (!regulator.output) return { because: `the regulator of ${rail.name} has no output voltage` };
    const input = regulator.from && voltage(regulator.from.name);
    // Without a known input it is taken at its word; the input says why it is not known.
    return (input && !isGap(input) && regulatedVoltage(regulator, input)) || regulator.output;
  };
  const filtered = (rail: Rail, filter: Filter): Band | Gap => {
    if (!filter.from) return { because: `the filter of ${rail.name} has no rail in front` };
    const input = voltage(filter.from.name);
    return isGap(input) ? input : sagged(input, filterOhms(filter), heaviest(rail.name));
  };
  const compute = (rail: Rail): Band | Gap => {
    const { origin } = rail;
    if (!origin) return { because: `${rail.name} has no origin` };
    switch (origin.kind) {
      case 'supply': {
        const supply = supplyOf(board, rail.name);
        if (!supply) return { because: `the voltage of ${origin.supply.name} is not known` };
        return supply.ohms ? sagged(supply.band, supply.ohms, heaviest(rail.name)) : supply.band;
      }
      case 'regulator':
        return regulated(rail, origin.regulator);
      case 'filter':
        return filtered(rail, origin.filter);
      case 'pump': {
        const setup = setUpPump(board, rail, origin.pump, around(rail));
        if (isGap(setup)) return setup;
        chains.set(rail.name, setup.chains);
        parts.set(rail.name, setup.parts);
        const pump = memory.pump(setup.parts, () => solveParts(origin.pump, setup.parts));
        models.set(rail.name, pump.models);
        const result = pumpResultOf(rail, pump);
        if (isGap(result)) return result;
        pumps.set(rail.name, result);
        return {
          min: result.voltage.lowest.value,
          typical: result.heaviest.voltage,
          max: result.voltage.highest.value,
        };
      }
    }
  };
  /** `left`: rails may stand on each other in a circle, which has no answer. */
  const within = (name: string, mode: string | undefined, left: number): number | undefined => {
    if (left === 0) return undefined;
    const band = voltages.get(name);
    const origin = board.rails.get(name)?.origin;
    if (!band || isGap(band) || !origin) return undefined;
    if (origin.kind === 'pump') return pumps.get(name)?.points.find((p) => p.mode === mode)?.voltage;
    const amps = onSupply(name, mode).typical;
    if (origin.kind === 'supply') {
      const supply = supplyOf(board, name);
      return supply ? supply.band.typical - (supply.ohms?.typical ?? 0) * amps : undefined;
    }
    if (origin.kind === 'filter') {
      const input = origin.filter.from && within(origin.filter.from.name, mode, left - 1);
      return input === undefined ? undefined : sag(input, filterOhms(origin.filter).typical * amps);
    }
    const input = origin.regulator.from && within(origin.regulator.from.name, mode, left - 1);
    if (input === undefined) return band.typical;
    return regulatedVoltage(origin.regulator, exactly(input))?.typical;
  };
  const at = (name: string, mode: string | undefined) => within(name, mode, board.rails.size);
  return {
    voltages,
    at,
    pumps,
    chains,
    models,
    parts,
    around,
    drawn: { ...drawn, total: onSupply },
    voltage,
  };
}

/** For each rail that is a supply: all rails on the same one. */
function railsBySupply(board: Board): ReadonlyMap<string, readonly string[]> {
  const bySupply = new Map<string, string[]>();
  const result = new Map<string, readonly string[]>();
  for (const { name, origin } of board.rails.values()) {
    if (origin?.kind !== 'supply') continue;
    const list = bySupply.get(origin.supply.name) ?? [];
    bySupply.set(origin.supply.name, [...list, name]);
  }
  for (const names of bySupply.values()) for (const name of names) result.set(name, names);
  return result;
}

/** Open voltage and source resistance of the supply that a rail is. */
function supplyOf(board: Board, railName: string): { band: Band; ohms: Band | null } | undefined {
  const origin = board.rails.get(railName)?.origin;
  const supply = origin?.kind === 'supply' ? board.supplies.get(origin.supply.name) : undefined;
  const band = supply && supplyVoltage(supply);
  return band ? { band, ohms: supplyResistance(supply) } : undefined;
}

/** Most current makes the weakest voltage, least current the strongest; a negative rail is pulled up. */
function sagged(band: Band, ohms: Band, { min: least, typical, max: most }: Band): Band {
  const ends = [
    sag(band.min, band.min < 0 ? ohms.min * least : ohms.max * most),
    sag(band.max, band.max < 0 ? ohms.max * most : ohms.min * least),
  ];
  return {
    min: Math.min(...ends),
    typical: sag(band.typical, ohms.typical * typical),
    max: Math.max(...ends),
  };
}

/**
 * Six digits: far finer than the solver's own error, and coarse enough that a change elsewhere on the board which no
 * meter would see does not ask for every pump to be solved again.
 */
function rounded({ min, typical, max }: Band): Band {
  const digits = (value: number) => Number(value.toPrecision(6));
  return { min: digits(min), typical: digits(typical), max: digits(max) };
}

/** True when the currents of the last round move a rail that gives way. */
function moves(board: Board, solved: RailVoltages, before: Drawn, after: Drawn): boolean {
  for (const { name } of weightedModes(board))
    for (const rail of board.rails.values()) {
      const change = (of: (drawn: Drawn) => Band) => {
        const [a, b] = [of(before), of(after)];
        return Math.max(...(['min', 'typical', 'max'] as const).map((end) => Math.abs(b[end] - a[end])));
      };
      const { origin } = rail;
      if (origin?.kind === 'supply' || origin?.kind === 'filter') {
        const ohms = origin.kind === 'supply' ? supplyOf(board, rail.name)?.ohms : filterOhms(origin.filter);
        const volts = Math.abs(solved.at(rail.name, name) ?? 0);
        if (ohms && ohms.max * change((d) => d.total(rail.name, name)) > settled * volts) return true;
      }
      if (origin?.kind !== 'pump') continue;
      const below = after.below(rail.name, name);
      if (change((d) => d.below(rail.name, name)) > settled * below.max) return true;
    }
  return false;
}

/** Figures of the file carry spans and origins, which are no part of a result. */
export function plainBand({ min, typical, max }: Band): Band {
  return { min, typical, max };
}
