/**
 * What every driver does in the heaviest mode of the pumps behind it.
 */
import type { Board } from '../model/board';
import type { RailVoltages } from './rail-voltages';
import type { DriverResult } from './types';

export function driverResults(board: Board, solved: RailVoltages): Map<string, DriverResult> {
  const results = new Map<string, DriverResult>();
  for (const driver of board.drivers.values()) results.set(driver.name, { driver, uses: [] });
  for (const [railName, chains] of solved.chains) {
    const point = solved.pumps.get(railName)?.heaviest;
    if (!point) continue;
    chains.forEach((chain, k) => {
      const result = chain.driver && results.get(chain.driver.name);
      if (!result) return;
      const use = {
        railName,
        ...(point.mode === undefined ? {} : { mode: point.mode }),
        clock: chain.clock,
        stage: point.drivers[k] ?? null,
        gateCurrent: chain.gateCharge * chain.clock.frequency.typical,
        clockCurrent: point.drivers[k]
          ? (point.drives[k]!.sourceAverage + point.drives[k]!.sinkAverage) / 2
          : chain.gateCharge * chain.clock.frequency.typical,
      };
      results.set(chain.driver!.name, { ...result, uses: [...result.uses, use] });
    });
  }
  return results;
}
