/** One capacitor switched between two voltages through resistance: its exact equivalent resistance and currents. */

export interface TwoPhase {
  readonly capacitanceF: number;
  readonly frequencyHz: number;
  /** Share of the period spent in phase 1, between 0 and 1, both excluded. */
  readonly share1: number;
  /** Resistance of the path in each phase, ohm, 0 or more. */
  readonly ohm1: number;
  readonly ohm2: number;
}

/**
 * `Req = (1/(2 f C)) ( coth(t1/(2 R1 C)) + coth(t2/(2 R2 C)) )`.
 *
 * Answers ohm. Out of range: undefined. Exact for ideal sources and linear resistances; limits are 1/(f C) when both
 * time constants are short and R1/D1 + R2/D2 when both are long.
 * Source: solved here from the two exponentials; the form is known in the switched-capacitor literature.
 * Worked: 1 uF, 10 kHz, half and half, 10 and 30 ohm gives 124.0 ohm.
 */
export function twoPhaseResistance(network: TwoPhase): number | undefined {
  if (!isTwoPhase(network)) return undefined;
  const { capacitanceF, frequencyHz } = network;
  return (coth(halfDecay(network, 1)) + coth(halfDecay(network, 2))) / (2 * frequencyHz * capacitanceF);
}

/**
 * Current at the beginning of a phase: `q / (R C (1 - exp(-t/(R C))))`, with `q = I/f` moved in every period.
 *
 * `outputA` the average current delivered. Answers ampere; undefined out of range and without resistance.
 * Worked: as above with 1 mA: 10.07 mA through 10 ohm and 4.110 mA through 30 ohm.
 */
export function twoPhasePeakCurrent(network: TwoPhase, phase: 1 | 2, outputA: number): number | undefined {
  const ohm = phase === 1 ? network.ohm1 : network.ohm2;
  if (!isTwoPhase(network) || !(ohm > 0) || !Number.isFinite(outputA)) return undefined;
  const { capacitanceF, frequencyHz } = network;
  return outputA / frequencyHz / (ohm * capacitanceF * -Math.expm1(-2 * halfDecay(network, phase)));
}

/**
 * Effective current through the resistance of one phase, over the whole period:
 * `I sqrt( coth(t/(2 R C)) / (2 f R C) )`. Both phases add by their squares in the capacitor.
 *
 * Answers ampere; undefined out of range and without resistance.
 * Worked: as above: 2.251 mA through 10 ohm and 1.563 mA through 30 ohm.
 */
export function twoPhaseRmsCurrent(network: TwoPhase, phase: 1 | 2, outputA: number): number | undefined {
  const ohm = phase === 1 ? network.ohm1 : network.ohm2;
  if (!isTwoPhase(network) || !(ohm > 0) || !Number.isFinite(outputA)) return undefined;
  const { capacitanceF, frequencyHz } = network;
  return (
    Math.abs(outputA) * Math.sqrt(coth(halfDecay(network, phase)) / (2 * frequencyHz * ohm * capacitanceF))
  );
}

function isTwoPhase(network: TwoPhase): boolean {
  const { capacitanceF, frequencyHz, share1, ohm1, ohm2 } = network;
  return capacitanceF > 0 && frequencyHz > 0 && share1 > 0 && share1 < 1 && ohm1 >= 0 && ohm2 >= 0;
}

/** `t/(2 R C)`; infinite without resistance. */
function halfDecay(network: TwoPhase, phase: 1 | 2): number {
  const share = phase === 1 ? network.share1 : 1 - network.share1;
  const ohm = phase === 1 ? network.ohm1 : network.ohm2;
  return share / network.frequencyHz / (2 * ohm * network.capacitanceF);
}

function coth(x: number): number {
  return 1 / Math.tanh(x);
}
