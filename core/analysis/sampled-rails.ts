/**
 * The rails of a board in one sample of it: each pump solved on the voltages that the same sample has below it.
 */
import type { Board, Rail } from '../model/board';
import { weightedModes } from './board-modes';
import { boardCurrents } from './currents';
import { drawnFrom } from './drawn';
import { type Gap, isGap } from './gap';
import type { Lots } from './lots';
import { railLabel, sourceLabel } from './pump-book';
import type { PumpModel, Variable } from './pump-model';
import { type Reached, samplePump } from './pump-sample';
import { type RailVoltages, railVoltages } from './rail-voltages';
import {
  type Around,
  type SampledSource,
  sampledFilter,
  sampledRegulator,
  sampledSupply,
  sourceOhms,
} from './sampled-sources';

/** What a rail reaches in the present sample in the mode of that index; undefined when it has no steady state. */
type Reach = (mode: number) => Reached | undefined;
type Value = () => number | undefined;

export interface SampledRail {
  readonly rail: Rail;
  readonly reach: Reach;
  /** Lots that it depends on, its own and those of the rails below. */
  readonly used: ReadonlySet<number>;
  /** As the pump of that name sees it: without that pump's own current. `used` learns of further lots. */
  behind(pump: string, mode: number, used: Set<number>): Value;
}

export interface SampledBoard {
  /** Names of the modes; a single `undefined` for a board without. */
  readonly modes: readonly (string | undefined)[];
  /** The rail, or why it is not computed. */
  rail(name: string): SampledRail | Gap;
  /** Begins a new sample. */
  next(): void;
}

export function sampledBoard(board: Board, lots: Lots): SampledBoard {
  const solved = railVoltages(board);
  const drawn = drawnFrom(board, solved, boardCurrents(board, solved));
  const modes = weightedModes(board).map(({ name }) => name);
  const planner = new Planner({ board, lots, drawn, modes }, solved);
  return {
    modes,
    next: () => planner.next(),
    rail: (name) => {
      const voltage = solved.voltages.get(name);
      if (voltage && isGap(voltage)) return voltage;
      return planner.rail(name) ?? { because: `the rail ${name} is not known` };
    },
  };
}

class Planner {
  readonly #planned = new Map<string, SampledRail | undefined>();
  readonly #memos: Map<number, Reached | undefined>[] = [];

  constructor(
    private readonly around: Around,
    private readonly solved: RailVoltages,
  ) {}

  next(): void {
    for (const memo of this.#memos) memo.clear();
  }

  /** Undefined for a rail without a voltage. */
  rail(name: string): SampledRail | undefined {
    if (this.#planned.has(name)) return this.#planned.get(name);
    const rail = this.around.board.rails.get(name);
    const voltage = this.solved.voltages.get(name);
    const planned = rail && voltage && !isGap(voltage) ? this.#plan(rail) : undefined;
    this.#planned.set(name, planned);
    return planned;
  }

  #plan(rail: Rail): SampledRail | undefined {
    const { origin } = rail;
    switch (origin?.kind) {
      case 'supply':
        return this.#source(rail, sampledSupply(this.around, rail, origin.supply.name));
      case 'regulator': {
        const { from } = origin.regulator;
        return this.#source(
          rail,
          sampledRegulator(this.around, rail, origin.regulator, from && this.rail(from.name)),
        );
      }
      case 'filter': {
        const input = origin.filter.from && this.rail(origin.filter.from.name);
        return input && this.#source(rail, sampledFilter(this.around, rail, origin.filter, input));
      }
      case 'pump':
        return this.#pump(rail);
      default:
        return undefined;
    }
  }

  #source(rail: Rail, source: SampledSource | undefined): SampledRail | undefined {
    if (!source) return undefined;
    const { behind } = source;
    const reach = this.#once((mode) => {
      const volts = source.volts(mode);
      return volts === undefined ? undefined : { volts, ripple: null };
    });
    return {
      rail,
      used: source.used,
      reach,
      behind: behind ?? ((_pump, mode) => () => reach(mode)?.volts),
    };
  }

  #pump(rail: Rail): SampledRail | undefined {
    const models = this.solved.models.get(rail.name);
    if (!models || models.length !== this.around.modes.length) return undefined;
    const used = new Set<number>();
    const points = models.map(({ model }, mode) => this.#point(rail, model, mode, used));
    const reach = this.#once((mode) => {
      const at = points[mode]!();
      return at && samplePump(models[mode]!.model, at);
    });
    return { rail, used, reach, behind: (_pump, mode) => () => reach(mode)?.volts };
  }

  /** Values of all of a pump's variables in the present sample; undefined when a rail below has no steady state. */
  #point(rail: Rail, model: PumpModel, mode: number, used: Set<number>): () => readonly number[] | undefined {
    const readers = model.variables.map((variable) => this.#variable(rail, variable, mode, used));
    return () => {
      const at: number[] = [];
      for (const read of readers) {
        const value = read();
        if (value === undefined) return undefined;
        at.push(value);
      }
      return at;
    };
  }

  /** Voltages below the pump are those of the sample, everything else is drawn. */
  #variable(rail: Rail, { label, path, band }: Variable, mode: number, used: Set<number>): Value {
    for (const below of this.around.board.rails.values()) {
      if (path !== below.path) continue;
      const ohms = label === sourceLabel(below.name) ? sourceOhms(this.around, below, used) : undefined;
      if (ohms) return ohms;
      const planned = label === railLabel(below.name) ? this.rail(below.name) : undefined;
      if (!planned) continue;
      for (const lot of planned.used) used.add(lot);
      return planned.behind(rail.name, mode, used);
    }
    return this.around.lots.reader(label, path, band, used);
  }

  /** Each rail is reached once in a sample and mode. */
  #once(compute: Reach): Reach {
    const memo = new Map<number, Reached | undefined>();
    this.#memos.push(memo);
    return (mode) => {
      if (!memo.has(mode)) memo.set(mode, compute(mode));
      return memo.get(mode);
    };
  }
}
