/**
 * What the board takes from one supply at any voltage of it: the board is computed at a few voltages held fixed, and
 * the power is interpolated between them.
 */
import type { Board, Supply } from '../model/board';
import { figure } from '../quantity/figure';
import { weightedModes } from './board-modes';
import { boardCurrents, type Currents } from './currents';
import { type Gap, isGap } from './gap';
import type { Memory } from './memory';
import { type RailVoltages, railVoltages } from './rail-voltages';

/** Ampere out of the supply at a voltage (magnitude) in a mode, given by its place among the weighted modes. */
export type Draw = (mode: number, volts: number) => number;

export interface BoardDraw {
  readonly typical: Draw;
  /** Where everything takes most; null when a pump has no such corner. */
  readonly most: Draw | null;
  /** Voltages at which the board was computed. */
  readonly samples: readonly number[];
}

/** Amperes by mode at one voltage of the supply. */
interface Sample {
  readonly volts: number;
  readonly typical: readonly number[];
  readonly most: readonly (number | null)[];
  /** Of each linear regulator: how far its input stands above what it needs, V. */
  readonly spare: ReadonlyMap<string, number>;
}

/** Rails that come straight from the supply. */
export function railsOf(board: Board, supply: Supply): readonly string[] {
  return [...board.rails.values()]
    .filter(({ origin }) => origin?.kind === 'supply' && origin.supply.name === supply.name)
    .map(({ name }) => name);
}

/** A: out of all rails of the supply together; null when a part is not known. */
export function drawnFromSupply(
  rails: readonly string[],
  of: Pick<Currents, 'rail'>,
  mode: string | undefined,
): number | null {
  let sum = 0;
  for (const name of rails) {
    const part = of.rail(name, mode);
    if (part === null) return null;
    sum += part;
  }
  return sum;
}

/**
 * `V I(V)` is a parabola for loads of constant current, constant power and constant resistance in any mixture, and very
 * nearly one for a pump: three voltages tell it. Where a linear regulator falls out of regulation it has a kink, so
 * that the parabola ends there and another one begins.
 */
export function boardDraw(
  board: Board,
  supply: Supply,
  memory: Memory,
  range: { readonly low: number; readonly high: number; readonly negative: boolean },
): BoardDraw | Gap {
  const { low, high, negative } = range;
  const known = new Map<number, Sample | Gap>();
  const at = (volts: number) => {
    const found = known.get(volts) ?? sampleAt(board, supply, memory, volts, negative);
    known.set(volts, found);
    return found;
  };
  const first = [low, (low + high) / 2, high].map(at);
  const gap = first.find(isGap);
  if (gap) return gap;
  const edges = [low, ...kinks(first as Sample[]), high];
  const panels: Sample[][] = [];
  for (const [k, from] of edges.slice(0, -1).entries()) {
    const to = edges[k + 1]!;
    const middle = (low + high) / 2;
    const place = (middle - from) / (to - from);
    // The first middle serves again where it stands well inside.
    const nodes = [from, place > 0.2 && place < 0.8 ? middle : (from + to) / 2, to].map(at);
    const missing = nodes.find(isGap);
    if (missing) return missing;
    panels.push(nodes as Sample[]);
  }
  const typical = (sample: Sample, mode: number) => sample.typical[mode] ?? null;
  const most = (sample: Sample, mode: number) => sample.most[mode] ?? null;
  const complete = panels.flat().every((sample) => sample.most.every((amps) => amps !== null));
  return {
    typical: interpolated(panels, typical),
    most: complete ? interpolated(panels, most) : null,
    samples: [...known.keys()].sort((a, b) => a - b),
  };
}

function sampleAt(
  board: Board,
  supply: Supply,
  memory: Memory,
  volts: number,
  negative: boolean,
): Sample | Gap {
  const { path, name, nameSpan, span, keys } = supply;
  const held: Supply = {
    path,
    name,
    nameSpan,
    span,
    keys,
    voltage: figure(negative ? -volts : volts, 'V', { kind: 'derived', note: 'along the discharge' }),
  };
  const at = { ...board, supplies: new Map([...board.supplies, [name, held]]) };
  const solved = railVoltages(at, memory);
  const currents = boardCurrents(at, solved);
  const rails = railsOf(board, supply);
  const modes = weightedModes(board);
  const typical = modes.map((mode) => drawnFromSupply(rails, currents, mode.name));
  if (typical.includes(null)) return { because: whyNot(solved, volts) };
  return {
    volts,
    typical: typical.map((amps) => amps ?? 0),
    most: modes.map((mode, k) => {
      const amps = drawnFromSupply(rails, currents.most, mode.name);
      return amps === null ? null : Math.max(amps, typical[k] ?? 0);
    }),
    spare: spares(board, solved),
  };
}

function whyNot({ voltages }: RailVoltages, volts: number): string {
  const at = `at ${Number(volts.toPrecision(3))} V the board has no solution`;
  const gap = [...voltages.values()].find(isGap);
  return gap ? `${at}: ${gap.because}` : at;
}

function spares(board: Board, { voltages }: RailVoltages): Map<string, number> {
  const found = new Map<string, number>();
  for (const { name, origin } of board.rails.values()) {
    if (origin?.kind !== 'regulator') continue;
    const { from, dropout, output, kind } = origin.regulator;
    const input = from && voltages.get(from.name);
    if (kind === 'switching' || !dropout || !output || !input || isGap(input)) continue;
    found.set(name, Math.abs(input.typical) - dropout.typical - Math.abs(output.typical));
  }
  return found;
}

/** Kinks nearer to each other or to an end than this share of the range are not worth a panel. */
const narrow = 0.02;

/** Voltages of the supply at which a regulator falls out of regulation, rising. */
function kinks(samples: readonly Sample[]): number[] {
  const [low, high] = [samples[0]!.volts, samples.at(-1)!.volts];
  const least = narrow * (high - low);
  const crossings = samples.slice(0, -1).flatMap((a, k) => {
    const b = samples[k + 1]!;
    return [...a.spare].flatMap(([name, from]) => {
      const to = b.spare.get(name);
      if (to === undefined || from === to || from * to > 0) return [];
      const share = from / (from - to);
      // Rounding must not make a second voltage out of one that is known.
      if (share < 1e-6) return [a.volts];
      return [share > 1 - 1e-6 ? b.volts : a.volts + share * (b.volts - a.volts)];
    });
  });
  const kept: number[] = [];
  for (const volts of crossings.sort((a, b) => a - b))
    if (volts - (kept.at(-1) ?? low) > least && high - volts > least) kept.push(volts);
  return kept;
}

function interpolated(
  panels: readonly (readonly Sample[])[],
  amps: (sample: Sample, mode: number) => number | null,
): Draw {
  return (mode, volts) => {
    const panel = panels.find((nodes) => volts <= nodes.at(-1)!.volts) ?? panels.at(-1)!;
    const points = panel.map((sample) => ({
      x: sample.volts,
      y: sample.volts * (amps(sample, mode) ?? Number.NaN),
    }));
    return parabola(points, volts) / volts;
  };
}

/** Through three points, by Lagrange's formula. */
function parabola(points: readonly { readonly x: number; readonly y: number }[], x: number): number {
  return points.reduce((sum, a) => {
    const others = points.filter((b) => b !== a);
    return sum + a.y * others.reduce((product, b) => (product * (x - b.x)) / (a.x - b.x), 1);
  }, 0);
}
