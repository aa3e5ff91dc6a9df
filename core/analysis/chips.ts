/**
 * Chips and their pin groups: what all pins together source and sink, and what the chip takes from its rail.
 */
import type { Board } from '../model/board';
import type { Band, Figure } from '../quantity/figure';
import type { WeightedMode } from './board-modes';
import type { CurrentCases } from './currents';
import { isGap } from './gap';
import type { RailVoltages } from './rail-voltages';
import type { ChipResult, GroupResult, PinResult } from './types';

export function groupResults(board: Board, pins: ReadonlyMap<string, PinResult>): Map<string, GroupResult> {
  const results = new Map<string, GroupResult>();
  for (const chip of board.chips.values()) {
    for (const group of chip.part?.data?.groups ?? []) {
      const members = group.pins.flatMap((name) => pins.get(`${chip.name}.${name}`) ?? []);
      if (members.length === 0) continue;
      const { source, sink, sourceMost, sinkMost } = sums(members);
      const key = `${chip.name}.${group.name}`;
      const sourceLimit = group.source ?? null;
      const sinkLimit = group.sink ?? null;
      const use = share(source, sink, sourceLimit, sinkLimit);
      results.set(key, {
        key,
        chip,
        source,
        sink,
        sourceMost,
        sinkMost,
        sourceLimit,
        sinkLimit,
        use,
        pins: members.map((pin) => pin.name),
      });
    }
  }
  return results;
}

export function chipResults(
  board: Board,
  solved: RailVoltages,
  pins: ReadonlyMap<string, PinResult>,
  currents: CurrentCases,
  modes: readonly WeightedMode[],
): Map<string, ChipResult> {
  const results = new Map<string, ChipResult>();
  const byChip = new Map<string, PinResult[]>();
  for (const pin of pins.values()) byChip.set(pin.chip.name, [...(byChip.get(pin.chip.name) ?? []), pin]);
  for (const chip of board.chips.values()) {
    const { source, sink, sourceMost, sinkMost } = sums(byChip.get(chip.name) ?? []);
    const data = chip.part?.data ?? null;
    const rail = chip.rail && solved.voltages.get(chip.rail.name);
    results.set(chip.name, {
      chip,
      data,
      voltage: rail && !isGap(rail) ? rail : null,
      current: currentBand(modes, currents, (of, mode) => of.chip(chip, mode)),
      sourceTotal: source,
      sinkTotal: sink,
      sourceMost,
      sinkMost,
      use: data ? share(source, sink, data.total.source ?? null, data.total.sink ?? null) : null,
    });
  }
  return results;
}

/** The least of any mode, the typical average weighted by share, the most of any mode; null when one is not known. */
export function currentBand(
  modes: readonly WeightedMode[],
  currents: CurrentCases,
  value: (of: Pick<CurrentCases, 'rail' | 'chip' | 'loads'>, mode: string | undefined) => number | null,
): Band | null {
  const typical = overModes(modes, (mode) => value(currents, mode));
  const least = overModes(modes, (mode) => value(currents.least, mode));
  const most = overModes(modes, (mode) => value(currents.most, mode));
  if (!typical || !least || !most) return null;
  return {
    min: Math.min(typical.min, least.min),
    typical: typical.typical,
    max: Math.max(typical.max, most.max),
  };
}

/** Lowest and highest over the modes, and the average weighted by their share; null when one is not known. */
export function overModes(
  modes: readonly WeightedMode[],
  value: (mode: string | undefined) => number | null,
): Band | null {
  let typical = 0;
  let min = Number.POSITIVE_INFINITY;
  let max = Number.NEGATIVE_INFINITY;
  for (const { name, share: weight } of modes) {
    const current = value(name);
    if (current === null) return null;
    typical += weight * current;
    min = Math.min(min, current);
    max = Math.max(max, current);
  }
  return { min, typical, max };
}

function sums(pins: readonly PinResult[]) {
  const sum = (of: (pin: PinResult) => number | null | undefined) =>
    pins.reduce((total, pin) => total + (of(pin) ?? 0), 0);
  return {
    source: sum((pin) => pin.sourceAverage),
    sink: sum((pin) => pin.sinkAverage),
    sourceMost: sum((pin) => pin.corner?.sourceAverage ?? pin.sourceAverage),
    sinkMost: sum((pin) => pin.corner?.sinkAverage ?? pin.sinkAverage),
  };
}

function share(
  source: number,
  sink: number,
  sourceLimit: Figure | null,
  sinkLimit: Figure | null,
): number | null {
  const shares = [
    ...(sourceLimit ? [source / sourceLimit.typical] : []),
    ...(sinkLimit ? [sink / sinkLimit.typical] : []),
  ];
  return shares.length > 0 ? Math.max(...shares) : null;
}
