/** How a reservoir of limited size moves the average output of a pump in the slow limit. */
import type { RippleInput } from './pump-ripple';

/**
 * Resistance to add to the slow limit for the average output under a constant current:
 * `(1/(2 f)) ( (1-D)^2/Cout - D^2/(C + Cout) )`.
 *
 * Answers ohm, may be negative; undefined out of range. Source: average of the two straight pieces of the output, solved here.
 * Worked: one stage, Cout = C, half duty: the slow limit of 1/(f C) becomes 1.0625/(f C).
 */
export function finiteReservoirResistance(input: Omit<RippleInput, 'outputA'>): number | undefined {
  const { frequencyHz, flyingF, reservoirF, deliverShare } = input;
  if (!(frequencyHz > 0 && flyingF > 0 && reservoirF > 0 && deliverShare > 0 && deliverShare < 1))
    return undefined;
  const without = (1 - deliverShare) ** 2 / reservoirF;
  const beside = deliverShare ** 2 / (flyingF + reservoirF);
  return (without - beside) / (2 * frequencyHz);
}
