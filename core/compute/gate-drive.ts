/** What switching a pair of MOSFETs costs: charging their gates, and the moment when both conduct. */

/**
 * Average current to charge a gate once per period: `I = Qg f`. Coulomb and hertz, 0 or more; ampere out, else undefined.
 *
 * Times the gate voltage it is the drive power. Source: definition of charge. Worked: 5 nC at 100 kHz: 0.5000 mA, 2.500 mW at 5 V.
 */
export function gateCurrent(gateC: number, frequencyHz: number): number | undefined {
  return gateC >= 0 && frequencyHz >= 0 ? gateC * frequencyHz : undefined;
}

/** A straight ramp has its 10 and 90 % as far apart as an exponential of one time constant: ln 9 of it, over 0.8. */
const rampPerTime = Math.log(9) / 0.8;

/**
 * Length of a gate's edge behind a resistance, as a straight ramp over its swing: `t = (ln 9 / 0.8) R Qg/V`.
 *
 * Ohm, coulomb, volt; second out, undefined out of range. The gate counts as the capacitance `Qg/V`.
 * Source: charging of a capacitor, 10 to 90 % in `ln 9 = 2.197` time constants. Worked: 50 ohm, 5 nC, 5 V: 137.3 ns.
 */
export function gateRamp(ohms: number, gateC: number, swingV: number): number | undefined {
  return ohms >= 0 && gateC >= 0 && swingV > 0 ? (rampPerTime * ohms * gateC) / swingV : undefined;
}

/**
 * Effective current in the resistance that charges and discharges a gate: each pulse decays from `V/R` and leaves half
 * of `Q V` in it, so `rms^2 = f Q V/2 (1/Rup + 1/Rdown)`.
 *
 * Hertz, coulomb, volt, ohm; ampere out, undefined out of range. Source: energy of a charged capacitor.
 * Worked: 100 kHz, 5 nC, 5 V, 50 ohm both ways: 7.071 mA.
 */
export function gatePulseRms(
  frequencyHz: number,
  gateC: number,
  swingV: number,
  upOhm: number,
  downOhm: number,
): number | undefined {
  if (!(frequencyHz >= 0 && gateC >= 0 && swingV >= 0 && upOhm > 0 && downOhm > 0)) return undefined;
  return Math.sqrt(((frequencyHz * gateC * swingV) / 2) * (1 / upOhm + 1 / downOhm));
}

/**
 * Transconductance factor from the resistance while on: `beta = 1 / (Ron (VGS - Vt))`, at the gate voltage where it holds.
 *
 * Ohm and volt; A/V^2 out, undefined at or below the threshold. Source: level-1 MOSFET at small drain voltage, H. Shichman,
 * D. A. Hodges, IEEE JSSC 3(3), 1968 (from memory: confirm). Worked: 2 ohm at 5 V, threshold 1.7 V: 151.5 mA/V^2.
 */
export function transconductance(onOhm: number, gateV: number, thresholdV: number): number | undefined {
  return onOhm > 0 && gateV > thresholdV ? 1 / (onOhm * (gateV - thresholdV)) : undefined;
}

/**
 * Resistance at a lower gate voltage than the stated one: it goes with `1/(VGS - Vt)`, same source as above.
 *
 * Never below the stated resistance, which is not promised to fall further; `undefined` at or below the threshold.
 * Worked: 2 ohm at 5 V, threshold 1.7 V: 4.125 ohm at 3.3 V.
 */
export function drivenResistance(
  onOhm: number,
  statedV: number,
  thresholdV: number,
  gateV: number,
): number | undefined {
  if (!(onOhm > 0 && statedV > thresholdV && gateV > thresholdV)) return undefined;
  return onOhm * Math.max(1, (statedV - thresholdV) / (gateV - thresholdV));
}

export interface SymmetricPair {
  /** Transconductance factor of each transistor, A/V^2. */
  readonly beta: number;
  /** Magnitude of both thresholds, V. */
  readonly thresholdV: number;
  readonly supplyV: number;
  /** Time in which a gate ramp passes the whole supply, s. */
  readonly rampS: number;
}

/**
 * Charge from supply to ground in one edge of an unloaded pair: `Q = (beta/24)(VDD - 2 Vt)^3 tau / VDD`.
 *
 * Answers coulomb, 0 when the supply is below both thresholds together; undefined out of range. A load makes it less.
 * Source: H. J. M. Veendrick, IEEE JSSC 19(4), 468-473, 1984 (from memory: confirm).
 * Worked: 20 mA/V^2, 1 V, 5 V, 20 ns: 90.00 pC; two edges at 1 MHz burn 0.9000 mW.
 */
export function crossingCharge({ beta, thresholdV, supplyV, rampS }: SymmetricPair): number | undefined {
  const both = { betaN: beta, betaP: beta, thresholdN: thresholdV, thresholdP: thresholdV };
  return unequalCrossingCharge({ ...both, supplyV, rampS });
}

export interface UnequalPair extends Pick<SymmetricPair, 'supplyV' | 'rampS'> {
  readonly betaN: number;
  readonly betaP: number;
  readonly thresholdN: number;
  readonly thresholdP: number;
}

/**
 * The same for transistors that differ: `VDD - Vtn - Vtp` in the bracket, `beta = 4 bn bp / (sqrt(bn) + sqrt(bp))^2`.
 *
 * Derivation: the integral of Veendrick over the saturated current of whichever transistor conducts less; both cross at
 * the share `sqrt(bp) / (sqrt(bn) + sqrt(bp))` of the bracket.
 * Worked: 150 and 50 mA/V^2, 1.7 and 1.5 V, 5 V, 20 ns: 78.13 pC.
 */
export function unequalCrossingCharge(pair: UnequalPair): number | undefined {
  const { betaN, betaP, thresholdN, thresholdP, supplyV, rampS } = pair;
  const given = betaN >= 0 && betaP >= 0 && thresholdN >= 0 && thresholdP >= 0 && supplyV > 0 && rampS >= 0;
  if (!given) return undefined;
  const roots = Math.sqrt(betaN) + Math.sqrt(betaP);
  const beta = roots > 0 ? (4 * betaN * betaP) / roots ** 2 : 0;
  const over = Math.max(0, supplyV - thresholdN - thresholdP);
  return ((beta / 24) * over ** 3 * rampS) / supplyV;
}
