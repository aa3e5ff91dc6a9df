/**
 * What every pin carries in its worst mode, against its data sheet.
 */

import type { PinData } from '../catalog/part';
import type { Board, Chip, ChipPin } from '../model/board';
import { weightedModes } from './board-modes';
import { isGap } from './gap';
import { type GateUse, gateUses } from './gate-uses';
import { pinData, pinResistance } from './pin-resistance';
import type { RailVoltages } from './rail-voltages';
import type { CornerSetting, DriveFigures, PinResult } from './types';

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

/** Pins that drive a pump, charge the gates of a driver or stand in the file, by `chip.pin`. */
export function pinResults(board: Board, solved: RailVoltages): Map<string, PinResult> {
  const uses = pumpUses(solved);
  const gates = gateUses(solved.chains.values());
  const results = new Map<string, PinResult>();
  for (const chip of board.chips.values()) {
    const driving = uses.get(chip.name);
    const charging = gates.filter(({ pin }) => pin?.chip === chip.name);
    const names = [...(driving?.keys() ?? []), ...charging.map(({ pin }) => pin!.pin)];
    for (const name of new Set([...chip.pins.keys(), ...names])) {
      const own = charging.filter(({ pin }) => pin?.pin === name);
      const result = pinResult(board, solved, chip, name, driving?.get(name) ?? [], own);
      results.set(`${chip.name}.${name}`, result);
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
  gates: readonly GateUse[],
): PinResult {
  const listed = chip.pins.get(name);
  const data: PinData = chip.part?.data ? pinData(chip.part.data, name, listed) : {};
  const rail = chip.rail && solved.voltages.get(chip.rail.name);
  const supply = rail && !isGap(rail) ? rail.typical : undefined;
  const figures = worstMode(board, solved, uses, gates, listed, 'typical')?.figures;
  const most = worstMode(board, solved, uses, gates, listed, 'most');
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
    corner: most ? { ...most.figures, settings: most.settings } : null,
    limit,
    limitKind: limit === null ? null : data.recommended ? 'recommended' : 'absolute',
    use: figures && limit ? figures.rms / limit.typical : null,
    charges: gates.map(({ driver }) => driver),
    drives: uses.map((use) => use.railName),
    pumps: uses.map(({ railName, index, share }) => ({ railName, index, share })),
  };
}

/** By chip, then by pin. */
function pumpUses(solved: RailVoltages): Map<string, Map<string, Use[]>> {
  const byChip = new Map<string, Map<string, Use[]>>();
  for (const [railName, chains] of solved.chains)
    chains.forEach((chain, index) => {
      for (const { chip, pin, share } of chain.pins) {
        const byPin = byChip.get(chip) ?? new Map<string, Use[]>();
        byChip.set(chip, byPin);
        const use = { key: `${chip}.${pin}`, chip, pin, railName, index, share };
        byPin.set(pin, [...(byPin.get(pin) ?? []), use]);
      }
    });
  return byChip;
}

interface PinPoint {
  readonly figures: DriveFigures;
  /** Of the pump that takes most of the current. */
  readonly settings: readonly CornerSetting[];
}

/** The mode with the largest rms current; undefined when a pump on the pin has no solution. */
function worstMode(
  board: Board,
  solved: RailVoltages,
  uses: readonly Use[],
  gates: readonly GateUse[],
  own: ChipPin | undefined,
  which: 'typical' | 'most',
): PinPoint | undefined {
  const end = which === 'most' ? 'max' : 'typical';
  let worst: PinPoint | undefined;
  for (const { name: mode } of weightedModes(board)) {
    const parts = gates.map(({ load }): DriveFigures => load[which]);
    let largest = 0;
    let settings: readonly CornerSetting[] = [];
    for (const use of uses) {
      const pump = solved.pumps.get(use.railName);
      const index = pump?.points.findIndex((p) => p.mode === mode) ?? -1;
      const corner = pump?.draws[index]?.sharpest;
      const point = which === 'most' ? corner?.point : pump?.points[index];
      const figures = point?.drives[use.index];
      if (!figures) return undefined;
      parts.push(scaled(figures, use.share));
      if (figures.rms > largest) settings = corner?.settings ?? [];
      largest = Math.max(largest, figures.rms);
    }
    const figures = addUp(parts, own?.sources?.[end] ?? 0, own?.sinks?.[end] ?? 0);
    if (!worst || figures.rms > worst.figures.rms) worst = { figures, settings };
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
 * Pumps and gates on one pin charge at the same moments, so their currents add, rms and peaks too. A steady current of the pin
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
