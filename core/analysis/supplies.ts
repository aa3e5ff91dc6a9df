/**
 * Supplies: what the board draws from each over its modes, and how long one lasts that runs down.
 */
import type { Supply } from '../model/board';
import { type BatterySite, batteryLife } from './battery';
import { storeOf } from './battery-store';
import { drawnFromSupply, railsOf } from './board-draw';
import { weightedModes } from './board-modes';
import { currentBand } from './chips';
import { once } from './once';
import { plainBand } from './rail-voltages';
import { supplyVoltage } from './supply-voltage';
import type { SupplyResult } from './types';

export function supplyResults(site: BatterySite): Map<string, SupplyResult> {
  return new Map(
    [...site.board.supplies.values()].map((supply) => [supply.name, supplyResult(site, supply)]),
  );
}

function supplyResult(site: BatterySite, supply: Supply): SupplyResult {
  const { board, currents } = site;
  const rails = railsOf(board, supply);
  const found = supplyVoltage(supply);
  const voltage = found && plainBand(found);
  const current = currentBand(weightedModes(board), currents, (of, mode) => drawnFromSupply(rails, of, mode));
  const limit = supply.current ?? supply.standard?.data?.current ?? supply.battery?.data?.current ?? null;
  return {
    supply,
    voltage,
    current,
    power: voltage && current ? voltage.typical * current.typical : null,
    limit,
    use: current && limit ? current.max / limit.min : null,
    modes: byMode(site, rails),
    ...(storeOf(supply)
      ? { life: once(() => batteryLife(site, supply) ?? { because: `${supply.name} does not run down` }) }
      : {}),
  };
}

function byMode({ board, currents }: BatterySite, rails: readonly string[]): SupplyResult['modes'] {
  const list: { mode?: string; typical: number; most: number }[] = [];
  for (const { name } of weightedModes(board)) {
    const typical = drawnFromSupply(rails, currents, name);
    const most = drawnFromSupply(rails, currents.most, name);
    if (typical === null || most === null) return null;
    list.push({ ...(name === undefined ? {} : { mode: name }), typical, most: Math.max(typical, most) });
  }
  return list;
}
