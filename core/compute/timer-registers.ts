/** Square waves that a microcontroller's counter can make, and the register values for a wanted one. */

export interface CounterWave {
  readonly frequencyHz: number;
  readonly duty: number;
}

/**
 * Counter that runs from 0 to `top` and starts again: `f = input / (prescaler (top + 1))`, duty `compare / (top + 1)`.
 *
 * `inputHz` above 0; `prescaler` 1 or more, may be fractional; `top` and `compare` whole, `compare` up to `top + 1`.
 * Undefined out of range. Some eight-bit counters count the compare value itself too, one step more: give compare + 1.
 * Source: data sheets of common microcontrollers (from memory: confirm). Worked: 16 MHz, 1, top 255: 62.5 kHz.
 */
export function upCounter(
  inputHz: number,
  prescaler: number,
  top: number,
  compare: number,
): CounterWave | undefined {
  if (
    !isCounter(inputHz, prescaler, top) ||
    !(Number.isInteger(compare) && compare >= 0 && compare <= top + 1)
  ) {
    return undefined;
  }
  return { frequencyHz: inputHz / (prescaler * (top + 1)), duty: compare / (top + 1) };
}

/**
 * Counter that runs up to `top` and down again: `f = input / (2 prescaler top)`, duty `compare / top`.
 *
 * As above, `top` at least 1 and `compare` at most `top`. Worked: 16 MHz, 1, top 255: 31.373 kHz.
 */
export function upDownCounter(
  inputHz: number,
  prescaler: number,
  top: number,
  compare: number,
): CounterWave | undefined {
  if (
    !isCounter(inputHz, prescaler, top) ||
    !(top >= 1 && Number.isInteger(compare) && compare >= 0 && compare <= top)
  ) {
    return undefined;
  }
  return { frequencyHz: inputHz / (2 * prescaler * top), duty: compare / top };
}

export interface CounterChoice {
  readonly prescaler: number;
  readonly top: number;
  readonly frequencyHz: number;
  /** Relative to the wanted frequency. */
  readonly error: number;
}

/**
 * Registers of an up-counter for a wanted frequency: the smallest prescaler whose top fits, since that leaves the finest steps.
 *
 * `prescalers` in any order, each 1 or more; `mostTop` whole. Undefined when the frequency is out of reach.
 * Worked: 16 MHz, 44.1 kHz, 16 bit: prescaler 1, top 362, 44.077 kHz; 8 bit: prescaler 8, top 44, 44.444 kHz.
 */
export function chooseRegisters(
  inputHz: number,
  wantedHz: number,
  prescalers: readonly number[],
  mostTop: number,
): CounterChoice | undefined {
  if (!(inputHz > 0 && wantedHz > 0)) return undefined;
  for (const prescaler of [...prescalers].sort((a, b) => a - b)) {
    const top = Math.round(inputHz / (prescaler * wantedHz)) - 1;
    if (!(prescaler >= 1 && top >= 1 && top <= mostTop)) continue;
    const frequencyHz = inputHz / (prescaler * (top + 1));
    return { prescaler, top, frequencyHz, error: frequencyHz / wantedHz - 1 };
  }
  return undefined;
}

function isCounter(inputHz: number, prescaler: number, top: number): boolean {
  return inputHz > 0 && Number.isFinite(inputHz) && prescaler >= 1 && Number.isInteger(top) && top >= 0;
}
