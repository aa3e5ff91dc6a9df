/**
 * The output resistance of a pin at its supply: from figures given as such, or from the data sheet's test points.
 */
import type { ChipData, PinData } from '../catalog/part';
import { outputStageResistance } from '../compute/output-stage-resistance';
import type { ChipPin } from '../model/board';
import { type Figure, figure } from '../quantity/figure';

/** Data of one pin: the chip's common figures, the pin's own over them, then the drive setting's. */
export function pinData(chip: ChipData, pin: string, listed?: ChipPin): PinData {
  const own = { ...chip.pins, ...chip.pin[pin] };
  const strength = listed?.strength && own.strengths?.[listed.strength.name];
  return strength ? { ...own, ...strength } : own;
}

/** Ohm; null when the data has neither a resistance nor a usable test point for that level. */
export function pinResistance(data: PinData, level: 'high' | 'low', supplyV: number): Figure | null {
  const given = level === 'high' ? data.highResistance : data.lowResistance;
  if (given) return given;
  const points = (level === 'high' ? data.high : data.low) ?? [];
  const band = outputStageResistance(points, level, supplyV);
  const origin = points[0]?.voltage.origin;
  if (!band || !origin) return null;
  return figure(band, 'ohm', {
    ...origin,
    note: `${origin.note ?? 'data sheet'}: drop at the test current divided by it`,
  });
}
