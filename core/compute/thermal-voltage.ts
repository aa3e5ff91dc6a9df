/** Physical constants of the semiconductor formulas, and the voltage that scales them. */

/** Boltzmann constant, J/K. Exact in the SI of 2019. */
export const boltzmann = 1.380649e-23;
/** Elementary charge, C. Exact in the SI of 2019. */
export const elementaryCharge = 1.602176634e-19;
/** 0 degC in kelvin. */
export const zeroCelsius = 273.15;
/** Temperature at which part data hold: 25 degC in kelvin. */
export const referenceTemperature = 298.15;

/**
 * Thermal voltage of a junction: `Vt = k T / q`.
 *
 * `temperatureK` in kelvin, above 0; answers volt. Out of range: undefined.
 * Source: SI constants. Worked: 298.15 K gives 25.69 mV.
 */
export function thermalVoltage(temperatureK: number): number | undefined {
  return temperatureK > 0 && Number.isFinite(temperatureK)
    ? (boltzmann * temperatureK) / elementaryCharge
    : undefined;
}
