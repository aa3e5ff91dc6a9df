/**
 * All frames of pumps that could make a rail, after the closed forms have taken out those that cannot: too low without
 * any load, or too high at any load.
 */

import { isGap } from '../analysis/gap';
import type { RailVoltages } from '../analysis/rail-voltages';
import type { Catalogue, DiodeData } from '../catalog/part';
import type { Board, Rail, Topology } from '../model/board';
import { type DrivePlan, diodesOf, type Frame, needsTwoPhases, partCount } from './design';
import { drivePlans } from './drive-plans';

export interface Target {
  readonly negative: boolean;
  /** Magnitudes that the rail must reach and must not pass, V; Infinity where nothing bounds it. */
  readonly least: number;
  readonly most: number;
}

/** Least drop of a junction and least loss of a Schottky barrier at next to no current, V (common practice, no source). */
const leastDrop = { silicon: 0.25, schottky: 0.05 } as const;
const usualStages = 4;

/** Fewest parts first. */
export function framesOf(
  board: Board,
  rail: Rail,
  solved: RailVoltages,
  catalogue: Catalogue,
  target: Target,
): readonly Frame[] {
  const single = drivePlans(board, rail, false);
  const double = drivePlans(board, rail, true);
  const frames: Frame[] = [];
  for (const { topology, stages } of topologies(board, target.negative))
    for (const input of inputs(board, rail, solved, topology, target.negative))
      for (const diode of diodesIn(board, rail, catalogue))
        for (const drive of needsTwoPhases({ topology, stages }) ? double : single) {
          const frame: Frame = { topology, stages, negative: target.negative, input, drive, diode };
          if (couldReach(frame, solved, target)) frames.push(frame);
        }
  const present = rail.origin?.kind === 'pump' ? rail.origin.pump : undefined;
  const asNow = (frame: Frame) =>
    present?.topology === frame.topology && frame.drive.label.endsWith('as now') ? 0 : 1;
  return frames.sort((a, b) => partCount(a) - partCount(b) || asNow(a) - asNow(b));
}

function topologies(board: Board, negative: boolean): readonly { topology: Topology; stages: number }[] {
  const most = Math.round(board.stock.stages?.typical ?? usualStages);
  const many = Array.from({ length: Math.max(0, most - 1) }, (_, k) => k + 2);
  return [
    { topology: negative ? 'inverter' : 'doubler', stages: 1 },
    ...many.flatMap((stages) => [
      { topology: 'multiplier' as const, stages },
      { topology: 'ladder' as const, stages },
    ]),
  ];
}

/** Rails that a pump may stand on: known, of the right sign, and none that pumps or depends on this one. */
function inputs(
  board: Board,
  rail: Rail,
  solved: RailVoltages,
  topology: Topology,
  negative: boolean,
): readonly string[] {
  if (negative) return ['ground'];
  const present = rail.origin?.kind === 'pump' ? rail.origin.pump.input?.name : undefined;
  const known = [...board.rails.values()]
    .filter(({ name, origin }) => {
      if (name === rail.name || !origin) return false;
      if (name === present) return true;
      if (board.stock.rails && !board.stock.rails.includes(name)) return false;
      const voltage = solved.voltages.get(name);
      return origin.kind !== 'pump' && voltage !== undefined && !isGap(voltage) && voltage.min > 0;
    })
    .map(({ name }) => name);
  return topology === 'ladder' ? [...known, 'ground'] : known;
}

function diodesIn(board: Board, rail: Rail, catalogue: Catalogue): readonly DiodeData[] {
  const usual = ['schottky-signal', 'silicon-switching'];
  const stocked = board.stock.diodes ?? catalogue.diodes.filter(({ key }) => usual.includes(key));
  const present = rail.origin?.kind === 'pump' ? rail.origin.pump.diodes : [];
  const own = present.length === 1 && present[0]?.data && present[0].ref ? [present[0].data] : [];
  // Least drop first: kind, then the current at a volt's fraction, which grows with the saturation current.
  const rank = ({ kind, saturation }: DiodeData) => (kind === 'schottky' ? 0 : 1) - saturation.typical;
  return [...new Map([...own, ...stocked].map((each) => [each.key, each])).values()].sort(
    (a, b) => rank(a) - rank(b),
  );
}

/** Ideal voltage less the least that diodes take; nothing is asked of capacitors yet. */
function couldReach(frame: Frame, solved: RailVoltages, { least, most }: Target): boolean {
  const swing = magnitude(solved, frame.drive);
  const from = frame.input === 'ground' ? 0 : (typical(solved, frame.input) ?? Number.NaN);
  const ideal = from + frame.stages * swing;
  const drops = diodesOf(frame) * leastDrop[frame.diode.kind];
  if (!(ideal - drops >= least)) return false;
  // At its load a pump falls by its resistance, but without it nothing holds it down.
  return ideal - diodesOf(frame) * 0.45 <= most;
}

function magnitude(solved: RailVoltages, { swingRail }: DrivePlan): number {
  return Math.abs(typical(solved, swingRail) ?? Number.NaN);
}

function typical(solved: RailVoltages, name: string): number | undefined {
  const voltage = solved.voltages.get(name);
  return voltage && !isGap(voltage) ? voltage.typical : undefined;
}
