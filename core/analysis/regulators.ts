/**
 * Regulators: what they put out when their input runs short, what they take in, and how warm they get.
 */
import { junctionTemperature, linearRegulator, switchingRegulator } from '../compute/regulator';
import type { Board, Rail, Regulator } from '../model/board';
import type { Band } from '../quantity/figure';
import { weightedModes } from './board-modes';
import type { Case, CurrentCases } from './currents';
import { type Gap, isGap } from './gap';
import type { RailVoltages } from './rail-voltages';
import type { RegulatorResult } from './types';

/** Output of a regulator on an input; a linear one cannot hold more than its input less the dropout. */
export function regulatedVoltage(regulator: Regulator, input: Band): Band | undefined {
  const { output, dropout, kind } = regulator;
  if (!output || kind === 'switching' || !dropout) return output;
  return {
    min: Math.min(output.min, input.min - dropout.max),
    typical: Math.min(output.typical, input.typical - dropout.typical),
    max: Math.min(output.max, input.max - dropout.min),
  };
}

/** Current into a regulator that puts out `amps`, A; undefined where it is not known. */
export function regulatorInput(
  regulator: Regulator,
  outputV: number,
  inputV: number,
  amps: number,
  which: Case = 'typical',
): number | undefined {
  const ground = regulator.ground?.[({ typical: 'typical', most: 'max', least: 'min' } as const)[which]] ?? 0;
  if (regulator.kind !== 'switching') return amps + ground;
  const efficiency =
    regulator.efficiency?.[({ typical: 'typical', most: 'min', least: 'max' } as const)[which]];
  if (efficiency === undefined) return undefined;
  const point = switchingRegulator(inputV, outputV, amps, efficiency);
  return point && point.inputA + ground;
}

export function regulatorResults(
  board: Board,
  solved: RailVoltages,
  currents: CurrentCases,
): Map<string, RegulatorResult> {
  const results = new Map<string, RegulatorResult>();
  for (const rail of board.rails.values()) {
    if (rail.origin?.kind !== 'regulator') continue;
    const result = regulatorResult(board, rail, rail.origin.regulator, solved, currents);
    if (result) results.set(rail.name, result);
  }
  return results;
}

function regulatorResult(
  board: Board,
  rail: Rail,
  regulator: Regulator,
  solved: RailVoltages,
  currents: CurrentCases,
): RegulatorResult | undefined {
  const input: Band | Gap | undefined = regulator.from && solved.voltages.get(regulator.from.name);
  const output = solved.voltages.get(rail.name);
  if (!input || isGap(input) || !output || isGap(output)) return undefined;
  let current: { amps: number; mode: string | undefined } | undefined;
  for (const { name: mode } of weightedModes(board)) {
    const amps = currents.rail(rail.name, mode);
    if (amps === null) return undefined;
    if (!current || amps > current.amps) current = { amps, mode };
  }
  if (!current) return undefined;
  const most = currents.most.rail(rail.name, current.mode) ?? current.amps;
  const heat = heatOf(regulator, input.max, output.min, most);
  const junction =
    heat !== undefined && regulator.thermal
      ? junctionTemperature(board.ambient.max, heat, regulator.thermal.max)
      : undefined;
  return {
    rail,
    regulator,
    input,
    output,
    current: current.amps,
    ...(current.mode === undefined ? {} : { mode: current.mode }),
    heat: heat ?? null,
    junction: junction ?? null,
  };
}

/** Heat with the highest input and the lowest output, W. */
function heatOf(regulator: Regulator, inputV: number, outputV: number, amps: number): number | undefined {
  if (regulator.kind !== 'switching')
    return linearRegulator(inputV, Math.min(outputV, inputV), amps, regulator.ground?.max ?? 0)?.heatW;
  const efficiency = regulator.efficiency?.min;
  return efficiency === undefined ? undefined : switchingRegulator(inputV, outputV, amps, efficiency)?.heatW;
}
