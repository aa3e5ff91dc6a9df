import { describe, expect, it } from 'vitest';
import { combinedResistance } from '../../../core/compute/combined-resistance';
import { fastLimit } from '../../../core/compute/fast-limit';
import { idealPumpVoltage } from '../../../core/compute/ideal-pump-voltage';
import { pumpEstimate } from '../../../core/compute/pump-estimate';
import { slowLimit } from '../../../core/compute/slow-limit';
import {
  twoPhasePeakCurrent,
  twoPhaseResistance,
  twoPhaseRmsCurrent,
} from '../../../core/compute/two-phase-resistance';
import { expectNear } from '../../support/near';

const equal = { flyingF: [1e-6], smoothingF: [1e-6], frequencyHz: 1e4 } as const;
const doublerLimit = {
  topology: 'doubler',
  stages: 1,
  sign: 1,
  deliverShare: 0.5,
  driverHighOhm: 5,
  driverLowOhm: 5,
  diodeOhm: 10,
  flyingEsrOhm: 1,
  reservoirEsrOhm: 3,
} as const;

describe('ideal voltage', () => {
  // J. F. Dickson 1976, open-circuit voltage: three stages, 5 V supply and swing, stray 5 %, diodes 0.6 V: 16.89 V.
  it('is the published open-circuit voltage of a multiplier', () => {
    const swingV = (5 * 1) / 1.05;
    expectNear(
      idealPumpVoltage({ topology: 'multiplier', stages: 3, inputV: 5, swingV, diodeV: 0.6, sign: 1 }),
      16.89,
      5e-4,
    );
  });
  it('follows the sign of the chain', () => {
    const pump = { stages: 2, inputV: 0, swingV: 5, diodeV: 0.5 } as const;
    expect(idealPumpVoltage({ ...pump, topology: 'inverter', sign: 1 })).toBe(-4);
    expect(idealPumpVoltage({ ...pump, topology: 'multiplier', sign: -1 })).toBe(-8.5);
    expect(idealPumpVoltage({ ...pump, topology: 'ladder', sign: 1 })).toBe(8);
    expect(idealPumpVoltage({ ...pump, topology: 'ladder', stages: 0.5, sign: 1 })).toBeUndefined();
  });
});

describe('slow limit', () => {
  // Dickson 1976: N/((C + Cs) f) with N 3, 1.05 uF, 20 kHz.
  it('is the published source resistance of a multiplier', () => {
    expectNear(
      slowLimit({ topology: 'multiplier', stages: 3, flyingF: [1.05e-6], smoothingF: [], frequencyHz: 2e4 }),
      142.9,
      5e-4,
    );
  });
  // Seeman and Sanders 2008 applied to a square-wave ladder with a large reservoir: n(n+1)(5n+1)/12.
  it.each([
    [1, 1],
    [2, 5.5],
    [3, 16],
    [4, 35],
  ])('of a ladder with %d stages is %d/(f C)', (stages, factor) => {
    expectNear(slowLimit({ topology: 'ladder', stages, ...equal }), factor * 100, 1e-12);
  });
  // Simulated with ideal diodes: doubling the first coupling capacitor of two stages brings 5.5 down to 3.5,
  // tapering both columns of three stages brings 16 down to 7.09.
  it('takes unequal capacitors into account', () => {
    expectNear(slowLimit({ topology: 'ladder', stages: 2, ...equal, flyingF: [2e-6, 1e-6] }), 350, 1e-12);
    const taper = [3e-6, 2e-6, 1e-6];
    expectNear(
      slowLimit({ topology: 'ladder', stages: 3, frequencyHz: 1e4, flyingF: taper, smoothingF: taper }),
      709,
      1e-3,
    );
  });
  // Sipex SP682 data sheet, 2000, table of output resistance: switches of 84 ohm in all and 2/(f C) of two flying capacitors
  // at 10 kHz (both read off the table's own numbers).
  it.each([
    [0.05e-6, 4085],
    [0.1e-6, 2084],
    [0.47e-6, 510],
    [1e-6, 285],
    [3.3e-6, 140],
    [4.7e-6, 125],
    [10e-6, 105],
    [22e-6, 94],
  ])("of two capacitors of %d F explains a data sheet's %d ohm", (farads, ohms) => {
    const slow = slowLimit({
      topology: 'multiplier',
      stages: 2,
      flyingF: [farads],
      smoothingF: [],
      frequencyHz: 1e4,
    })!;
    expectNear(84 + slow, ohms, 0.035);
  });
  it('has no answer for a list of the wrong length or a value of zero', () => {
    expect(slowLimit({ topology: 'multiplier', stages: 3, ...equal, flyingF: [1e-6, 1e-6] })).toBeUndefined();
    expect(slowLimit({ topology: 'doubler', stages: 1, ...equal, flyingF: [0] })).toBeUndefined();
  });
});

describe('fast limit', () => {
  // Periodic solution of the linear two-phase network by matrix exponentials.
  it('is 67.00 ohm at half duty and 83.19 ohm at 0.3 for a doubler', () => {
    expectNear(fastLimit(doublerLimit), 67, 1e-9);
    expectNear(fastLimit({ ...doublerLimit, deliverShare: 0.3 }), 83.19, 1e-4);
  });
  it('is 180 ohm for a ladder of three stages with 5 ohm in each driver switch', () => {
    const ladder = { ...doublerLimit, topology: 'ladder', stages: 3, diodeOhm: 0, flyingEsrOhm: 0 } as const;
    expectNear(fastLimit(ladder), 180, 1e-9);
  });
  // Table of a two-capacitor inverting chip: its form has 4 times the flying ESR and once the reservoir's ESR
  // (Sipex SP682 data sheet, 2000).
  it('weighs capacitor resistances as the published formula of a pump chip does', () => {
    const only = {
      ...doublerLimit,
      topology: 'inverter',
      driverHighOhm: 0,
      driverLowOhm: 0,
      diodeOhm: 0,
    } as const;
    expectNear(fastLimit({ ...only, flyingEsrOhm: 1, reservoirEsrOhm: 0 }), 4, 1e-12);
    expectNear(fastLimit({ ...only, flyingEsrOhm: 0, reservoirEsrOhm: 1 }), 1, 1e-12);
  });
  it('counts a driver with the square of the capacitors it moves', () => {
    const drivers = {
      ...doublerLimit,
      topology: 'multiplier',
      diodeOhm: 0,
      flyingEsrOhm: 0,
      reservoirEsrOhm: 0,
    } as const;
    expectNear(fastLimit({ ...drivers, stages: 3 }), 2 * 10 * (4 + 1), 1e-12);
    expectNear(fastLimit({ ...drivers, stages: 4 }), 2 * 10 * (4 + 4), 1e-12);
  });
  it('puts the low switch of an inverter into the delivering phase', () => {
    const inverter = {
      ...doublerLimit,
      topology: 'inverter',
      deliverShare: 0.25,
      diodeOhm: 0,
      flyingEsrOhm: 0,
      reservoirEsrOhm: 0,
    } as const;
    expectNear(fastLimit({ ...inverter, driverHighOhm: 0, driverLowOhm: 5 }), 20, 1e-12);
  });
  it('has no answer for a duty of 1', () => {
    expect(fastLimit({ ...doublerLimit, deliverShare: 1 })).toBeUndefined();
  });
});

describe('one capacitor between two phases', () => {
  const network = { capacitanceF: 1e-6, frequencyHz: 1e4, share1: 0.5, ohm1: 10, ohm2: 30 };
  // Periodic solution of the linear network by matrix exponentials; the coth form is known in the literature.
  it('has the exact resistance, 124.0 ohm and, at other values, 320.3 ohm', () => {
    expectNear(twoPhaseResistance(network), 124.0, 3e-4);
    expectNear(twoPhaseResistance({ ...network, share1: 0.7, ohm1: 100, ohm2: 50 }), 320.3, 2e-4);
  });
  it('runs into both limits', () => {
    expectNear(twoPhaseResistance({ ...network, ohm1: 0, ohm2: 0 }), 100, 1e-12);
    expectNear(twoPhaseResistance({ ...network, capacitanceF: 1 }), 80, 1e-6);
  });
  it('has the peak and effective currents of the two exponentials', () => {
    expectNear(twoPhasePeakCurrent(network, 1, 1e-3), 10.07e-3, 5e-4);
    expectNear(twoPhasePeakCurrent(network, 2, 1e-3), 4.11e-3, 5e-4);
    expectNear(twoPhaseRmsCurrent(network, 1, 1e-3), 2.251e-3, 5e-4);
    expectNear(twoPhaseRmsCurrent(network, 2, 1e-3), 1.563e-3, 5e-4);
  });
  // Conservation of energy: the equivalent resistance burns what the two real ones burn.
  it('loses exactly I^2 Req', () => {
    const loss =
      10 * twoPhaseRmsCurrent(network, 1, 1e-3)! ** 2 + 30 * twoPhaseRmsCurrent(network, 2, 1e-3)! ** 2;
    expectNear(loss, 1e-6 * twoPhaseResistance(network)!, 1e-12);
  });
  it('has no answer without a second phase', () => {
    expect(twoPhaseResistance({ ...network, share1: 1 })).toBeUndefined();
    expect(twoPhasePeakCurrent({ ...network, ohm1: 0 }, 1, 1e-3)).toBeUndefined();
  });
});

describe('combined resistance', () => {
  // Against the exact form for equal phases, coth(Rslow/Rfast): the combination may be off by 2.6 % at most.
  it.each([0.1, 0.3, 0.7, 1, 1.43, 2, 5])(
    'stays within 2.6 %% of the exact form at a ratio of %d',
    (ratio) => {
      expectNear(combinedResistance(ratio, 1), ratio / Math.tanh(ratio), 0.0265);
    },
  );
  it('has no answer for a negative resistance', () => {
    expect(combinedResistance(-1, 1)).toBeUndefined();
    expect(combinedResistance(0, 0)).toBe(0);
  });
});

describe('estimate of a pump', () => {
  const pump = {
    ...doublerLimit,
    inputV: 5,
    swingV: 5,
    frequencyHz: 2e4,
    flyingF: [10e-6],
    smoothingF: [],
    driverHighOhm: 40,
    driverLowOhm: 45,
    diodeOhm: 2,
    flyingEsrOhm: 0.1,
    reservoirEsrOhm: 0,
    outputA: 5e-3,
    diodeSaturationA: 2.5e-9,
    diodeSlopeV: 0.04496,
  } as const;
  // Solved by matrix exponentials: slow limit 5 ohm, together 178.4 ohm, a pump in its fast limit.
  it('finds the resistance of a pump on a plain output pin', () => {
    const estimate = pumpEstimate(pump)!;
    expectNear(estimate.slowOhm, 5, 1e-12);
    expectNear(estimate.outputOhm, 178.4, 1e-3);
    expectNear(estimate.outputV, 10 - estimate.diodesV - 5e-3 * estimate.outputOhm, 1e-12);
  });
  it('is symmetric for a pump that goes down', () => {
    const up = pumpEstimate({ ...pump, inputV: 0 })!;
    const down = pumpEstimate({
      ...pump,
      topology: 'inverter',
      inputV: 0,
      driverHighOhm: 45,
      driverLowOhm: 40,
    })!;
    expectNear(down.outputV, -up.outputV, 1e-12);
  });
  it('has no answer when an input is out of range', () => {
    expect(pumpEstimate({ ...pump, frequencyHz: 0 })).toBeUndefined();
  });
});
