/**
 * What a load draws, said once for every place where loads count: pumps, rails that no pump makes, and findings.
 */
import type { Load } from '../model/board';
import type { Band } from '../quantity/figure';

/**
 * Current that the load takes whatever its voltage, as a magnitude, A: the current of the file, or that of its
 * amplifiers. Undefined for a resistance or a power, and where the file does not say.
 */
export function steadyLoad({ current, amplifier }: Load): Band | undefined {
  if (current) return magnitude(current);
  return amplifier && amplifierCurrent(amplifier);
}

/**
 * Amplifiers take their quiescent and their output current from the rail that they stand on. The output current is
 * counted as flowing all the time, though with a signal each rail carries it for half the time: the cautious reading.
 * Source: the supply currents of any push-pull output, `Iq + Io`. Worked: 2 of 1.2 mA and 0.5 mA: 3.4 mA.
 */
export function amplifierCurrent({
  quiescent,
  output,
  count,
}: NonNullable<Load['amplifier']>): Band | undefined {
  if (!quiescent) return undefined;
  const each = (end: keyof Band) => quiescent[end] + (output?.[end] ?? 0);
  const many = Math.max(1, Math.round(count?.typical ?? 1));
  return { min: many * each('min'), typical: many * each('typical'), max: many * each('max') };
}

const opposite = { min: 'max', typical: 'typical', max: 'min' } as const;

/**
 * Current at the end of the load's band that is asked for, A: `max` is the most it takes. `volts` gives the rail's
 * magnitude at an end of its own band; NaN where it is needed and not known.
 */
export function loadAmps(load: Load, end: keyof Band, volts: (at: keyof Band) => number | undefined): number {
  const { resistance, power } = load;
  let sum = steadyLoad(load)?.[end] ?? 0;
  if (resistance) sum += share(volts(end), resistance[opposite[end]]);
  if (power && power.max > 0) sum += share(power[end], volts(opposite[end]));
  return sum;
}

/** A current counts by its size: on a negative rail it may be written with either sign. */
function magnitude({ min, typical, max }: Band): Band {
  if (typical >= 0) return { min: Math.max(min, 0), typical, max };
  return { min: Math.max(-max, 0), typical: -typical, max: -min };
}

function share(above: number | undefined, below: number | undefined): number {
  return above === undefined || below === undefined ? Number.NaN : above / below;
}
