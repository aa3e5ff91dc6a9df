/** Frequency of a Schmitt inverter with one resistor from output to input and one capacitor from input to ground. */
import { type SquareTiming, squareTiming } from './astable-timing';

export interface SchmittOscillator {
  readonly ohm: number;
  readonly farads: number;
  /** Output levels, V. */
  readonly highV: number;
  readonly lowV: number;
  /** Thresholds of the input, V, between the levels, rising above falling. */
  readonly risingV: number;
  readonly fallingV: number;
}

/**
 * `tH = R C ln((VOH - VT-)/(VOH - VT+))`, `tL = R C ln((VT+ - VOL)/(VT- - VOL))`.
 *
 * Undefined unless `low < falling < rising < high` and R and C are above 0. Without propagation delay and output
 * resistance: good for periods above 1 us and R far above the output's.
 * Source: the two exponentials. Worked: 10 kohm, 10 nF, 0 and 4.5 V, 2.36 and 1.53 V: 13.14 kHz, duty 0.4306.
 */
export function schmittTiming(oscillator: SchmittOscillator): SquareTiming | undefined {
  const { ohm, farads, highV, lowV, risingV, fallingV } = oscillator;
  if (!(ohm > 0 && farads > 0 && lowV < fallingV && fallingV < risingV && risingV < highV)) return undefined;
  return squareTiming(
    ohm * farads * Math.log((highV - fallingV) / (highV - risingV)),
    ohm * farads * Math.log((risingV - lowV) / (fallingV - lowV)),
  );
}
