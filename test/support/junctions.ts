/** Diodes and transistors of the independent reference: currents and their slopes at given voltages. */

export interface Current {
  readonly amps: number;
  /** By the voltage, S. */
  readonly siemens: number;
}

/**
 * Shockley diode behind a resistance: `v = slope ln(1 + i/Is) + ohms i` solved for i. Newton in the logarithm comes
 * down from above: the left side is convex and rising.
 */
export function diodeCurrent(saturation: number, slope: number, ohms: number, volts: number): Current {
  let x = volts / slope;
  if (ohms > 0) {
    x = Math.min(x, Math.log1p(Math.max(volts, 0) / (ohms * saturation)));
    for (let i = 0; i < 80; i++) {
      const grown = ohms * saturation * Math.exp(x);
      const step = (slope * x + grown - ohms * saturation - volts) / (slope + grown);
      x -= step;
      if (Math.abs(step) < 1e-14 * Math.max(1, Math.abs(x))) break;
    }
  }
  const grown = saturation * Math.exp(x);
  return { amps: saturation * Math.expm1(x), siemens: grown / (slope + ohms * grown) };
}

export interface TransistorCurrents {
  readonly collector: number;
  readonly base: number;
  /** Slopes by the voltages base-emitter and base-collector, S. */
  readonly collectorByBe: number;
  readonly collectorByBc: number;
  readonly baseByBe: number;
  readonly baseByBc: number;
}

/** Transport form of the Ebers-Moll model (J. J. Ebers, J. L. Moll, Proc. IRE 42, 1954; from memory: confirm), npn. */
export function transistorCurrents(
  saturation: number,
  slope: number,
  gain: number,
  reverseGain: number,
  be: number,
  bc: number,
): TransistorCurrents {
  const forward = saturation * Math.expm1(be / slope);
  const backward = saturation * Math.expm1(bc / slope);
  const forwardSlope = (forward + saturation) / slope;
  const backwardSlope = (backward + saturation) / slope;
  return {
    collector: forward - backward - backward / reverseGain,
    base: forward / gain + backward / reverseGain,
    collectorByBe: forwardSlope,
    collectorByBc: -backwardSlope - backwardSlope / reverseGain,
    baseByBe: forwardSlope / gain,
    baseByBc: backwardSlope / reverseGain,
  };
}
