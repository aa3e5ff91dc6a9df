/**
 * Voltage and source resistance of a supply.
 */
import type { Supply } from '../model/board';
import type { Band } from '../quantity/figure';

/** Without load, V; null when the file names neither a voltage, a standard nor a battery that is known. */
export function supplyVoltage(supply: Supply): Band | null {
  if (supply.voltage) return supply.voltage;
  if (supply.standard?.data) return supply.standard.data.voltage;
  const cell = supply.battery?.data?.voltage;
  return cell ? times(cell, cellCount(supply)) : null;
}

/** Ohm, of the file or of the battery's catalogue entry; null for a supply that does not give way. */
export function supplyResistance(supply: Supply): Band | null {
  if (supply.resistance) return supply.resistance;
  const cell = supply.battery?.data?.resistance;
  return cell ? times(cell, cellCount(supply)) : (supply.standard?.data?.resistance ?? null);
}

function cellCount(supply: Supply): number {
  return supply.cells?.typical ?? 1;
}

function times({ min, typical, max }: Band, factor: number): Band {
  return { min: factor * min, typical: factor * typical, max: factor * max };
}
