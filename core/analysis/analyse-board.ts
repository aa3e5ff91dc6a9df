/**
 * A board computed once: the only entry from text to numbers. Never throws on what a user writes.
 */
import type { Catalogue } from '../catalog/part';
import type { Finding } from '../checks/finding';
import type { Board } from '../model/board';
import { type BoardReading, readBoard } from '../model/build';
import type { IncludeSource } from '../model/include';
import { formatQuantity } from '../quantity/write';
import { assumedCapacities } from './battery-store';
import { benchResults } from './bench';
import { weightedModes } from './board-modes';
import { chipResults, groupResults } from './chips';
import { clockSource } from './clock-source';
import { boardCurrents } from './currents';
import { driverResults, unknownGates } from './drivers';
import { isGap } from './gap';
import { Memory } from './memory';
import { once } from './once';
import { pinResults } from './pins';
import { plainBand, type RailVoltages, railVoltages } from './rail-voltages';
import { railResults } from './rails';
import { regulatorResults } from './regulators';
import { supplyResults } from './supplies';
import { supplyResistance } from './supply-voltage';
import { assumedHeadrooms } from './swing-need';
import type { BoardAnalysis, ClockResult } from './types';

/** `file` is only a name for reports; `text` has no byte-order mark. */
export function analyseBoard(
  text: string,
  file: string,
  catalogue: Catalogue,
  memory?: Memory,
  include?: IncludeSource,
): BoardAnalysis {
  const reading = readBoard(text, catalogue, include);
  return computeBoard(text, file, reading, memory);
}

export function computeBoard(
  text: string,
  file: string,
  reading: BoardReading,
  memory: Memory = new Memory(),
): BoardAnalysis {
  memory.begin();
  const { board } = reading;
  const modes = weightedModes(board);
  const solved = railVoltages(board, memory);
  const currents = boardCurrents(board, solved);
  const pins = pinResults(board, solved);
  const rails = railResults(board, solved, currents, modes);
  const drivers = driverResults(board, solved);
  const balances = [...solved.pumps.values()].flatMap((pump) => pump.points.map((point) => point.balance));
  return {
    text,
    file,
    reading,
    rails,
    pins,
    groups: groupResults(board, pins),
    chips: chipResults(board, solved, pins, currents, modes),
    clocks: clockResults(board, solved),
    drivers,
    regulators: regulatorResults(board, solved, currents),
    supplies: supplyResults({ board, solved, currents, memory }),
    bench: once(() => benchResults({ board, solved, memory })),
    balance: balances.length > 0 ? Math.max(...balances) : null,
    problems: [
      ...gapFindings(solved),
      ...assumedDraws(board),
      ...assumedResistances(board),
      ...assumedCapacities(board),
      ...averagedPowers(board, solved),
      ...assumedHeadrooms(rails),
      ...unknownGates(drivers),
    ],
  };
}

function gapFindings(solved: RailVoltages): Finding[] {
  const seen = new Set<string>();
  return [...solved.voltages.values()].flatMap((voltage) => {
    if (!isGap(voltage) || !voltage.finding) return [];
    const key = `${voltage.finding.code} ${voltage.finding.at}`;
    if (seen.has(key)) return [];
    seen.add(key);
    return [voltage.finding];
  });
}

/** A port or battery gives way by its catalogue resistance where the file has none, and the report says so. */
function assumedResistances(board: Board): Finding[] {
  return [...board.supplies.values()].flatMap((supply): Finding[] => {
    const entry = supply.battery?.data ?? supply.standard?.data;
    const ohms = supply.resistance ? null : supplyResistance(supply);
    if (!entry?.resistance || !ohms) return [];
    const { origin } = entry.resistance;
    const shown = formatQuantity(ohms.typical, 'ohm');
    return [
      {
        code: 'assumed',
        severity: 'information',
        at: supply.path,
        span: supply.nameSpan,
        message: `${supply.name}: its resistance is not given; ${shown} is taken from the catalogue (${origin.note ?? origin.kind}). Write resistance to settle it.`,
        actual: shown,
        source: origin.kind,
      },
    ];
  });
}

/** A load of constant power whose voltage collapses within each period counts as a resistor, and the report says so. */
function averagedPowers(board: Board, solved: RailVoltages): Finding[] {
  return [...solved.pumps].flatMap(([name, pump]): Finding[] => {
    const rail = board.rails.get(name);
    if (!rail || !pump.points.some((point) => point.powerAveraged)) return [];
    return [
      {
        code: 'assumed',
        severity: 'information',
        at: `${rail.path}.loads`,
        span: rail.nameSpan,
        message: `${name}: its voltage falls so far within each period that a load of constant power would stop and start; it is taken as the resistor that draws the same power on average. A larger reservoir keeps it running.`,
      },
    ];
  });
}

/** A chip whose own current the file leaves out counts with its catalogue figure, and the report says so. */
function assumedDraws(board: Board): Finding[] {
  return [...board.chips.values()].flatMap((chip): Finding[] => {
    const draws = chip.part?.data?.draws;
    if (chip.draws.length > 0 || !draws) return [];
    const shown = formatQuantity(draws.typical, 'A');
    return [
      {
        code: 'assumed',
        severity: 'information',
        at: chip.path,
        span: chip.nameSpan,
        message:
          `${chip.name}: its own current is not given; ${shown} is taken from the catalogue ` +
          `(${draws.origin.note ?? draws.origin.kind}). Write draws to settle it.`,
        actual: shown,
        source: draws.origin.kind,
      },
    ];
  });
}

function clockResults(board: Board, solved: RailVoltages): Map<string, ClockResult> {
  const voltage = (name: string) => solved.voltages.get(name) ?? { because: `${name} is not known` };
  const results = new Map<string, ClockResult>();
  for (const clock of board.clocks.values()) {
    const source = clockSource(board, clock.name, voltage);
    if (isGap(source)) {
      results.set(clock.name, { clock, frequency: null, duty: null, high: null, low: null });
      continue;
    }
    const { frequency, duty, opposite, output } = source;
    const rail = output.railName === undefined ? undefined : voltage(output.railName);
    const top = output.highVolts ?? (rail && !isGap(rail) ? rail : undefined);
    results.set(clock.name, {
      clock,
      frequency: plainBand(frequency),
      duty: opposite ? { min: 1 - duty.max, typical: 1 - duty.typical, max: 1 - duty.min } : plainBand(duty),
      high: top ? top.typical - output.highDrop.typical : null,
      low: output.lowVolts.typical,
    });
  }
  return results;
}
