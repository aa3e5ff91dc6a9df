import { describe, expect, it } from 'vitest';
import { type Network, runDown, solve, startUp } from '../../../core/engine';
import type { PumpValues } from '../../../core/pump/values';
import { capacitor, networkOf, pinDrive, pump, siliconDiode } from '../../support/circuits';

function started(values: PumpValues, reach: number) {
  const { network, output } = networkOf(values);
  const solved = solve(network);
  if (!solved.converged) throw new Error(solved.reason);
  const final = solved.nodes[output]!.average;
  const result = startUp(network, { output, final, states: solved.start, reach });
  if (!result) throw new Error('no start-up');
  return { ...result, final, network, output, states: solved.start };
}

/** Nearly ideal diode: 1 mV per e-fold, so that its drop hardly counts. */
const sharp = { saturation: 1e-9, slope: 1e-3, ohms: 1e-3 };

it('switch-on starts every capacitor at nothing and tells how far each goes', () => {
  // A capacitor behind a resistor on a steady 5 V: it climbs to 5 V and never goes below zero (exponential charging).
  const network = {
    segments: [{ duration: 1e-4 }],
    nodeNames: ['out'],
    knowns: [
      { name: 'ground', volts: [0] },
      { name: 'rail', volts: [5] },
    ],
    resistors: [{ name: 'r', a: ~1, b: 0, ohms: [1000] }],
    capacitors: [{ name: 'c', a: 0, b: ~0, farads: 1e-6, ohms: 0 }],
    diodes: [],
    loads: [],
  };
  const start = startUp(network, { output: 0, final: 5, states: Float64Array.of(5), reach: 0.9 })!;
  expect(start.capacitorLows[0]).toBe(0);
  expect(start.capacitorHighs[0]).toBeGreaterThan(4.4);
  expect(start.capacitorHighs[0]).toBeLessThanOrEqual(5 + 1e-6);
  // R C ln 10 to 90 %, and the average over a period lags by half of it.
  expect(Math.abs(start.time / (1e-3 * Math.log(10) + 0.5e-4) - 1)).toBeLessThan(0.012);
});

describe('switch-on', () => {
  it('takes a multiplier the cycles of its self-capacitance formula', () => {
    // T. Tanzawa, T. Tanaka, IEEE JSSC 32(8), 1997 (formula from memory): Rout (Cout + Cp) ln 10 from the state in
    // which the diodes have charged everything to the input, Cp = C (4 N^2 + 3 N + 2) / (12 (N + 1)).
    const [stages, farads, reservoir, frequency] = [4, 1e-6, 10e-6, 10e3];
    const values = pump({
      stages,
      frequency,
      drives: [pinDrive(0.1), pinDrive(0.1, 0.1, true)],
      flying: Array.from({ length: stages }, () => capacitor(farads)),
      reservoir: capacitor(reservoir),
      diodes: Array.from({ length: stages + 1 }, () => sharp),
      loads: [],
    });
    const own = (farads * (4 * stages ** 2 + 3 * stages + 2)) / (12 * (stages + 1));
    const expected = (stages / farads) * (reservoir + own) * Math.log(10);
    // 90 % of the way from 5 V to 25 V is 92 % of 25 V.
    const { time } = started(values, 23 / 25);
    expect(Math.abs(time * frequency - expected)).toBeLessThan(0.03 * expected + 1);
  });

  it('meets period-by-period integration', () => {
    // The leaps against the same run without leaps: a share of periods that is integrated one by one.
    const values = pump({ drives: [pinDrive(40, 45)], flying: [capacitor(1e-7, 0.01)] });
    const { course, integrated, periods, time } = started(values, 0.9);
    expect(integrated).toBeLessThan(periods);
    expect(course.at(-1)!.time).toBeGreaterThanOrEqual(time);
    for (let k = 1; k < course.length; k++) expect(course[k]!.volts).toBeGreaterThan(course[k - 1]!.volts);
  });

  it('first loads the pin as the loop of its resistances says', () => {
    // Ohm's law at the first edge with everything empty: (5 V - drop of the diode) / (pin + diode + ESR).
    const diode = { ...siliconDiode, ohms: 1 };
    const values = pump({
      duty: 0.5,
      drives: [pinDrive(40, 40)],
      flying: [capacitor(10e-6, 0.1)],
      reservoir: capacitor(100e-6, 0.1),
      diodes: [diode, diode],
      rails: [{ name: 'v5', volts: 5, ohms: 0 }],
    });
    const { input: _input, ...grounded } = values;
    const { resistorPeaks } = started(grounded, 0.5);
    const drop = diode.slope * Math.log(0.1 / diode.saturation);
    const expected = (5 - drop) / (40 + 1 + 0.2);
    expect(Math.abs(resistorPeaks[0]! - expected)).toBeLessThan(0.02 * expected);
  });

  it('takes from the supply at least the energy that it stores', () => {
    const { energy, states, network } = started(pump({ drives: [pinDrive(40)] }), 0.9);
    const stored = network.capacitors.reduce((sum, c, k) => sum + (c.farads * states[k]! ** 2) / 2, 0);
    // Charging a capacitor through resistance costs as much again as it keeps.
    expect(energy[1]!).toBeGreaterThan(0.81 * 2 * stored * 0.9);
  });
});

describe('switch-off', () => {
  const bare = (ohms: number, farads: number): Network => ({
    segments: [{ duration: 1e-3 }],
    nodeNames: ['out'],
    knowns: [{ name: 'ground', volts: [0] }],
    resistors: [{ name: 'bleeder', a: 0, b: ~0, ohms: [ohms] }],
    capacitors: [{ name: 'c', a: 0, b: ~0, farads, ohms: 0 }],
    diodes: [],
    loads: [],
  });

  it.each([
    // R C ln(V0 / V): 10 kohm, 100 uF from 12 V to 1 V takes 2.485 s; 39.15 kohm from 100 V to 60 V takes 2.000 s.
    [10e3, 100e-6, 12, 1, 2.485],
    [39.15e3, 100e-6, 100, 60, 2.0],
  ])('of %d ohm and %d F from %d V to %d V takes %d s', (ohms, farads, from, level, seconds) => {
    const down = runDown(bare(ohms, farads), {
      output: 0,
      states: Float64Array.of(from),
      level,
      segment: 0,
    })!;
    expect(Math.abs(down.time - seconds)).toBeLessThan(2e-3 * seconds);
    // It only falls: never above where it began, never below zero.
    expect(down.capacitorHighs[0]).toBe(from);
    expect(down.capacitorLows[0]).toBeLessThan(level);
    expect(down.capacitorLows[0]).toBeGreaterThanOrEqual(-1e-9);
  });

  it('is never over without a load', () => {
    const time = runDown(bare(1e15, 1e-3), {
      output: 0,
      states: Float64Array.of(12),
      level: 1,
      segment: 0,
    })?.time;
    expect(time).toBe(Number.POSITIVE_INFINITY);
  });
});
