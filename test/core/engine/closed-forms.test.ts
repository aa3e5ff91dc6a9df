/** The engine against published and derived closed forms, with diodes so good that the forms' assumptions hold. */
import { describe, expect, it } from 'vitest';
import { fastLimit } from '../../../core/compute/fast-limit';
import { slowRipple } from '../../../core/compute/pump-ripple';
import { thermalVoltage } from '../../../core/compute/thermal-voltage';
import { twoPhaseResistance } from '../../../core/compute/two-phase-resistance';
import { type Network, solve } from '../../../core/engine';
import { solvePump } from '../../support/check-engine';
import { expectNear } from '../../support/near';
import type { SimplePump } from '../../support/simple-pump';
import { ladder, multiplier, type StagePump } from '../../support/stage-pumps';

function solved(network: Network, tolerance = 1e-3) {
  const solution = solve(network, { tolerance });
  if (!solution.converged) throw new Error(solution.reason);
  const out = solution.nodes.find((node) => node.name === 'out')!;
  return { ...solution, average: out.average, ripple: out.max - out.min };
}

/** Slope of the load line between two loads. */
function outputResistance(pump: StagePump, build: (p: StagePump) => Network, tolerance?: number): number {
  const [light, heavy] = [pump.loadA, 2 * pump.loadA];
  const at = (loadA: number) => solved(build({ ...pump, loadA }), tolerance).average;
  return (at(light) - at(heavy)) / (heavy - light);
}

const settled: StagePump = {
  stages: 1,
  inputV: 5,
  swingV: 5,
  frequencyHz: 1e4,
  deliverShare: 0.5,
  driverHighOhm: 0.1,
  driverLowOhm: 0.1,
  flyingF: 1e-6,
  flyingOhm: 1e-3,
  reservoirF: 1e-3,
  reservoirOhm: 1e-3,
  diodeOhm: 0.1,
  loadA: 1e-3,
};
const steady: StagePump = {
  ...settled,
  frequencyHz: 1e5,
  flyingF: 1e-3,
  reservoirF: 0.1,
  driverHighOhm: 5,
  driverLowOhm: 5,
  flyingOhm: 1,
  diodeOhm: 10,
};

describe('slow limit', () => {
  // J. F. Dickson 1976: N/(f C).
  it.each([1, 2, 3, 4, 5])('a multiplier of %d stages has N/(f C)', (stages) => {
    expectNear(outputResistance({ ...settled, stages }, multiplier), stages * 100, 1e-3);
  });
  // Dickson 1976 with the numbers N 3, 1.05 uF, 20 kHz: 142.9 ohm.
  it('a multiplier with the numbers of a worked example has 142.9 ohm', () => {
    const pump = { ...settled, stages: 3, flyingF: 1.05e-6, frequencyHz: 2e4 };
    expectNear(outputResistance(pump, multiplier), 142.86, 1e-3);
  });
  // Charge balance for a square wave and a large reservoir: n(n+1)(5n+1)/12. Resistance sits in the capacitors, so
  // that no diode turns off before the two columns have shared their charge.
  it.each([
    [1, 1],
    [2, 5.5],
    [3, 16],
    [4, 35],
  ])('a ladder of %d stages has %d/(f C)', (stages, factor) => {
    const pump = {
      ...settled,
      stages,
      inputV: 0,
      driverHighOhm: 0.01,
      driverLowOhm: 0.01,
      diodeOhm: 0.01,
      flyingOhm: 1,
    };
    expectNear(outputResistance(pump, ladder), 100 * factor, 1e-3);
  });
  // Charge balance: a reservoir as small as the flying capacitor makes it 1.0625/(f C).
  it('a reservoir as small as the flying capacitor costs a sixteenth more', () => {
    const pump = { ...settled, reservoirF: 1e-6, driverHighOhm: 0.01, driverLowOhm: 0.01, diodeOhm: 0.01 };
    expectNear(outputResistance(pump, multiplier, 1e-5), 106.25, 1e-3);
  });
});

describe('fast limit', () => {
  // Linear two-phase network solved by matrix exponentials, reservoir with 3 ohm: 67.00 ohm, at duty 0.3 83.19 ohm.
  it.each([
    [0.5, 67],
    [0.3, 83.19],
  ])('of a doubler at duty %d is %d ohm', (deliverShare, ohms) => {
    expectNear(outputResistance({ ...steady, reservoirOhm: 3, deliverShare }, multiplier), ohms, 5e-4);
  });
  // Seeman and Sanders 2008, charge multipliers of each element.
  it.each([1, 2, 3, 4])('of a multiplier of %d stages is that of its charge multipliers', (stages) => {
    const expected = fastLimit({
      ...steady,
      topology: 'multiplier',
      stages,
      sign: 1,
      diodeOhm: steady.diodeOhm,
      flyingEsrOhm: 1,
      reservoirEsrOhm: 1e-3,
    })!;
    expectNear(outputResistance({ ...steady, stages }, multiplier), expected, 5e-4);
  });
  // Same source: drivers alone count 2 n^2 (RH + RL), 180 ohm for three stages.
  it('of a ladder of three stages with 5 ohm in the driver is 180 ohm', () => {
    const pump = { ...steady, stages: 3, inputV: 0, diodeOhm: 1e-3, flyingOhm: 1e-3 };
    expectNear(outputResistance(pump, ladder), 180, 1e-3);
  });
});

describe('between the limits', () => {
  // Exact coth form of one capacitor between two sources, known in the switched-capacitor literature.
  it.each([
    [10, 30, 0.5],
    [100, 50, 0.7],
  ])('%d and %d ohm, first share %d: the exact resistance', (ohm1, ohm2, share1) => {
    const pump = {
      ...settled,
      reservoirF: 1e-2,
      deliverShare: 1 - share1,
      driverLowOhm: ohm1,
      driverHighOhm: ohm2,
      diodeOhm: 1e-3,
    };
    const exact = twoPhaseResistance({
      capacitanceF: 1e-6,
      frequencyHz: 1e4,
      share1,
      ohm1: ohm1 + 2e-3,
      ohm2: ohm2 + 2e-3,
    })!;
    expectNear(outputResistance(pump, multiplier, 1e-6), exact, 3e-4);
    expectNear(outputResistance(pump, multiplier), exact, 5e-3);
  });
});

describe('ripple', () => {
  // Charge balance in the slow limit: (I/f)((1-D)/Cout + D/(C+Cout)).
  it('in the slow limit is that of two straight pieces', () => {
    const pump = {
      ...settled,
      frequencyHz: 1e3,
      reservoirF: 10e-6,
      loadA: 0.1e-3,
      driverHighOhm: 0.05,
      driverLowOhm: 0.05,
      diodeOhm: 0.05,
    };
    const expected = slowRipple({
      outputA: 0.1e-3,
      frequencyHz: 1e3,
      flyingF: 1e-6,
      reservoirF: 10e-6,
      deliverShare: 0.5,
    })!;
    expectNear(solved(multiplier(pump)).ripple, expected, 1e-2);
  });
  // Data sheets of pump chips: I/(2 f C) at half duty in the fast limit.
  it('in the fast limit is half of I/(f C)', () => {
    const pump = {
      ...steady,
      frequencyHz: 2e4,
      flyingF: 1e-4,
      reservoirF: 10e-6,
      driverHighOhm: 200,
      driverLowOhm: 200,
      loadA: 2e-3,
    };
    expectNear(solved(multiplier(pump)).ripple, 5e-3, 2e-3);
  });
  // A resistor and a capacitor on a square wave: V tanh(T/(4 R C)), from its two exponentials.
  it('of a plain low-pass on a square wave is V tanh(T/(4 R C))', () => {
    const network: Network = {
      segments: [{ duration: 50e-6 }, { duration: 50e-6 }],
      nodeNames: ['out'],
      knowns: [
        { name: 'wave', volts: [5, 0] },
        { name: 'ground', volts: [0, 0] },
      ],
      resistors: [{ name: 'r', a: ~0, b: 0, ohms: [1000, 1000] }],
      capacitors: [{ name: 'c', a: 0, b: ~1, farads: 47e-9, ohms: 0 }],
      diodes: [],
      loads: [],
    };
    const { average, ripple } = solved(network, 1e-6);
    expectNear(average, 2.5, 1e-5);
    expectNear(ripple, 5 * Math.tanh(100e-6 / (4 * 1000.001 * 47e-9)), 2e-4);
  });
});

describe('stray capacitance', () => {
  // Tridiagonal charge balance for capacitance across the diodes, 5 % of the flying capacitor; also simulated with ideal diodes.
  it.each([
    [1, 9.545],
    [2, 13.7],
    [3, 17.86],
    [4, 22.03],
  ])('across the diodes leaves %d stages with %d V', (stages, volts) => {
    const pump = { ...settled, stages, junctionF: 0.05e-6, loadA: 1e-8 };
    expectNear(solved(multiplier(pump)).average, volts, 1e-3);
  });
});

describe('exponential diodes', () => {
  const pump: SimplePump = {
    topology: 'doubler',
    inputV: 5,
    highV: 5,
    lowV: 0,
    frequencyHz: 1e4,
    highShare: 0.5,
    highOhm: 1e-3,
    lowOhm: 1e-3,
    flyingF: 1e-6,
    flyingOhm: 0,
    reservoirF: 10e-6,
    reservoirOhm: 0,
    saturationA: 2.52e-9,
    slopeV: 1.752 * thermalVoltage(300.15)!,
    diodeOhm: 0,
  };
  // Transient integration with a stiff solver to the periodic state, four digits.
  it.each([
    [1e-6, 9.395],
    [10e-6, 9.186],
    [100e-6, 8.977],
    [1e-3, 8.75],
    [10e-3, 7.819],
  ])('without any resistance leave a doubler at %d A with %d V', (loadA, volts) => {
    expectNear(solvePump({ ...pump, loadA }).average, volts, 5e-4);
  });
  // Banwell and Jayakumar 2000: 2.5 nA, n 1.75 at 25 degC, 1000.6 ohm, 5 V: 4.351 mA.
  it('with a resistor alone carry the current of the Lambert form', () => {
    const network: Network = {
      segments: [{ duration: 1e-3 }],
      nodeNames: ['out'],
      knowns: [
        { name: 'supply', volts: [5] },
        { name: 'ground', volts: [0] },
      ],
      resistors: [{ name: 'r', a: ~0, b: 0, ohms: [1000] }],
      capacitors: [],
      diodes: [
        { name: 'd', a: 0, b: ~1, saturation: 2.5e-9, slope: 1.75 * thermalVoltage(298.15)!, ohms: 0.6 },
      ],
      loads: [],
    };
    expectNear(solved(network).diodes[0]!.average, 4.351e-3, 1e-4);
  });
});

describe('charge balance', () => {
  // Every diode passes exactly what the load takes; a driver moves that once for each of its capacitors.
  it('every diode of a ladder carries the load current, its driver n times as much', () => {
    const { diodes, resistors } = solved(
      ladder({ ...settled, stages: 3, inputV: 0, diodeOhm: 2, loadA: 1e-3 }),
    );
    expect(diodes).toHaveLength(6);
    for (const diode of diodes) expectNear(diode.average, 1e-3, 1e-4);
    expectNear(resistors[0]!.averagePositive, 3e-3, 1e-3);
    expectNear(resistors[0]!.averageNegative, 3e-3, 1e-3);
  });
});
