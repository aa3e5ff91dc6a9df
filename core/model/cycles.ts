/**
 * Rails that stand on themselves: through a regulator, a filter, a pump's input, or the chip whose pin drives it.
 */
import type { Finding } from '../checks/finding';
import type { Span } from '../text/span';
import type { Board, PinRef, Rail, Ref } from './board';

/** One finding for each group of rails that stand on one another. */
export function railCycles(board: Board): Finding[] {
  const edges = peeled(
    new Map([...board.rails.values()].map((rail) => [rail.name, dependencies(board, rail)])),
  );
  const found: Finding[] = [];
  const done = new Set<string>();
  for (const start of board.rails.values()) {
    if (done.has(start.name)) continue;
    const cycle = shortestCycle(start.name, edges);
    if (!cycle) continue;
    for (const step of cycle) done.add(step.from);
    found.push(finding(board, cycle));
  }
  return found;
}

interface Edge {
  readonly from: string;
  readonly to: string;
  /** Where the file says so. */
  readonly span: Span;
  /** `through clock tick of chip mcu`; empty when the rail is named outright. */
  readonly through: string;
}

function finding(board: Board, cycle: readonly Edge[]): Finding {
  const [first] = cycle;
  const names = [...cycle.map((edge) => edge.from), first?.from ?? ''].map((name) => `\`${name}\``);
  const message =
    cycle.length === 1
      ? `Rail ${names[0]} stands on itself${first?.through ?? ''}: it cannot start. Name another rail.`
      : `These rails stand on one another and cannot start: ${names.join(' on ')}. One of them must come from elsewhere.`;
  return {
    code: 'rail-cycle',
    severity: 'error',
    at: board.rails.get(first?.from ?? '')?.path ?? 'rails',
    span: first?.span ?? { start: 0, end: 0 },
    message,
    related: cycle.map((edge) => ({
      span: edge.span,
      message: `\`${edge.from}\` stands on \`${edge.to}\`${edge.through}.`,
    })),
  };
}

/** Without the rails that stand on nothing doubtful: what is left contains all circles, and mostly nothing else. */
function peeled(edges: ReadonlyMap<string, readonly Edge[]>): ReadonlyMap<string, readonly Edge[]> {
  const standing = new Map<string, Edge[]>();
  for (const edge of [...edges.values()].flat()) {
    const above = standing.get(edge.to);
    if (above) above.push(edge);
    else standing.set(edge.to, [edge]);
  }
  const open = new Map([...edges].map(([name, below]) => [name, below.length]));
  const sound = [...open].flatMap(([name, count]) => (count === 0 ? [name] : []));
  for (let next = sound.pop(); next !== undefined; next = sound.pop()) {
    for (const { from } of standing.get(next) ?? []) {
      const left = (open.get(from) ?? 0) - 1;
      open.set(from, left);
      if (left === 0) sound.push(from);
    }
  }
  return new Map([...edges].filter(([name]) => (open.get(name) ?? 0) > 0));
}

/** The shortest way from a rail back to itself. */
function shortestCycle(start: string, edges: ReadonlyMap<string, readonly Edge[]>): Edge[] | undefined {
  const cameBy = new Map<string, Edge>();
  const queue = [start];
  for (let next = queue.shift(); next !== undefined; next = queue.shift()) {
    for (const edge of edges.get(next) ?? []) {
      if (edge.to === start) return trace(edge, cameBy, start);
      if (cameBy.has(edge.to)) continue;
      cameBy.set(edge.to, edge);
      queue.push(edge.to);
    }
  }
  return undefined;
}

function trace(last: Edge, cameBy: ReadonlyMap<string, Edge>, start: string): Edge[] {
  const path = [last];
  for (let edge: Edge | undefined = last; edge && edge.from !== start; ) {
    edge = cameBy.get(edge.from);
    if (edge) path.unshift(edge);
  }
  return path;
}

function dependencies(board: Board, rail: Rail): Edge[] {
  const { origin } = rail;
  if (!origin || origin.kind === 'supply') return [];
  const named = (ref: Ref | undefined) => (ref ? [edge(rail, ref.name, ref.span, '')] : []);
  const all =
    origin.kind === 'regulator'
      ? named(origin.regulator.from)
      : origin.kind === 'filter'
        ? named(origin.filter.from)
        : [
            ...named(origin.pump.input),
            ...origin.pump.drive.flatMap((drive) =>
              drivingRails(board, drive.name).map(({ to, through }) => edge(rail, to, drive.span, through)),
            ),
          ];
  return all.filter(({ to }) => board.rails.has(to));
}

function edge(rail: Rail, to: string, span: Span, through: string): Edge {
  return { from: rail.name, to, span, through };
}

interface Lift {
  readonly to: string;
  readonly through: string;
}

/** The rails that a clock or driver takes its levels from. */
function drivingRails(board: Board, drive: string): Lift[] {
  const driver = board.drivers.get(drive);
  if (!driver) return clockRails(board, drive);
  const stage =
    driver.stage?.kind === 'pins' ? driver.stage.pins.flatMap((pin) => pinRail(board, pin, drive)) : [];
  const own = driver.rail ? [{ to: driver.rail.name, through: ` through driver \`${drive}\`` }] : [];
  return [...own, ...stage, ...(driver.input ? clockRails(board, driver.input.name) : [])];
}

function clockRails(board: Board, name: string): Lift[] {
  const clock = board.clocks.get(name);
  if (!clock) return [];
  const own = clock.rail ? [{ to: clock.rail.name, through: ` through clock \`${name}\`` }] : [];
  return [...own, ...(clock.pin ? pinRail(board, clock.pin, name) : [])];
}

function pinRail(board: Board, pin: PinRef, name: string): Lift[] {
  const rail = board.chips.get(pin.chip)?.rail;
  return rail
    ? [{ to: rail.name, through: ` through \`${name}\`, which chip \`${pin.chip}\` puts out` }]
    : [];
}
