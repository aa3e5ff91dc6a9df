/**
 * The rails of a board in one sample of it: supplies and regulators within their bands, and each pump solved on the
 * voltages that the same sample has below it. Currents that sag a supply are those of the typical board.
 */
import type { Board, Rail, Regulator } from '../model/board';
import { weightedModes } from './board-modes';
import { boardCurrents } from './currents';
import { type Drawn, drawnFrom } from './drawn';
import { type Gap, isGap } from './gap';
import type { Lots, Reader } from './lots';
import { railLabel, sourceLabel } from './pump-book';
import type { PumpModel, Variable } from './pump-model';
import { type Reached, samplePump } from './pump-sample';
import { type RailVoltages, railVoltages } from './rail-voltages';
import { supplyResistance, supplyVoltage } from './supply-voltage';

/** What a rail reaches in the present sample in the mode of that index; undefined when it has no steady state. */
type Reach = (mode: number) => Reached | undefined;

export interface SampledRail {
  readonly rail: Rail;
  readonly reach: Reach;
  /** Lots that it depends on, its own and those of the rails below. */
  readonly used: ReadonlySet<number>;
  /** As the pump behind another rail's name sees it: without that pump's own current. */
  readonly behind: (pump: string, mode: number) => number | undefined;
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
  const planner = new Planner(board, lots, solved, drawn);
  return {
    modes: planner.modes,
    next: () => planner.next(),
    rail: (name) => {
      const voltage = solved.voltages.get(name);
      if (voltage && isGap(voltage)) return voltage;
      return planner.rail(name) ?? { because: `the rail ${name} is not known` };
    },
  };
}

class Planner {
  readonly modes: readonly (string | undefined)[];
  readonly #planned = new Map<string, SampledRail | undefined>();
  readonly #memos: Map<number, Reached | undefined>[] = [];

  constructor(
    private readonly board: Board,
    private readonly lots: Lots,
    private readonly solved: RailVoltages,
    private readonly drawn: Drawn,
  ) {
    this.modes = weightedModes(board).map(({ name }) => name);
  }

  next(): void {
    for (const memo of this.#memos) memo.clear();
  }

  /** Undefined for a rail without a voltage. */
  rail(name: string): SampledRail | undefined {
    if (this.#planned.has(name)) return this.#planned.get(name);
    const rail = this.board.rails.get(name);
    const voltage = this.solved.voltages.get(name);
    const planned = rail && voltage && !isGap(voltage) ? this.#plan(rail) : undefined;
    this.#planned.set(name, planned);
    return planned;
  }

  #plan(rail: Rail): SampledRail | undefined {
    switch (rail.origin?.kind) {
      case 'supply':
        return this.#supply(rail, rail.origin.supply.name);
      case 'regulator':
        return this.#regulator(rail, rail.origin.regulator);
      case 'pump':
        return this.#pump(rail);
      default: {
        const used = new Set<number>();
        const band = this.solved.voltages.get(rail.name);
        if (!band || isGap(band)) return undefined;
        const volts = this.lots.reader(railLabel(rail.name), rail.path, band, used);
        return this.#finish(rail, used, () => ({ volts: volts(), ripple: null }));
      }
    }
  }

  #supply(rail: Rail, name: string): SampledRail | undefined {
    const supply = this.board.supplies.get(name);
    const open = supply && supplyVoltage(supply);
    if (!supply || !open) return undefined;
    const used = new Set<number>();
    const volts = this.lots.reader(`supply ${name}`, supply.path, open, used);
    const ohms = this.#source(rail, used);
    const total = (mode: number) => this.drawn.total(rail.name, this.modes[mode]);
    const reach: Reach = (mode) => ({ volts: volts() - (ohms?.() ?? 0) * total(mode), ripple: null });
    const behind = (pump: string, mode: number) => {
      const own = this.drawn.byPump(rail.name, this.modes[mode], pump);
      return volts() - (ohms?.() ?? 0) * (total(mode) - own);
    };
    return { ...this.#finish(rail, used, reach), behind };
  }

  /** Source resistance of the supply that a rail is, one for all rails of that supply. */
  #source(rail: Rail, used: Set<number>): Reader | undefined {
    const supply =
      rail.origin?.kind === 'supply' ? this.board.supplies.get(rail.origin.supply.name) : undefined;
    const ohms = supply && supplyResistance(supply);
    return ohms ? this.lots.reader(`supply ${supply.name} resistance`, supply.path, ohms, used) : undefined;
  }

  #regulator(rail: Rail, regulator: Regulator): SampledRail | undefined {
    const { output, dropout, from, kind } = regulator;
    if (!output) return undefined;
    const used = new Set<number>();
    const path = `${rail.path}.regulator`;
    const held = this.lots.reader(`${rail.name} regulator output`, path, output, used);
    const input = from && this.rail(from.name);
    // As in the analysis: without a known input, or where its dropout does not matter, it is taken at its word.
    if (!input || !dropout || kind === 'switching')
      return this.#finish(rail, used, () => ({ volts: held(), ripple: null }));
    const lost = this.lots.reader(`${rail.name} regulator dropout`, path, dropout, used);
    return this.#finish(rail, new Set([...used, ...input.used]), (mode) => {
      const below = input.reach(mode);
      return below && { volts: Math.min(held(), below.volts - lost()), ripple: null };
    });
  }

  #pump(rail: Rail): SampledRail | undefined {
    const models = this.solved.models.get(rail.name);
    if (!models || models.length !== this.modes.length) return undefined;
    const used = new Set<number>();
    const points = models.map(({ model }, mode) => this.#point(rail, model, mode, used));
    return this.#finish(rail, used, (mode) => {
      const at = points[mode]!();
      return at && samplePump(models[mode]!.model, at);
    });
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

  #variable(
    rail: Rail,
    { label, path, band }: Variable,
    mode: number,
    used: Set<number>,
  ): () => number | undefined {
    for (const below of this.board.rails.values()) {
      if (path !== below.path) continue;
      if (label === sourceLabel(below.name)) {
        const source = this.#source(below, used);
        if (source) return source;
      }
      const planned = label === railLabel(below.name) ? this.rail(below.name) : undefined;
      if (!planned) continue;
      for (const lot of planned.used) used.add(lot);
      return () => planned.behind(rail.name, mode);
    }
    return this.lots.reader(label, path, band, used);
  }

  /** Each rail is reached once in a sample and mode. */
  #finish(rail: Rail, used: ReadonlySet<number>, compute: Reach): SampledRail {
    const memo = new Map<number, Reached | undefined>();
    this.#memos.push(memo);
    const reach: Reach = (mode) => {
      if (!memo.has(mode)) memo.set(mode, compute(mode));
      return memo.get(mode);
    };
    return { rail, used, reach, behind: (_pump, mode) => reach(mode)?.volts };
  }
}
