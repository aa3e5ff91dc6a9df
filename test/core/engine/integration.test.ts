/**
 * Outside source of every check here: an independently written model of the same circuit, integrated by the ODE
 * package `odex` (E. Hairer, G. Wanner, Solving Ordinary Differential Equations I) and brought to its periodic state.
 */
import { describe, it } from 'vitest';
import { saturationAtTemperature, temperatureLaws } from '../../../core/compute/diode-saturation-temperature';
import { thermalVoltage } from '../../../core/compute/thermal-voltage';
import { type Agreement, checkAgainstIntegration } from '../../support/check-engine';
import type { SimplePump } from '../../support/simple-pump';

type DiodeFields = Pick<SimplePump, 'saturationA' | 'slopeV' | 'diodeOhm'>;

const silicon = (kelvin = 298.15): DiodeFields => ({
  saturationA: saturationAtTemperature(2.5e-9, 1.75, temperatureLaws.silicon, 298.15, kelvin)!,
  slopeV: 1.75 * thermalVoltage(kelvin)!,
  diodeOhm: 0.6,
});
const schottky = (kelvin = 298.15): DiodeFields => ({
  saturationA: saturationAtTemperature(2.2e-8, 1.03, temperatureLaws.schottky, 298.15, kelvin)!,
  slopeV: 1.03 * thermalVoltage(kelvin)!,
  diodeOhm: 1.15,
});

const doubler: SimplePump = {
  topology: 'doubler',
  inputV: 3.3,
  highV: 3.3,
  lowV: 0,
  frequencyHz: 100e3,
  highShare: 0.5,
  highOhm: 28,
  lowOhm: 21,
  flyingF: 1e-6,
  flyingOhm: 10e-3,
  reservoirF: 10e-6,
  reservoirOhm: 10e-3,
  ...schottky(),
  loadA: 1.2e-3,
};
const inverter: SimplePump = { ...doubler, topology: 'inverter', inputV: 0 };

const circuits: Record<string, SimplePump> = {
  'doubler, Schottky, fast limit, steady current and resistance': { ...doubler, loadOhm: 47e3 },
  'doubler, silicon, 5 V pin of an eight-bit chip': {
    ...doubler,
    ...silicon(),
    inputV: 5,
    highV: 5,
    highOhm: 40,
    lowOhm: 45,
    frequencyHz: 62.5e3,
    loadA: 3e-3,
  },
  'doubler, slow limit, resistive load': {
    ...doubler,
    frequencyHz: 1e3,
    flyingF: 0.47e-6,
    highOhm: 5,
    lowOhm: 5,
    loadA: undefined,
    loadOhm: 10e3,
  },
  'doubler, between the limits': { ...doubler, frequencyHz: 8e3, loadA: 4e-3 },
  'doubler, reservoir no larger than the flying capacitor': {
    ...doubler,
    frequencyHz: 5e3,
    reservoirF: 1e-6,
    loadA: 2e-3,
  },
  'doubler, electrolytics with 2 ohm, duty 30 %': {
    ...doubler,
    ...silicon(),
    highShare: 0.3,
    frequencyHz: 20e3,
    flyingF: 10e-6,
    flyingOhm: 2,
    reservoirF: 100e-6,
    reservoirOhm: 2,
    loadA: 5e-3,
  },
  'doubler, duty 80 %, very light load': { ...doubler, highShare: 0.8, loadA: 1e-6 },
  'doubler, silicon at -40 degC': { ...doubler, ...silicon(233.15), frequencyHz: 10e3 },
  'doubler, Schottky at 85 degC, open but for 1 Mohm': {
    ...doubler,
    ...schottky(358.15),
    loadA: undefined,
    loadOhm: 1e6,
  },
  'doubler, loaded to half of its voltage': { ...doubler, loadA: undefined, loadOhm: 400 },
  'doubler from a timer output of 3.4 V on a 5 V rail': {
    ...doubler,
    ...silicon(),
    inputV: 5,
    highV: 3.5,
    lowV: 0.1,
    highOhm: 4,
    lowOhm: 10,
    frequencyHz: 6.87e3,
    flyingF: 10e-6,
    reservoirF: 47e-6,
    reservoirOhm: 0.8,
    highShare: 0.5238,
    loadA: 10e-3,
  },
  'inverter, Schottky, fast limit': inverter,
  'inverter, silicon, slow limit, resistive load, duty 60 %': {
    ...inverter,
    ...silicon(),
    frequencyHz: 2e3,
    highOhm: 10,
    lowOhm: 10,
    highShare: 0.6,
    loadA: undefined,
    loadOhm: 4.7e3,
  },
  'inverter, hot Schottky, ESR 1 ohm': {
    ...inverter,
    ...schottky(358.15),
    flyingOhm: 1,
    reservoirOhm: 1,
    loadA: 5e-3,
  },
  'inverter, cold silicon, weak pin': {
    ...inverter,
    ...silicon(233.15),
    highOhm: 200,
    lowOhm: 75,
    loadA: 0.5e-3,
  },
  'inverter at 1 MHz with 10 nF': {
    ...inverter,
    frequencyHz: 1e6,
    flyingF: 10e-9,
    reservoirF: 100e-9,
    loadA: 2e-3,
  },
};

const usual: Agreement = { average: 5e-4, current: 5e-4, rms: 5e-3, ripple: 1e-2 };
const looser: Agreement = { ...usual, average: 1e-3, current: 1e-3 };
const tight: Agreement = { average: 2e-5, current: 1e-4, rms: 2e-4, ripple: 2e-3 };

describe('the engine agrees with an independent integration', () => {
  it.each(Object.entries(circuits))('%s', (_, pump) => checkAgainstIntegration(pump, usual));
});

describe("what is left is the engine's step error, which its tolerance governs", () => {
  it.each(Object.entries(circuits))('%s', (_, pump) =>
    checkAgainstIntegration(pump, tight, { tolerance: 1e-6 }),
  );
});

/** Small linear congruential sequence (constants of Numerical Recipes, from memory): the same circuits on every run. */
function* uniform(seed: number): Generator<number, never> {
  let state = seed;
  for (;;) {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    yield state / 2 ** 32;
  }
}

describe('and so do circuits drawn by lot', () => {
  const lot = uniform(20260);
  const between = (low: number, high: number) => low + (high - low) * lot.next().value;
  const decades = (low: number, high: number) => low * (high / low) ** lot.next().value;
  const drawn = Array.from({ length: 24 }, (_, i): SimplePump => {
    const kelvin = between(233, 358);
    const highV = between(2.5, 6);
    const flyingF = decades(10e-9, 22e-6);
    const frequencyHz = decades(500, 500e3);
    // What the pump could carry at most, of which a share is asked.
    const limitA = highV / (1 / (frequencyHz * flyingF) + 200);
    return {
      topology: i % 2 === 0 ? 'doubler' : 'inverter',
      inputV: i % 2 === 0 ? between(2.5, 6) : 0,
      highV,
      lowV: between(0, 0.3),
      frequencyHz,
      highShare: between(0.2, 0.8),
      highOhm: decades(5, 200),
      lowOhm: decades(5, 200),
      flyingF,
      flyingOhm: decades(5e-3, 2),
      reservoirF: flyingF * decades(1, 100),
      reservoirOhm: decades(5e-3, 2),
      ...(i % 3 === 0 ? silicon(kelvin) : schottky(kelvin)),
      ...(i % 4 < 2
        ? { loadA: limitA * between(0.01, 0.3) }
        : { loadOhm: highV / (limitA * between(0.01, 0.4)) }),
    };
  });
  it.each(drawn.map((pump, i) => [i, pump] as const))('number %d', (_, pump) =>
    checkAgainstIntegration(pump, looser),
  );
});
