/**
 * Voltage of a supply as the board sees it without load.
 */
import type { Supply } from '../model/board';
import type { Band } from '../quantity/figure';

/** V; null when the file names neither a voltage, a standard nor a battery that is known. */
export function supplyVoltage(supply: Supply): Band | null {
  if (supply.voltage) return supply.voltage;
  if (supply.standard?.data) return supply.standard.data.voltage;
  const cell = supply.battery?.data?.voltage;
  if (!cell) return null;
  const cells = supply.cells?.typical ?? 1;
  return { min: cells * cell.min, typical: cells * cell.typical, max: cells * cell.max };
}
