/**
 * Voltages of all rails, each computed once, a pump after the rails that it stands on and is driven from. What rails
 * give way under load is found by repeating the board with the currents of the round before.
 */
import type { Board, Rail, Regulator } from '../model/board';
import { type Band, exactly } from '../quantity/figure';
import { weightedModes } from './board-modes';
import { boardCurrents } from './currents';
import { type Drawn, drawnFrom, nothingDrawn } from './drawn';
import type { DriveChain } from './drive-chain';
import { type Gap, isGap } from './gap';
import type { ModeModel } from './pump-result';
import { type RailVoltage, type Surroundings, setUpPump, solveRailPump } from './pump-solution';
import { regulatedVoltage } from './regulators';
import { supplyResistance, supplyVoltage } from './supply-voltage';
import type { PumpResult } from './types';

export interface RailVoltages {
  readonly voltages: ReadonlyMap<string, Band | Gap>;
  readonly pumps: ReadonlyMap<string, PumpResult>;
  /** Drives of each pump rail whose drives are known, solved or not. */
  readonly chains: ReadonlyMap<string, readonly DriveChain[]>;
  /** Models of each pump, one for each mode. */
  readonly models: ReadonlyMap<string, readonly ModeModel[]>;
}

/** Rounds after which a board that still moves is taken as it is. */
const mostRounds = 6;
/** A change of a rail below this share of its voltage is none. */
const settled = 1e-4;

/** All rails of the board, at one operating point for each mode. */
export function railVoltages(board: Board): RailVoltages {
  let drawn = nothingDrawn;
  for (let round = 1; ; round++) {
    const solver = railSolver(board, drawn);
    for (const name of board.rails.keys()) solver.voltage(name);
    if (round === mostRounds) return solver;
    const next = drawnFrom(board, solver, boardCurrents(board, solver));
    if (!moves(board, drawn, next)) return solver;
    drawn = next;
  }
}

/** Rails on demand: asking for one computes it and those that it depends on. */
export function railSolver(
  board: Board,
  drawn: Drawn = nothingDrawn,
): RailVoltages & { readonly voltage: RailVoltage } {
  const voltages = new Map<string, Band | Gap>();
  const pumps = new Map<string, PumpResult>();
  const chains = new Map<string, readonly DriveChain[]>();
  const models = new Map<string, readonly ModeModel[]>();
  const open = new Set<string>();
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
    below: (mode) => drawn.below(rail.name, mode),
    source: (name, mode) => {
      const band = voltage(name);
      if (isGap(band)) return band;
      const supply = supplyOf(board, name);
      if (!supply?.ohms) return { name, band };
      const others = drawn.total(name, mode) - drawn.byPump(name, mode, rail.name);
      return { name, band: sagged(supply.band, supply.ohms, others, others), ohms: supply.ohms };
    },
  });
  const regulated = (rail: Rail, regulator: Regulator): Band | Gap => {
    if (!regulator.output) return { because: `the regulator of ${rail.name} has no output voltage` };
    const input = regulator.from && voltage(regulator.from.name);
    // Without a known input it is taken at its word; the input says why it is not known.
    return (input && !isGap(input) && regulatedVoltage(regulator, input)) || regulator.output;
  };
  const compute = (rail: Rail): Band | Gap => {
    const { origin } = rail;
    if (!origin) return { because: `${rail.name} has no origin` };
    switch (origin.kind) {
      case 'supply': {
        const supply = supplyOf(board, rail.name);
        if (!supply) return { because: `the voltage of ${origin.supply.name} is not known` };
        if (!supply.ohms) return supply.band;
        const draws = weightedModes(board).map(({ name }) => drawn.total(rail.name, name));
        return sagged(supply.band, supply.ohms, Math.min(...draws), Math.max(...draws));
      }
      case 'regulator':
        return regulated(rail, origin.regulator);
      case 'filter':
        return { because: 'a filter is not computed yet' };
      case 'pump': {
        const setup = setUpPump(board, rail, origin.pump, around(rail));
        if (isGap(setup)) return setup;
        chains.set(rail.name, setup.chains);
        models.set(rail.name, setup.models);
        const result = solveRailPump(rail, origin.pump, setup);
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
  return { voltages, pumps, chains, models, voltage };
}

/** Open voltage and source resistance of the supply that a rail is. */
function supplyOf(board: Board, railName: string): { band: Band; ohms: Band | null } | undefined {
  const origin = board.rails.get(railName)?.origin;
  const supply = origin?.kind === 'supply' ? board.supplies.get(origin.supply.name) : undefined;
  const band = supply && supplyVoltage(supply);
  return band ? { band, ohms: supplyResistance(supply) } : undefined;
}

/** The heaviest current makes the typical and the lowest voltage, the lightest one the highest. */
function sagged(band: Band, ohms: Band, least: number, most: number): Band {
  return {
    min: band.min - ohms.max * most,
    typical: band.typical - ohms.typical * most,
    max: band.max - ohms.min * least,
  };
}

/** True when the currents of the last round move a rail that gives way. */
function moves(board: Board, before: Drawn, after: Drawn): boolean {
  for (const { name } of weightedModes(board))
    for (const rail of board.rails.values()) {
      const change = (of: (drawn: Drawn) => number) => Math.abs(of(after) - of(before));
      const supply = supplyOf(board, rail.name);
      const sag = (supply?.ohms ?? exactly(0)).typical * change((d) => d.total(rail.name, name));
      if (supply && sag > settled * Math.abs(supply.band.typical)) return true;
      if (rail.origin?.kind !== 'pump') continue;
      const below = after.below(rail.name, name);
      if (change((d) => d.below(rail.name, name)) > settled * below) return true;
    }
  return false;
}

/** Figures of the file carry spans and origins, which are no part of a result. */
export function plainBand({ min, typical, max }: Band): Band {
  return { min, typical, max };
}
