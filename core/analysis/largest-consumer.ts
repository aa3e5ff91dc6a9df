/**
 * What takes most from a rail in a mode: down the tree of rails, always along the largest part, to a load or a chip.
 */
import type { Board, Load } from '../model/board';
import type { Span } from '../text/span';
import { activeIn } from './board-modes';
import { consumersOf } from './consumers';
import type { Currents } from './currents';
import type { RailVoltages } from './rail-voltages';
import { regulatorInput } from './regulators';

export interface Consumer {
  /** Of a load, a chip, or a rail itself where nothing on it is larger than what it loses. */
  readonly name: string;
  readonly rail: string;
  readonly span: Span;
  /** On its own rail, A. */
  readonly amps: number;
}

interface Site {
  readonly board: Board;
  readonly solved: RailVoltages;
  readonly currents: Currents;
}

/** A part of a rail's current; `next` is the rail that it goes on to. */
interface Part {
  readonly name: string;
  readonly span: Span | undefined;
  readonly amps: number;
  readonly next?: string;
}

export function largestConsumer(
  site: Site,
  rails: readonly string[],
  mode: string | undefined,
): Consumer | undefined {
  const consumers = consumersOf(site.board, site.solved);
  let best: { part: Part; rail: string } | undefined;
  let here = rails;
  // A rail cannot stand on itself, so that the way down is no longer than the list of rails.
  for (let depth = 0; depth <= site.board.rails.size; depth++) {
    const parts = here.flatMap((rail) =>
      partsOf(site, consumers, rail, mode).map((part) => ({ part, rail })),
    );
    const largest = parts.reduce<(typeof parts)[number] | undefined>(
      (a, b) => (b.part.amps > (a?.part.amps ?? 0) ? b : a),
      undefined,
    );
    if (!largest) break;
    best = largest;
    if (largest.part.next === undefined) break;
    here = [largest.part.next];
  }
  if (!best?.part.span) return undefined;
  const { name, span, amps } = best.part;
  return { name, span, amps, rail: best.rail };
}

function partsOf(
  { board, solved, currents }: Site,
  { on, drivenBy, pinsOf }: ReturnType<typeof consumersOf>,
  railName: string,
  mode: string | undefined,
): Part[] {
  const rail = board.rails.get(railName);
  if (!rail) return [];
  const volts = Math.abs(solved.at(railName, mode) ?? Number.NaN);
  const hanging = on.get(railName);
  const point = (name: string) => solved.pumps.get(name)?.points.find((each) => each.mode === mode);
  const loads = [...rail.loads.values()]
    .filter((load) => activeIn(mode, load.modes))
    .map((load): Part => ({ name: load.name, span: load.nameSpan, amps: loadAmps(load, volts) }));
  const bleeder: Part[] = rail.bleeder
    ? [{ name: 'the bleeder', span: rail.bleeder.span, amps: volts / rail.bleeder.typical }]
    : [];
  /** Through pins, by the rail that their pump makes. */
  const pumped = new Map<string, number>();
  const add = (name: string, amps: number) => pumped.set(name, (pumped.get(name) ?? 0) + amps);
  const chips = (hanging?.chips ?? []).map((chip): Part => {
    let driven = 0;
    for (const { railName: made, index, share } of drivenBy.get(chip.name) ?? []) {
      const amps = share * (point(made)?.drives[index]?.sourceAverage ?? 0);
      driven += amps;
      add(made, amps);
    }
    return { name: chip.name, span: chip.nameSpan, amps: (currents.chip(chip, mode) ?? 0) - driven };
  });
  for (const { name } of hanging?.pumped ?? []) {
    const byPins = (pinsOf.get(name) ?? [])
      .filter((pin) => pin.chipRail === railName)
      .reduce((sum, pin) => sum + pin.share * (point(name)?.drives[pin.index]?.sourceAverage ?? 0), 0);
    add(name, (point(name)?.railCurrents.get(railName) ?? 0) - byPins);
  }
  for (const made of hanging?.regulated ?? []) {
    if (made.origin?.kind !== 'regulator') continue;
    const output = Math.abs(solved.at(made.name, mode) ?? Number.NaN);
    const out = currents.rail(made.name, mode) ?? 0;
    add(made.name, regulatorInput(made.origin.regulator, output, volts, out) ?? 0);
  }
  for (const made of hanging?.filtered ?? []) add(made.name, currents.rail(made.name, mode) ?? 0);
  const rails = [...pumped].map(
    ([name, amps]): Part => ({ name, span: board.rails.get(name)?.nameSpan, amps, next: name }),
  );
  return [...loads, ...bleeder, ...chips, ...rails];
}

function loadAmps({ current, resistance, power }: Load, volts: number): number {
  let amps = 0;
  if (current) amps += Math.abs(current.typical);
  if (resistance) amps += volts / resistance.typical;
  if (power) amps += power.typical / volts;
  return amps;
}
