import { describe, expect, it } from 'vitest';
import { finiteReservoirResistance } from '../../../core/compute/finite-reservoir';
import { fastRipple, rippleBound, slowRipple } from '../../../core/compute/pump-ripple';
import { expectNear } from '../../support/near';

const pump = { outputA: 2e-3, frequencyHz: 2e4, flyingF: 1e-6, reservoirF: 10e-6, deliverShare: 0.5 };

describe('ripple of a pump with one reservoir', () => {
  // Dickson 1976 (bound), periodic solution of the linear network (slow and fast limit).
  it('is 10 mV at most, 9.545 mV in the slow and 5 mV in the fast limit', () => {
    expectNear(rippleBound(pump), 10e-3, 1e-9);
    expectNear(slowRipple(pump), 9.545e-3, 1e-4);
    expectNear(fastRipple(pump, 0), 5e-3, 1e-9);
  });
  // Sipex SP682 data sheet, 2000, table of ripple: 10 mA, ESR 1 ohm, 10 kHz (both read off the table's own numbers).
  it.each([
    [0.5e-6, 1020e-3],
    [1e-6, 520e-3],
    [3.3e-6, 172e-3],
    [4.7e-6, 120e-3],
    [10e-6, 70e-3],
    [22e-6, 43e-3],
  ])('in the fast limit is that of a data sheet table with %d F', (reservoirF, volts) => {
    expectNear(fastRipple({ ...pump, outputA: 10e-3, frequencyHz: 1e4, reservoirF }, 1), volts, 0.055);
  });
  it('has no answer without a reservoir', () => {
    expect(rippleBound({ ...pump, reservoirF: 0 })).toBeUndefined();
    expect(slowRipple({ ...pump, deliverShare: 0 })).toBeUndefined();
    expect(fastRipple(pump, -1)).toBeUndefined();
  });
});

describe('finite reservoir', () => {
  // Periodic solution with Cout = C: 1.0625/(f C) in all.
  it('adds a sixteenth of the slow limit when it equals the flying capacitor', () => {
    expectNear(finiteReservoirResistance({ ...pump, reservoirF: 1e-6 }), 0.0625 / (2e4 * 1e-6), 1e-9);
  });
});
