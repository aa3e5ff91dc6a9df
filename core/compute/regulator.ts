/** Input current, heat and temperature of a voltage regulator. */

export interface RegulatorPoint {
  /** Current into the regulator, A. */
  readonly inputA: number;
  /** Heat in it, W. */
  readonly heatW: number;
}

/**
 * Linear: `Iin = Iout + Iground`, `P = (Vin - Vout) Iout + Vin Iground`.
 *
 * Volt and ampere; `inputV` at least `outputV`, both 0 or more, currents 0 or more; undefined otherwise.
 * Source: balance of current and power. Worked: 5 to 3.3 V at 200 mA: 0.3400 W.
 */
export function linearRegulator(
  inputV: number,
  outputV: number,
  outputA: number,
  groundA: number,
): RegulatorPoint | undefined {
  if (!(inputV >= outputV && outputV >= 0 && outputA >= 0 && groundA >= 0) || !Number.isFinite(inputV))
    return undefined;
  return { inputA: outputA + groundA, heatW: (inputV - outputV) * outputA + inputV * groundA };
}

/**
 * Switching: `Iin = Vout Iout / (eta Vin)`, the rest of the power is heat.
 *
 * `efficiency` above 0 and at most 1, voltages above 0; undefined otherwise.
 * Worked: 5 to 3.3 V, 300 mA, 0.9: 0.2200 A; 3 to 5 V, 100 mA, 0.85: 0.1961 A.
 */
export function switchingRegulator(
  inputV: number,
  outputV: number,
  outputA: number,
  efficiency: number,
): RegulatorPoint | undefined {
  if (!(inputV > 0 && outputV > 0 && outputA >= 0 && efficiency > 0 && efficiency <= 1)) return undefined;
  const outputW = outputV * outputA;
  return { inputA: outputW / (efficiency * inputV), heatW: outputW / efficiency - outputW };
}

/**
 * Temperature of a junction: `Tj = Ta + P thJA`. Kelvin, watt and kelvin per watt; undefined when the last two are below 0.
 *
 * Source: definition of thermal resistance. Worked: 25 degC, 0.34 W, 100 K/W: 59 degC.
 */
export function junctionTemperature(
  ambientK: number,
  heatW: number,
  thermalKPerW: number,
): number | undefined {
  return heatW >= 0 && thermalKPerW >= 0 && ambientK > 0 ? ambientK + heatW * thermalKPerW : undefined;
}
