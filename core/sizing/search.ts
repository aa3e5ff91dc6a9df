/**
 * "Size this rail": from what a rail needs to bills of parts that meet it. Closed forms take out what cannot work, the
 * solver decides on the rest at all corners, and what is proposed has gone through the same checks as any board: it
 * raises no warning and no error that was not there before.
 */

import { computeBoard } from '../analysis/analyse-board';
import { isGap } from '../analysis/gap';
import { loadAmps } from '../analysis/load-current';
import { Memory } from '../analysis/memory';
import { isMet, type Shortfall, shortfall } from '../analysis/needs';
import { once } from '../analysis/once';
import type { Bears } from '../analysis/pump-bias';
import { setUpPump } from '../analysis/pump-solution';
import { type PumpVerdict, pumpVerdict } from '../analysis/pump-verdict';
import { railSolver, railVoltages } from '../analysis/rail-voltages';
import type { BoardAnalysis, PumpResult } from '../analysis/types';
import type { CapacitorKind } from '../catalog/part';
import { runChecks } from '../checks';
import type { Board, Capacitor, Rail } from '../model/board';
import { readBoard } from '../model/build';
import { applyEdits, type TextEdit } from '../text/edit';
import { type CapacitorPlan, type Design, type Frame, partCount, totalCapacitance } from './design';
import { designEdits } from './edits';
import { framesOf, type Target } from './frames';
import { firstFrom, stepsInDecade, stockedValues } from './values';

export interface Candidate {
  readonly design: Design;
  readonly edits: readonly TextEdit[];
  readonly pump: PumpResult;
  readonly short: Shortfall;
}

/** A candidate that went through all checks, with the board as it would be. */
export interface Verified extends Candidate {
  readonly analysis: BoardAnalysis;
}

export interface Progress {
  readonly done: number;
  readonly of: number;
}

export interface Found {
  /** In the order of cost: parts, capacitance, pins, ripple. */
  readonly verified: readonly Verified[];
  /** The one that came nearest, where nothing was verified. */
  readonly nearest?: Candidate;
  /** Findings that stand against the nearest although it meets the needs. */
  readonly objections: readonly string[];
  /** Pumps solved (with corners), and designs that there are in all. */
  readonly solves: number;
  readonly space: number;
}

/** Frames that are looked into, and those of more parts than the fewest: other kinds of answers. */
/** Steps of the series by which the flying capacitor may be larger than it must. */
const mostLarger = 6;
/** Designs of a frame that get the full look. */
const mostLooks = 10;
const mostFrames = 120;
const mostBeyond = 6;
/** Ratings that capacitors are stocked in (common practice, no source), V. */
const usualRatings = [6.3, 10, 16, 25, 35, 50, 63, 100];

export function* search(analysis: BoardAnalysis, rail: Rail, target: Target): Generator<Progress, Found> {
  const run = new Search(analysis, rail, target);
  const frames = framesOf(
    analysis.reading.board,
    rail,
    railVoltages(analysis.reading.board, run.memory),
    analysis.reading.catalogue,
    target,
  );
  const tried = frames.slice(0, mostFrames);
  const verified: Verified[] = [];
  const settled = new Set<string>();
  let done = 0;
  let beyond = 0;
  for (const frame of tried) {
    yield { done: done++, of: tried.length };
    // Diodes come with the least drop first: one that works leaves nothing to win for the next.
    const way = `${frame.topology} ${frame.stages} ${frame.input} ${frame.drive.label}`;
    if (settled.has(way)) continue;
    const fewest = verified[0] && partCount(verified[0].design);
    if (fewest !== undefined && partCount(frame) > fewest && beyond++ >= mostBeyond) break;
    const found = run.size(frame);
    if (!found) continue;
    verified.push(found);
    settled.add(way);
  }
  return {
    verified: verified.sort(byCost),
    ...(run.nearest ? { nearest: run.nearest } : {}),
    objections: run.objections,
    solves: run.solves,
    space: frames.length * run.values.length ** 2,
  };
}

/** Parts, then capacitance, then pins, then ripple. */
function byCost(a: Verified, b: Verified): number {
  return (
    partCount(a.design) - partCount(b.design) ||
    totalCapacitance(a.design) - totalCapacitance(b.design) ||
    a.design.drive.pins - b.design.drive.pins ||
    a.pump.ripple.highest.value - b.pump.ripple.highest.value
  );
}

class Search {
  readonly memory = new Memory();
  readonly values: readonly number[];
  solves = 0;
  nearest: Candidate | undefined;
  objections: readonly string[] = [];
  readonly #board: Board;
  readonly #known: ReadonlySet<string>;
  readonly #bears = new Map<Frame, Bears>();
  readonly #verdicts = new Map<string, PumpVerdict | undefined>();
  readonly #cache = new Map<string, Candidate | undefined>();

  constructor(
    private readonly analysis: BoardAnalysis,
    private readonly rail: Rail,
    private readonly target: Target,
  ) {
    this.#board = analysis.reading.board;
    this.values = stockedValues(this.#board);
    this.#known = new Set(serious(analysis).map(({ code, at }) => `${code} ${at}`));
  }

  /** The smallest capacitors with which the frame meets the needs, verified; undefined when none do. */
  size(frame: Frame): Verified | undefined {
    const last = this.values.length - 1;
    const roomy = (f: number) => Math.min(last, f + 2 * this.#decade());
    const guess = this.#flyingGuess(frame);
    const f = firstFrom(guess, last, (index) => this.#reaches(frame, index, roomy(index)));
    if (f === undefined) {
      this.#at(frame, last, last);
      return undefined;
    }
    // A larger flying capacitor may need less reservoir: the sum decides.
    const pairs: { readonly flying: number; readonly reservoir: number; readonly total: number }[] = [];
    const total = (flying: number, reservoir: number) =>
      totalCapacitance(this.#design(frame, flying, reservoir));
    const least = this.#leastReservoir();
    for (let flying = f; flying <= Math.min(last, f + mostLarger); flying++) {
      const best = Math.min(...pairs.map((pair) => pair.total));
      // From one flying value to the next the reservoir falls by a step at most.
      const before = pairs.at(-1)?.reservoir ?? least + 1;
      if (total(flying, Math.max(least, before - 1)) >= best) break;
      const reservoir = firstFrom(
        Math.max(least, Math.min(last, flying + this.#decade())),
        last,
        (index) => index >= least && this.#isQuiet(frame, flying, index),
      );
      if (reservoir === undefined) continue;
      pairs.push({ flying, reservoir, total: total(flying, reservoir) });
    }
    // The full look may see a little more ripple or a little less voltage: then the next larger reservoir is next in line.
    for (let looks = 0; looks < mostLooks && pairs.length > 0; looks++) {
      pairs.sort((x, y) => y.total - x.total);
      const { flying, reservoir } = pairs.pop()!;
      const found = this.#at(frame, flying, reservoir);
      const verified = found && isMet(found.short) ? this.#verify(found) : undefined;
      if (verified) return verified;
      if (found && found.short.strong === 0 && reservoir < last)
        pairs.push({ flying, reservoir: reservoir + 1, total: total(flying, reservoir + 1) });
    }
    return undefined;
  }

  #reaches(frame: Frame, f: number, r: number): boolean {
    const verdict = this.#verdict(frame, f, r);
    const does = (volts: number) =>
      Math.abs(volts) >= this.target.least && volts < 0 === this.target.negative;
    return verdict !== undefined && does(verdict.typical) && does(verdict.weakest());
  }

  #isQuiet(frame: Frame, f: number, r: number): boolean {
    const allowed = this.rail.needs?.ripple?.max;
    if (allowed === undefined) return true;
    const verdict = this.#verdict(frame, f, r);
    return verdict !== undefined && verdict.typicalRipple <= allowed && verdict.ripple() <= allowed;
  }

  /** The pump alone, on the rails as they are: what it does to them is for the full look at the end. */
  #verdict(frame: Frame, f: number, r: number): PumpVerdict | undefined {
    const edits = designEdits(this.analysis.text, this.rail, this.#design(frame, f, r));
    if (!edits) return undefined;
    const text = applyEdits(this.analysis.text, edits);
    if (this.#verdicts.has(text)) return this.#verdicts.get(text);
    const { board } = readBoard(text, this.analysis.reading.catalogue);
    const rail = board.rails.get(this.rail.name);
    const solver = railSolver(board, this.memory);
    const setup =
      rail?.origin?.kind === 'pump'
        ? setUpPump(board, rail, rail.origin.pump, solver.around(rail))
        : undefined;
    const verdict = setup && !isGap(setup) ? pumpVerdict(setup.parts, this.#bears.get(frame)) : undefined;
    this.solves++;
    if (verdict) this.#bears.set(frame, verdict.bears);
    const kept = verdict && {
      ...verdict,
      weakest: once(verdict.weakest),
      ripple: once(verdict.ripple),
    };
    this.#verdicts.set(text, kept);
    return kept;
  }

  /** Index of a value near the one that the slow limit asks for: a tenth of a volt of drop for each stage. */
  #flyingGuess(frame: Frame): number {
    const amps = [...this.rail.loads.values()].reduce((sum, load) => {
      const most = loadAmps(load, 'max', () => this.target.least);
      return sum + (Number.isFinite(most) ? most : 0);
    }, 1e-6);
    const clock = frame.drive.names[0];
    const hertz = (clock && this.#frequencyOf(frame, clock)) || 1e5;
    const farads = amps / (hertz * 0.1);
    const index = this.values.findIndex((value) => value >= farads);
    return index < 0 ? this.values.length - 1 : index;
  }

  #frequencyOf(frame: Frame, name: string): number | undefined {
    const written = frame.drive.entries
      .map(({ text }) => /frequency: ([\d.]+) (k|M)?Hz/.exec(text))
      .find(Boolean);
    if (written) return Number(written[1]) * (written[2] === 'k' ? 1e3 : written[2] === 'M' ? 1e6 : 1);
    const { board } = this.analysis.reading;
    const driver = board.drivers.get(name);
    const found = this.analysis.clocks.get(driver?.input?.name ?? name)?.frequency?.typical;
    return found ?? undefined;
  }

  #decade(): number {
    return stepsInDecade(this.values);
  }

  /** Without a need for ripple nothing says how small the reservoir may become: ten times 100 nF at least. */
  #leastReservoir(): number {
    if (this.rail.needs?.ripple) return 0;
    const present = this.rail.origin?.kind === 'pump' ? this.rail.origin.pump.reservoir?.value : undefined;
    const least = present?.typical ?? 1e-6;
    const index = this.values.findIndex((farads) => farads >= least * (1 - 1e-9));
    return index < 0 ? this.values.length - 1 : index;
  }

  #design(frame: Frame, f: number, r: number): Design {
    return {
      ...frame,
      flying: this.#plan(frame, this.values[f]!, 'flying'),
      reservoir: this.#plan(frame, this.values[r]!, 'reservoir'),
    };
  }

  /** With everything that a board knows of its pump. */
  #at(frame: Frame, f: number, r: number): Candidate | undefined {
    const design = this.#design(frame, f, r);
    const edits = designEdits(this.analysis.text, this.rail, design);
    if (!edits) return undefined;
    const text = applyEdits(this.analysis.text, edits);
    if (this.#cache.has(text)) return this.#cache.get(text);
    const { board } = readBoard(text, this.analysis.reading.catalogue);
    const solver = railSolver(board, this.memory);
    solver.voltage(this.rail.name);
    this.solves++;
    const pump = solver.pumps.get(this.rail.name);
    const found = pump && { design, edits, pump, short: shortfall(this.rail.needs, pump) };
    this.#cache.set(text, found);
    if (found && (!this.nearest || distance(found.short) < distance(this.nearest.short)))
      this.nearest = found;
    return found;
  }

  /** Kind and rating: those of the file where it has them, else the first stocked kind that bears the value. */
  #plan(frame: Frame, farads: number, column: 'flying' | 'reservoir'): CapacitorPlan {
    const pump = this.rail.origin?.kind === 'pump' ? this.rail.origin.pump : undefined;
    const present: Capacitor | undefined = column === 'flying' ? pump?.flying[0] : pump?.reservoir;
    if (present?.kind.data && pump?.topology === frame.topology)
      return {
        farads,
        kind: present.kind.data,
        asWritten: true,
        ...(present.rated ? { rated: present.rated.typical } : {}),
      };
    const kind = this.#kindFor(farads);
    const volts = column === 'flying' ? this.target.least / frame.stages : this.#highest();
    // Twice for what loses value, a quarter more for the rest (common practice, no source).
    const wanted = (kind.bias ? 2 : 1.3) * volts;
    const ratings = [...(this.#board.stock.rated ?? usualRatings)].sort((a, b) => a - b);
    const rated = ratings.find((each) => each >= wanted) ?? ratings.at(-1);
    return { farads, kind, ...(rated === undefined ? {} : { rated }) };
  }

  #highest(): number {
    return Number.isFinite(this.target.most) ? this.target.most : 1.5 * this.target.least;
  }

  #kindFor(farads: number): CapacitorKind {
    const { catalogue } = this.analysis.reading;
    const stocked = this.#board.stock.kinds;
    const usual = (key: string) => catalogue.capacitors.find((kind) => kind.key === key)!;
    const kinds = stocked && stocked.length > 0 ? stocked : [usual('x7r'), usual('aluminium')];
    const wet = kinds.find(({ polarised }) => polarised);
    return farads > 22e-6 * (1 + 1e-9) && wet ? wet : kinds[0]!;
  }

  /** The whole board with it: no warning and no error that was not there before. */
  #verify(candidate: Candidate): Verified | undefined {
    const text = applyEdits(this.analysis.text, candidate.edits);
    const reading = readBoard(text, this.analysis.reading.catalogue);
    const analysis = computeBoard(text, this.analysis.file, reading, this.memory);
    const raised = serious(analysis).filter(({ code, at }) => !this.#known.has(`${code} ${at}`));
    const own = raised.length === 0;
    if (own) return { ...candidate, analysis };
    if (this.objections.length === 0) this.objections = raised.map(({ message }) => message);
    return undefined;
  }
}

/** Warnings and errors of a whole board. */
function serious(analysis: BoardAnalysis) {
  const all = [...analysis.reading.findings, ...analysis.problems, ...runChecks(analysis)];
  return all.filter(({ severity }) => severity !== 'information');
}

function distance({ weak, strong, ripple }: Shortfall): number {
  return weak + strong + ripple;
}
