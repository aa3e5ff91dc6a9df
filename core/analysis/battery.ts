/**
 * How long a battery lasts on this board: typical, and with the smallest capacity, the most current and the highest
 * resistance together.
 */
import { selfDischargeCurrent } from '../compute/battery-life';
import { type Discharge, discharge } from '../compute/discharge';
import type { Board, Supply } from '../model/board';
import { type Store, storeOf } from './battery-store';
import { boardDraw, type Draw, drawnFromSupply, railsOf } from './board-draw';
import { weightedModes } from './board-modes';
import type { CurrentCases } from './currents';
import { type Gap, isGap } from './gap';
import { type Consumer, largestConsumer } from './largest-consumer';
import type { Memory } from './memory';
import type { RailVoltages } from './rail-voltages';

/** One way that a battery runs down. */
export interface Run {
  readonly seconds: number;
  /** Share of the usable charge left at the end. */
  readonly left: number;
  /** Set when the end voltage is reached under the load of a mode (absent on a board without modes), not the charge used up. */
  readonly ended?: { readonly mode?: string; readonly amps: number; readonly ohms: number };
  /** Average over its life, A. */
  readonly current: number;
  /** Nameplate that it was computed with, C; the part of it that was counted on; and what it loses by itself, A. */
  readonly capacity: number;
  readonly usable: number;
  readonly selfCurrent: number;
  /** The mode that takes most of the charge over its life. */
  readonly top: {
    readonly mode?: string;
    readonly time: number;
    readonly charge: number;
    readonly amps: number;
  };
}

export interface BatteryLife {
  readonly supply: Supply;
  readonly store: Store;
  readonly typical: Run;
  /** Null when a pump has no corner to draw most at. */
  readonly least: Run | null;
  /** What draws most in the mode that takes most; at the voltages of the report. */
  readonly consumer?: Consumer;
  /** A in the lightest mode at typical values: what the time of a heavier one could be given to. */
  readonly lightest: number;
  /** Voltages at which the board was computed; empty when its voltage does not move. */
  readonly samples: readonly number[];
}

export interface BatterySite {
  readonly board: Board;
  readonly solved: RailVoltages;
  readonly currents: CurrentCases;
  readonly memory: Memory;
}

/** Undefined for a supply that does not run down. */
export function batteryLife(site: BatterySite, supply: Supply): BatteryLife | Gap | undefined {
  const store = storeOf(supply);
  if (!store) return undefined;
  const draw = drawOf(site, supply, store);
  if (isGap(draw)) return draw;
  const modes = weightedModes(site.board);
  const run = (current: Draw, end: 'typical' | 'worst'): Run | undefined => {
    const worst = end === 'worst';
    const capacity = store.capacity[worst ? 'min' : 'typical'];
    const usable = store.usable[worst ? 'min' : 'typical'];
    const ohms = worst ? 'max' : 'typical';
    const selfCurrent = selfDischargeCurrent(capacity, store.selfDischarge[worst ? 'max' : 'typical']);
    const cell = {
      open: store.open,
      resistance: (left: number) => store.resistance(left, ohms),
      knots: store.knots,
      charge: usable * capacity,
      selfCurrent,
      end: store.end,
    };
    const drains = modes.map(({ share }, k) => ({ share, current: (volts: number) => current(k, volts) }));
    const found = discharge(cell, drains);
    return found && runOf(found, { site, store, current, ohms, capacity, usable, selfCurrent });
  };
  const typical = run(draw.typical, 'typical');
  if (!typical)
    return { because: `nothing draws from ${supply.name}, and it does not lose charge by itself` };
  const consumer = largestConsumer(site, railsOf(site.board, supply), typical.top.mode);
  return {
    supply,
    store,
    typical,
    least: (draw.most && run(draw.most, 'worst')) ?? null,
    ...(consumer ? { consumer } : {}),
    lightest: Math.min(...modes.map((_, k) => draw.typical(k, store.open(0.5)))),
    samples: draw.samples,
  };
}

interface RunContext {
  readonly site: BatterySite;
  readonly store: Store;
  readonly current: Draw;
  readonly ohms: 'typical' | 'max';
  readonly capacity: number;
  readonly usable: number;
  readonly selfCurrent: number;
}

function runOf(found: Discharge, { site, store, current, ohms, ...figures }: RunContext): Run {
  const { seconds, left, endedBy, taken } = found;
  const modes = weightedModes(site.board);
  const whole = taken.reduce((sum, each) => sum + each, 0);
  const top = taken.reduce((best, each, k) => (each > taken[best]! ? k : best), 0);
  const { name, share } = modes[top]!;
  const named = (mode: string | undefined) => (mode === undefined ? {} : { mode });
  return {
    seconds,
    left,
    ...(endedBy === undefined
      ? {}
      : {
          ended: {
            ...named(modes[endedBy]!.name),
            amps: current(endedBy, store.end ?? store.open(left) / 2),
            ohms: store.resistance(left, ohms),
          },
        }),
    current:
      seconds > 0
        ? whole / seconds
        : modes.reduce((sum, mode, k) => sum + mode.share * current(k, store.full), 0),
    ...figures,
    top: {
      ...named(name),
      time: share,
      charge: whole > 0 ? taken[top]! / whole : share,
      amps: seconds > 0 && share > 0 ? taken[top]! / (share * seconds) : current(top, store.full),
    },
  };
}

/** A voltage that does not move needs no further solutions: the board's own currents hold all the way. */
function drawOf(
  { board, currents, memory }: BatterySite,
  supply: Supply,
  store: Store,
): { typical: Draw; most: Draw | null; samples: readonly number[] } | Gap {
  const { end, full, negative } = store;
  const rails = railsOf(board, supply);
  const modes = weightedModes(board);
  const typical = modes.map(({ name }) => drawnFromSupply(rails, currents, name));
  if (typical.includes(null)) return { because: `the current out of ${supply.name} is not known` };
  if (end === null) {
    const most = modes.map(({ name }) => drawnFromSupply(rails, currents.most, name));
    return {
      typical: (mode) => typical[mode] ?? Number.NaN,
      most: most.includes(null) ? null : (mode) => most[mode] ?? Number.NaN,
      samples: [],
    };
  }
  if (!(end > 0)) return { because: `the voltage of ${supply.name} falls to zero or below` };
  return boardDraw(board, supply, memory, { low: end, high: full, negative });
}
