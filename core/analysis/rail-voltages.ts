/**
 * Voltages of all rails, each computed once, a pump after the rails that it stands on and is driven from.
 */
import type { Board, Rail } from '../model/board';
import type { Band } from '../quantity/figure';
import { type Gap, isGap } from './gap';
import { type RailVoltage, solveRailPump } from './pump-solution';
import { supplyVoltage } from './supply-voltage';
import type { PumpResult } from './types';

export interface RailVoltages {
  readonly voltages: ReadonlyMap<string, Band | Gap>;
  readonly pumps: ReadonlyMap<string, PumpResult>;
}

/** All rails of the board. */
export function railVoltages(board: Board): RailVoltages {
  const solver = railSolver(board);
  for (const name of board.rails.keys()) solver.voltage(name);
  return solver;
}

/** Rails on demand: asking for one computes it and those that it depends on. */
export function railSolver(board: Board): RailVoltages & { readonly voltage: RailVoltage } {
  const voltages = new Map<string, Band | Gap>();
  const pumps = new Map<string, PumpResult>();
  const open = new Set<string>();
  const voltage: RailVoltage = (name) => {
    const known = voltages.get(name);
    if (known) return known;
    const rail = board.rails.get(name);
    if (!rail) return { because: `the rail ${name} is not known` };
    if (open.has(name)) return { because: `${name} depends on itself` };
    open.add(name);
    const found = plain(compute(rail));
    open.delete(name);
    voltages.set(name, found);
    return found;
  };
  const compute = (rail: Rail): Band | Gap => {
    const { origin } = rail;
    if (!origin) return { because: `${rail.name} has no origin` };
    switch (origin.kind) {
      case 'supply': {
        const supply = board.supplies.get(origin.supply.name);
        const band = supply && supplyVoltage(supply);
        return band ?? { because: `the voltage of ${origin.supply.name} is not known` };
      }
      case 'regulator':
        return origin.regulator.output ?? { because: `the regulator of ${rail.name} has no output voltage` };
      case 'filter':
        return { because: 'a filter is not computed yet' };
      case 'pump': {
        const result = solveRailPump(board, rail, origin.pump, voltage);
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
  return { voltages, pumps, voltage };
}

function plain(voltage: Band | Gap): Band | Gap {
  return isGap(voltage) ? voltage : plainBand(voltage);
}

/** Figures of the file carry spans and origins, which are no part of a result. */
export function plainBand({ min, typical, max }: Band): Band {
  return { min, typical, max };
}
