/**
 * What every driver does in the heaviest mode of the pumps behind it.
 */
import type { Finding } from '../checks/finding';
import type { Board } from '../model/board';
import type { DriveChain } from './drive-chain';
import { isGap } from './gap';
import type { RailVoltages } from './rail-voltages';
import type { DriverResult, DriverUse, PairFigures, PumpPoint } from './types';

export function driverResults(board: Board, solved: RailVoltages): Map<string, DriverResult> {
  const results = new Map<string, DriverResult>();
  for (const driver of board.drivers.values()) results.set(driver.name, { driver, uses: [] });
  for (const [railName, chains] of solved.chains) {
    const point = solved.pumps.get(railName)?.heaviest;
    if (!point) continue;
    chains.forEach((chain, index) => {
      const result = chain.driver && results.get(chain.driver.name);
      if (!result) return;
      const use = driverUse(solved, railName, chain, point, index);
      results.set(chain.driver!.name, { ...result, uses: [...result.uses, use] });
    });
  }
  return results;
}

function driverUse(
  solved: RailVoltages,
  railName: string,
  chain: DriveChain,
  point: PumpPoint,
  index: number,
): DriverUse {
  const stage = point.drivers[index] ?? null;
  const drive = point.drives[index]!;
  const gates = chain.gates ?? null;
  const gateCurrent = gates ? (gates.load?.typical.sourceAverage ?? null) : 0;
  return {
    railName,
    index,
    ...(point.mode === undefined ? {} : { mode: point.mode }),
    clock: chain.clock,
    driverRail: chain.source.driver?.railName ?? chain.source.railName,
    drive,
    stage,
    gates,
    pair: gates && pairFigures(solved, chain, point, index),
    gateCurrent,
    clockCurrent: stage ? (drive.sourceAverage + drive.sinkAverage) / 2 : gateCurrent,
  };
}

function pairFigures(
  solved: RailVoltages,
  { gates, source }: DriveChain,
  point: PumpPoint,
  index: number,
): PairFigures | null {
  const rail = solved.voltages.get(source.railName);
  if (!gates?.load || !rail || isGap(rail)) return null;
  const { cross, crossCharge } = gates.load;
  return {
    dissipation: point.driveHeat[index]! + cross.typical * rail.typical,
    railCurrent: point.drives[index]!.sourceAverage + cross.typical,
    crossCurrent: cross.typical,
    crossCharge,
    edgeTime: Math.max(gates.rise, gates.fall),
  };
}

/** Without the charge of its gates nothing is known about the edges of a pair, and the report says so. */
export function unknownGates(drivers: ReadonlyMap<string, DriverResult>): Finding[] {
  return [...drivers.values()].flatMap(({ driver, uses }): Finding[] => {
    if (!uses.some(({ gates }) => gates && !gates.load)) return [];
    return [
      {
        code: 'not-computed',
        severity: 'information',
        at: `${driver.path}.mosfet-pair`,
        span: driver.stage?.span ?? driver.nameSpan,
        message: `${driver.name}: without the gate charge of both MOSFETs its edges, its gate current and what flows through both at once are not counted. Write gate-charge to settle it.`,
      },
    ];
  });
}
