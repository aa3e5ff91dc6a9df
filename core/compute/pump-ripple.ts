/** Peak-to-peak ripple of a doubler, inverter or multiplier with a reservoir. A ladder has its own file. */

export interface RippleInput {
  readonly outputA: number;
  readonly frequencyHz: number;
  readonly flyingF: number;
  readonly reservoirF: number;
  /** Share of the period in which the pump delivers, between 0 and 1, both excluded. */
  readonly deliverShare: number;
}

/**
 * The bound for every duty: `I/(f Cout)`, all charge lost between two deliveries of no length.
 *
 * Answers volt; undefined out of range. Source: Dickson 1976 (from memory: confirm).
 * Worked: 2 mA, 20 kHz, 10 uF: 10.00 mV.
 */
export function rippleBound(input: RippleInput): number | undefined {
  return isRipple(input) ? input.outputA / (input.frequencyHz * input.reservoirF) : undefined;
}

/**
 * Slow limit: `(I/f) ( (1-D)/Cout + D/(C + Cout) )`, the flying capacitor stays beside the reservoir while delivering.
 *
 * Answers volt; undefined out of range. Source: charge balance, solved here. Worked: as above with 1 uF, half duty: 9.545 mV.
 */
export function slowRipple(input: RippleInput): number | undefined {
  if (!isRipple(input)) return undefined;
  const { outputA, frequencyHz, flyingF, reservoirF, deliverShare } = input;
  return (outputA / frequencyHz) * ((1 - deliverShare) / reservoirF + deliverShare / (flyingF + reservoirF));
}

/**
 * Fast limit: `(1-D) I/(f Cout) + I ESR/D`, a constant current while delivering and the step it makes in the reservoir's resistance.
 *
 * Answers volt; undefined out of range. Source: form of pump chip data sheets, `I (1/(2 f C) + 2 ESR)` at half duty.
 * Worked: as above, no ESR: 5.000 mV.
 */
export function fastRipple(input: RippleInput, reservoirEsrOhm: number): number | undefined {
  if (!isRipple(input) || !(reservoirEsrOhm >= 0)) return undefined;
  const { outputA, frequencyHz, reservoirF, deliverShare } = input;
  return (
    ((1 - deliverShare) * outputA) / (frequencyHz * reservoirF) + (outputA * reservoirEsrOhm) / deliverShare
  );
}

function isRipple(input: RippleInput): boolean {
  const { outputA, frequencyHz, flyingF, reservoirF, deliverShare } = input;
  return (
    outputA >= 0 && frequencyHz > 0 && flyingF > 0 && reservoirF > 0 && deliverShare > 0 && deliverShare < 1
  );
}
