/**
 * How long a battery lasts while its voltage falls and its resistance rises: charge balance over its discharge.
 */

export interface Cell {
  /** Without load at a share of the usable charge left, V; falls with it. */
  open(left: number): number;
  /** Internal, ohm; 0 or more, does not fall as the charge goes. */
  resistance(left: number): number;
  /** Shares left at which one of the two bends, from 1 down to 0. */
  readonly knots: readonly number[];
  /** Usable charge, C. */
  readonly charge: number;
  /** Steady loss by itself, A. */
  readonly selfCurrent: number;
  /** Loaded voltage at which it is empty, V; null for one that may be used to its last charge. */
  readonly end: number | null;
}

export interface Drain {
  /** Of the time; adds up to 1 over all drains. */
  readonly share: number;
  /** A, at the loaded voltage. */
  current(volts: number): number;
}

export interface Discharge {
  readonly seconds: number;
  /** Share of the usable charge left at the end. */
  readonly left: number;
  /** The drain under which the end voltage is reached, by its place in the list; absent when the charge is used up. */
  readonly endedBy?: number;
  /** What each drain took, C. */
  readonly taken: readonly number[];
}

/** Less than this share left is nothing worth naming: the end voltage of a cell is where its charge ends. */
const nothingLeft = 0.01;

/**
 * `t = Q integral ds / (sum(share I(V)) + Isd)` from a full battery down to the share `s` at which the loaded voltage
 * `V = E(s) - R(s) I(V)` of one drain reaches the end voltage, or to 0.
 *
 * Undefined when nothing drains it, or a current is not known.
 * Source: charge balance with Ohm's law. Between two knots E and R are straight and the integrand smooth, so that
 * three Gauss points there (exact to the fifth power) leave no error worth naming.
 * Worked: constant current, no resistance: `Q / (I + Isd)`; see `batteryLife`.
 */
export function discharge(cell: Cell, drains: readonly Drain[]): Discharge | undefined {
  const taken = drains.map(() => 0);
  let seconds = 0;
  for (const [k, upper] of cell.knots.entries()) {
    const stop = failing(cell, drains, upper);
    if (stop !== undefined)
      return { seconds, left: upper, ...(upper < nothingLeft ? {} : { endedBy: stop }), taken };
    const lower = cell.knots[k + 1];
    if (lower === undefined) break;
    const { left, endedBy } = lastAlive(cell, drains, upper, lower);
    for (const { at, weight } of gaussPoints(left, upper)) {
      const currents = drains.map(
        ({ share, current }) => share * current(loaded(cell, current, at) ?? Number.NaN),
      );
      const drain = currents.reduce((sum, each) => sum + each, cell.selfCurrent);
      const time = (cell.charge * weight) / drain;
      if (!(time >= 0 && Number.isFinite(time))) return undefined;
      seconds += time;
      for (const [m, each] of currents.entries()) taken[m] = taken[m]! + each * time;
    }
    if (endedBy !== undefined) return { seconds, left, ...(left < nothingLeft ? {} : { endedBy }), taken };
  }
  return { seconds, left: 0, taken };
}

/** The drain that cannot be fed at that charge, the heaviest of them; undefined when all can. */
function failing(cell: Cell, drains: readonly Drain[], left: number): number | undefined {
  const floor = floorOf(cell, left);
  let worst: { place: number; amps: number } | undefined;
  for (const [place, { current }] of drains.entries()) {
    if (loaded(cell, current, left) !== undefined) continue;
    const amps = current(floor);
    if (!worst || amps > worst.amps) worst = { place, amps };
  }
  return worst?.place;
}

/** Where between two knots the first drain fails: the voltages fall all the way, so halving finds it. */
function lastAlive(
  cell: Cell,
  drains: readonly Drain[],
  upper: number,
  lower: number,
): { left: number; endedBy?: number } {
  let endedBy = failing(cell, drains, lower);
  if (endedBy === undefined) return { left: lower };
  let [alive, dead] = [upper, lower];
  for (let round = 0; round < 40; round++) {
    const middle = (alive + dead) / 2;
    const stop = failing(cell, drains, middle);
    if (stop === undefined) alive = middle;
    else [dead, endedBy] = [middle, stop];
  }
  return { left: alive, endedBy };
}

const steps = 32;

/**
 * The largest root of `V = E - R I(V)` that is not below the end voltage; undefined when there is none. A load of
 * constant power has two roots, of which a real battery keeps the upper one, and none beyond its largest power.
 */
function loaded(cell: Cell, current: (volts: number) => number, left: number): number | undefined {
  const open = cell.open(left);
  const ohms = cell.resistance(left);
  const floor = floorOf(cell, left);
  const spare = (volts: number) => open - ohms * current(volts) - volts;
  if (open < floor) return undefined;
  if (!(spare(open) < 0)) return open;
  let above = open;
  for (let k = 1; k <= steps; k++) {
    const volts = open + ((floor - open) * k) / steps;
    if (spare(volts) >= 0) {
      let below = volts;
      for (let round = 0; round < 40; round++) {
        const middle = (above + below) / 2;
        if (spare(middle) >= 0) below = middle;
        else above = middle;
      }
      return below;
    }
    above = volts;
  }
  return undefined;
}

/** Below half of its open voltage a source with a resistance gives less power, not more. */
function floorOf(cell: Cell, left: number): number {
  return cell.end ?? cell.open(left) / 2;
}

/** Three Gauss-Legendre points (roots of P3, textbook values). */
function gaussPoints(from: number, to: number): readonly { readonly at: number; readonly weight: number }[] {
  const middle = (from + to) / 2;
  const half = (to - from) / 2;
  const reach = half * Math.sqrt(3 / 5);
  return [
    { at: middle - reach, weight: (half * 5) / 9 },
    { at: middle, weight: (half * 8) / 9 },
    { at: middle + reach, weight: (half * 5) / 9 },
  ];
}
