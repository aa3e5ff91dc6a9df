/**
 * What every pin carries in its worst mode, against its data sheet.
 */

import type { PinData } from '../catalog/part';
import type { Board, Chip } from '../model/board';
import type { Figure } from '../quantity/figure';
import { weightedModes } from './board-modes';
import { isGap } from './gap';
import { pinData, pinResistance } from './pin-resistance';
import type { RailVoltages } from './rail-voltages';
import type { DriveFigures, PinResult } from './types';

interface Use {
  /** `mcu.GP15`. */
  readonly key: string;
  readonly chip: string;
  readonly pin: string;
  readonly railName: string;
  /** Place among the pump's drives, and the pin's share of its current. */
  readonly index: number;
  readonly share: number;
}

/** Pins that drive a pump or that the file lists, by `chip.pin`. */
export function pinResults(board: Board, solved: RailVoltages): Map<string, PinResult> {
  const uses = pumpUses(solved);
  const results = new Map<string, PinResult>();
  for (const chip of board.chips.values()) {
    const names = new Set([...chip.pins.keys()]);
    for (const use of uses) if (use.chip === chip.name) names.add(use.pin);
    for (const name of names) {
      const key = `${chip.name}.${name}`;
      results.set(
        key,
        pinResult(
          board,
          solved,
          chip,
          name,
          uses.filter((use) => use.key === key),
        ),
      );
    }
  }
  return results;
}

function pinResult(
  board: Board,
  solved: RailVoltages,
  chip: Chip,
  name: string,
  uses: readonly Use[],
): PinResult {
  const listed = chip.pins.get(name);
  const data: PinData = chip.part?.data ? pinData(chip.part.data, name, listed) : {};
  const rail = chip.rail && solved.voltages.get(chip.rail.name);
  const supply = rail && !isGap(rail) ? rail.typical : undefined;
  const figures = worstMode(board, solved, uses, listed?.sources, listed?.sinks);
  const limit = data.recommended ?? data.absolute ?? null;
  return {
    key: `${chip.name}.${name}`,
    chip,
    name,
    data,
    highResistance: supply === undefined ? null : pinResistance(data, 'high', supply),
    lowResistance: supply === undefined ? null : pinResistance(data, 'low', supply),
    sourceAverage: figures?.sourceAverage ?? null,
    sinkAverage: figures?.sinkAverage ?? null,
    rms: figures?.rms ?? null,
    peakSource: figures?.peakSource ?? null,
    peakSink: figures?.peakSink ?? null,
    limit,
    limitKind: limit === null ? null : data.recommended ? 'recommended' : 'absolute',
    use: figures && limit ? figures.rms / limit.typical : null,
    drives: uses.map((use) => use.railName),
    pumps: uses.map(({ railName, index, share }) => ({ railName, index, share })),
  };
}

function pumpUses(solved: RailVoltages): Use[] {
  return [...solved.chains].flatMap(([railName, chains]) =>
    chains.flatMap((chain, index) =>
      chain.pins.map(({ chip, pin, share }) => ({
        key: `${chip}.${pin}`,
        chip,
        pin,
        railName,
        index,
        share,
      })),
    ),
  );
}

/** The mode with the largest rms current; undefined when a pump on the pin has no solution. */
function worstMode(
  board: Board,
  solved: RailVoltages,
  uses: readonly Use[],
  sources: Figure | undefined,
  sinks: Figure | undefined,
): DriveFigures | undefined {
  let worst: DriveFigures | undefined;
  for (const { name: mode } of weightedModes(board)) {
    const parts: DriveFigures[] = [];
    for (const use of uses) {
      const point = solved.pumps.get(use.railName)?.points.find((p) => p.mode === mode);
      const figures = point?.drives[use.index];
      if (!figures) return undefined;
      parts.push(scaled(figures, use.share));
    }
    const total = addUp(parts, sources?.typical ?? 0, sinks?.typical ?? 0);
    if (!worst || total.rms > worst.rms) worst = total;
  }
  return worst;
}

function scaled(figures: DriveFigures, share: number): DriveFigures {
  return {
    sourceAverage: share * figures.sourceAverage,
    sinkAverage: share * figures.sinkAverage,
    rms: share * figures.rms,
    peakSource: share * figures.peakSource,
    peakSink: share * figures.peakSink,
  };
}

/**
 * Pumps on one pin charge at the same moments, so their currents add, rms and peaks too. A steady current of the pin
 * adds to the rms as if it flowed all the time: the cautious reading.
 */
function addUp(parts: readonly DriveFigures[], source: number, sink: number): DriveFigures {
  const sum = (key: keyof DriveFigures) => parts.reduce((total, part) => total + part[key], 0);
  const steady = Math.max(source, sink);
  return {
    sourceAverage: sum('sourceAverage') + source,
    sinkAverage: sum('sinkAverage') + sink,
    rms: Math.hypot(sum('rms'), steady),
    peakSource: sum('peakSource') + source,
    peakSink: sum('peakSink') + sink,
  };
}
