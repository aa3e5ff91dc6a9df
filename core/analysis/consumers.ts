/**
 * Who hangs on each rail and on each chip, found once for the whole board.
 */
import type { Board, Chip, Rail } from '../model/board';
import type { Band } from '../quantity/figure';
import { clockSource } from './clock-source';
import { isGap } from './gap';
import { gateUses } from './gate-uses';
import type { GateLoad } from './mosfet-stage';
import type { RailVoltages } from './rail-voltages';

export interface OnRail {
  readonly chips: Chip[];
  readonly regulated: Rail[];
  readonly filtered: Rail[];
  readonly pumped: Rail[];
  /** Own currents of timers and gates that make a clock or drive a pump, and what MOSFETs take at their edges, A. */
  readonly oscillators: Band[];
}

/** A pin's share of one drive of a pump. */
export interface Driven {
  /** Rail that the pump makes. */
  readonly railName: string;
  readonly index: number;
  readonly share: number;
  readonly chip: string;
  readonly chipRail: string | undefined;
}

export interface Consumers {
  readonly on: ReadonlyMap<string, OnRail>;
  readonly drivenBy: ReadonlyMap<string, readonly Driven[]>;
  readonly pinsOf: ReadonlyMap<string, readonly Driven[]>;
  /** Average that charging gates takes from a chip's pins, by chip, A. */
  readonly gatesOf: ReadonlyMap<string, readonly Band[]>;
}

export function consumersOf(board: Board, solved: RailVoltages): Consumers {
  const on = new Map<string, OnRail>();
  const at = (name: string): OnRail => {
    const known = on.get(name);
    if (known) return known;
    const made: OnRail = { chips: [], regulated: [], filtered: [], pumped: [], oscillators: [] };
    on.set(name, made);
    return made;
  };
  for (const chip of board.chips.values()) if (chip.rail) at(chip.rail.name).chips.push(chip);
  for (const rail of board.rails.values()) {
    const { origin } = rail;
    if (origin?.kind === 'regulator' && origin.regulator.from)
      at(origin.regulator.from.name).regulated.push(rail);
    if (origin?.kind === 'filter' && origin.filter.from) at(origin.filter.from.name).filtered.push(rail);
    if (origin?.kind !== 'pump') continue;
    const names = new Set<string | undefined>([origin.pump.input?.name]);
    for (const { source } of solved.chains.get(rail.name) ?? [])
      names.add(source.railName).add(source.driver?.railName);
    for (const name of names) if (name !== undefined) at(name).pumped.push(rail);
  }
  for (const { railName, amps } of oscillatorCurrents(board, solved)) at(railName).oscillators.push(amps);
  for (const [name, amps] of gateDraws(board, solved)) at(name).oscillators.push(amps);
  const gatesOf = new Map<string, Band[]>();
  for (const { pin, railName, clockRail, load } of gateUses(solved.chains.values())) {
    at(railName).oscillators.push(load.cross);
    const amps = chargeOf(load);
    if (pin) gatesOf.set(pin.chip, [...(gatesOf.get(pin.chip) ?? []), amps]);
    else if (clockRail !== undefined) at(clockRail).oscillators.push(amps);
  }
  return { on, ...pins(board, solved), gatesOf };
}

function pins(board: Board, solved: RailVoltages): Pick<Consumers, 'drivenBy' | 'pinsOf'> {
  const all = [...solved.chains].flatMap(([railName, chains]) =>
    chains.flatMap((chain, index) =>
      chain.pins.map(({ chip, share }): Driven => {
        const chipRail = board.chips.get(chip)?.rail?.name;
        return { railName, index, share, chip, chipRail };
      }),
    ),
  );
  return { drivenBy: grouped(all, 'chip'), pinsOf: grouped(all, 'railName') };
}

function grouped(list: readonly Driven[], by: 'chip' | 'railName'): Map<string, Driven[]> {
  const groups = new Map<string, Driven[]>();
  for (const item of list) {
    const group = groups.get(item[by]);
    if (group) group.push(item);
    else groups.set(item[by], [item]);
  }
  return groups;
}

function chargeOf({ least, typical, most }: GateLoad): Band {
  return { min: least.sourceAverage, typical: typical.sourceAverage, max: most.sourceAverage };
}

/** What the gates of drivers take for themselves, by rail: gates in parallel stand in one package. */
function gateDraws(board: Board, { chains }: RailVoltages): [string, Band][] {
  const rails = new Map<string, string>();
  for (const { driver, source } of [...chains.values()].flat())
    if (driver) rails.set(driver.name, source.railName);
  return [...board.drivers.values()].flatMap(({ name, stage }): [string, Band][] => {
    const draws = stage?.kind === 'gates' ? stage.part?.data?.draws : undefined;
    const rail = rails.get(name);
    return draws && rail !== undefined ? [[rail, draws]] : [];
  });
}

/** What timers and gates that make a clock take for themselves, by rail. */
function oscillatorCurrents(board: Board, solved: RailVoltages): { railName: string; amps: Band }[] {
  const voltage = (name: string) => solved.voltages.get(name) ?? { because: `${name} is not known` };
  return [...board.clocks.keys()].flatMap((name) => {
    const source = clockSource(board, name, voltage);
    if (isGap(source) || !source.ownCurrent || source.output.railName === undefined) return [];
    return [{ railName: source.output.railName, amps: source.ownCurrent }];
  });
}
