/**
 * Average currents up the tree of rails, mode by mode: what loads, chips, regulators and pumps take from each rail.
 * Typical values; loads that are resistances see the rail's typical voltage.
 */
import type { Board, Chip, Rail } from '../model/board';
import { activeIn } from './board-modes';
import { clockSource } from './clock-source';
import { isGap } from './gap';
import type { RailVoltages } from './rail-voltages';
import { regulatorInput } from './regulators';

export interface Currents {
  /** Into the rail's own loads and bleeder, A; null when the rail has no voltage to tell. */
  loads(rail: Rail, mode: string | undefined): number | null;
  /** Out of the rail in all, A; null when a part of it is not known. */
  rail(name: string, mode: string | undefined): number | null;
  /** What a chip takes from its rail, its pins included, A. */
  chip(chip: Chip, mode: string | undefined): number | null;
}

export function boardCurrents(board: Board, solved: RailVoltages): Currents {
  const oscillators = ownCurrents(board, solved);
  const memo = new Map<string, number | null>();
  const open = new Set<string>();

  const point = (rail: Rail, mode: string | undefined) =>
    solved.pumps.get(rail.name)?.points.find((p) => p.mode === mode);

  const loads = (rail: Rail, mode: string | undefined): number | null => {
    if (rail.origin?.kind === 'pump') {
      const at = point(rail, mode);
      return at ? at.loadCurrent - at.belowCurrent : null;
    }
    const voltage = solved.voltages.get(rail.name);
    let sum = 0;
    const resistors = [...rail.loads.values()]
      .filter((load) => activeIn(mode, load.modes))
      .flatMap((load) => {
        sum += Math.abs(load.current?.typical ?? 0);
        return load.resistance ? [load.resistance.typical] : [];
      });
    if (rail.bleeder) resistors.push(rail.bleeder.typical);
    if (resistors.length === 0) return sum;
    if (!voltage || isGap(voltage)) return null;
    for (const ohms of resistors) sum += Math.abs(voltage.typical) / ohms;
    return sum;
  };

  /** Pumps that the chip's pins drive take their charge from the chip's rail. */
  const drive = (chip: Chip, mode: string | undefined): number | null => {
    let sum = 0;
    for (const [railName, chains] of solved.chains) {
      const at = solved.pumps.get(railName)?.points.find((p) => p.mode === mode);
      for (const [k, chain] of chains.entries())
        for (const pin of chain.pins) {
          if (pin.chip !== chip.name) continue;
          if (!at) return null;
          sum += pin.share * (at.drives[k]?.sourceAverage ?? 0);
        }
    }
    return sum;
  };

  /** What a pump takes from a rail past the pins of chips, which are counted with their chips. */
  const pump = (item: Rail, name: string, mode: string | undefined): number | null => {
    const at = point(item, mode);
    if (!at) return null;
    let sum = at.railCurrents.get(name) ?? 0;
    for (const [k, chain] of (solved.chains.get(item.name) ?? []).entries())
      for (const pin of chain.pins)
        if (board.chips.get(pin.chip)?.rail?.name === name)
          sum -= pin.share * (at.drives[k]?.sourceAverage ?? 0);
    return sum;
  };

  const chip = (item: Chip, mode: string | undefined): number | null => {
    const driven = drive(item, mode);
    if (driven === null) return null;
    const fallback = item.draws.length === 0 ? (item.part?.data?.draws?.typical ?? 0) : 0;
    const own = item.draws
      .filter((draw) => activeIn(mode, draw.mode && [draw.mode]))
      .reduce((sum, draw) => sum + draw.current.typical, fallback);
    const pins = [...item.pins.values()].reduce((sum, pin) => sum + (pin.sources?.typical ?? 0), 0);
    return own + pins + driven;
  };

  const consumers = (name: string, mode: string | undefined): (number | null)[] => {
    const list: (number | null)[] = [];
    for (const item of board.chips.values()) if (item.rail?.name === name) list.push(chip(item, mode));
    for (const other of board.rails.values()) {
      const { origin } = other;
      if (origin?.kind === 'regulator' && origin.regulator.from?.name === name) {
        const out = rail(other.name, mode);
        const input = typicalOf(solved, name);
        const output = typicalOf(solved, other.name);
        list.push(
          out === null || input === undefined || output === undefined
            ? null
            : (regulatorInput(origin.regulator, output, input, out) ?? null),
        );
      }
      if (origin?.kind === 'filter' && origin.filter.from?.name === name) list.push(rail(other.name, mode));
      if (origin?.kind === 'pump' && usesRail(solved, other, origin.pump.input?.name, name))
        list.push(pump(other, name, mode));
    }
    for (const clock of oscillators) if (clock.railName === name) list.push(clock.amps);
    return list;
  };

  const rail = (name: string, mode: string | undefined): number | null => {
    const key = `${name}\n${mode ?? ''}`;
    const known = memo.get(key);
    if (known !== undefined) return known;
    const item = board.rails.get(name);
    if (!item || open.has(name)) return null;
    open.add(name);
    let sum: number | null = loads(item, mode);
    for (const part of consumers(name, mode)) sum = sum === null || part === null ? null : sum + part;
    open.delete(name);
    memo.set(key, sum);
    return sum;
  };

  return { loads, rail, chip };
}

function typicalOf(solved: RailVoltages, name: string): number | undefined {
  const voltage = solved.voltages.get(name);
  return voltage && !isGap(voltage) ? voltage.typical : undefined;
}

/** True when a pump stands on the rail or is driven from it. */
function usesRail(solved: RailVoltages, rail: Rail, input: string | undefined, name: string): boolean {
  if (input === name) return true;
  return (solved.chains.get(rail.name) ?? []).some(
    ({ source }) => source.railName === name || source.driver?.railName === name,
  );
}

/** What timers and gates that make a clock take for themselves. */
function ownCurrents(board: Board, solved: RailVoltages): { railName: string; amps: number }[] {
  const voltage = (name: string) => solved.voltages.get(name) ?? { because: `${name} is not known` };
  return [...board.clocks.keys()].flatMap((name) => {
    const source = clockSource(board, name, voltage);
    if (isGap(source) || !source.ownCurrent || source.output.railName === undefined) return [];
    return [{ railName: source.output.railName, amps: source.ownCurrent.typical }];
  });
}
