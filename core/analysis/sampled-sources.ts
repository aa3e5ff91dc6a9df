/**
 * Rails that no pump makes, in one sample of the board: supplies, regulators and filters. What they give way to is
 * the current out of the rail, by lot between the least and the most that the board may draw.
 */
import type { Board, Filter, Rail, Regulator } from '../model/board';
import type { Band } from '../quantity/figure';
import type { Drawn } from './drawn';
import { filterOhms } from './filters';
import type { Lots, Reader } from './lots';
import type { SampledRail } from './sampled-rails';
import { sag } from './sign';
import { supplyResistance, supplyVoltage } from './supply-voltage';

export interface Around {
  readonly board: Board;
  readonly lots: Lots;
  readonly drawn: Drawn;
  /** Names of the modes; a single `undefined` for a board without. */
  readonly modes: readonly (string | undefined)[];
}

export interface SampledSource {
  /** Lots that it depends on. */
  readonly used: Set<number>;
  /** V in the mode of that index; undefined when a rail below has no steady state. */
  volts(mode: number): number | undefined;
  /** The same without the current that one pump takes; left out where that makes no difference. */
  behind?(pump: string, mode: number, used: Set<number>): Reader;
}

export function sampledSupply(around: Around, rail: Rail, name: string): SampledSource | undefined {
  const { board, lots, drawn, modes } = around;
  const supply = board.supplies.get(name);
  const open = supply && supplyVoltage(supply);
  if (!supply || !open) return undefined;
  const used = new Set<number>();
  const volts = lots.reader(`supply ${name}`, supply.path, open, used);
  const ohms = sourceOhms(around, rail, used);
  if (!ohms) return { used, volts };
  const total = (mode: number) => drawn.total(rail.name, modes[mode]);
  const amps = modes.map((_, mode) => current(around, rail, total(mode), used));
  return {
    used,
    volts: (mode) => sag(volts(), ohms() * amps[mode]!()),
    behind: (pump, mode, alsoUsed) => {
      const own = drawn.byPump(rail.name, modes[mode], pump);
      const others = current(around, rail, less(total(mode), own), alsoUsed);
      return () => sag(volts(), ohms() * others());
    },
  };
}

/** Source resistance of the supply that a rail is, one for all rails of that supply. */
export function sourceOhms({ board, lots }: Around, rail: Rail, used: Set<number>): Reader | undefined {
  const supply = rail.origin?.kind === 'supply' ? board.supplies.get(rail.origin.supply.name) : undefined;
  const ohms = supply && supplyResistance(supply);
  return ohms ? lots.reader(`supply ${supply.name} resistance`, supply.path, ohms, used) : undefined;
}

export function sampledRegulator(
  { lots }: Around,
  rail: Rail,
  { output, dropout, kind }: Regulator,
  input: SampledRail | undefined,
): SampledSource | undefined {
  if (!output) return undefined;
  const used = new Set<number>();
  const path = `${rail.path}.regulator`;
  const held = lots.reader(`${rail.name} regulator output`, path, output, used);
  // As in the analysis: without a known input, or where its dropout does not matter, it is taken at its word.
  if (!input || !dropout || kind === 'switching') return { used, volts: held };
  const lost = lots.reader(`${rail.name} regulator dropout`, path, dropout, used);
  return {
    used: new Set([...used, ...input.used]),
    volts: (mode) => {
      const below = input.reach(mode);
      return below && Math.min(held(), below.volts - lost());
    },
  };
}

export function sampledFilter(around: Around, rail: Rail, filter: Filter, input: SampledRail): SampledSource {
  const { lots, drawn, modes } = around;
  const used = new Set(input.used);
  const ohms = lots.reader(`${rail.name} filter resistor`, `${rail.path}.filter`, filterOhms(filter), used);
  const amps = modes.map((mode) => current(around, rail, drawn.total(rail.name, mode), used));
  return {
    used,
    volts: (mode) => {
      const below = input.reach(mode);
      return below && sag(below.volts, ohms() * amps[mode]!());
    },
  };
}

/** One lot for the current out of a rail, whichever mode and consumer it is asked for. */
function current({ lots }: Around, rail: Rail, band: Band, used: Set<number>): Reader {
  return lots.reader(`current out of ${rail.name}`, rail.path, band, used);
}

function less(all: Band, own: Band): Band {
  return { min: all.min - own.min, typical: all.typical - own.typical, max: all.max - own.max };
}
