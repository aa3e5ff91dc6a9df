import { describe, expect, it } from 'vitest';
import {
  type Overlap,
  overlapCharge,
  overlapTime,
  storageConstant,
  storageTime,
} from '../../../core/compute/storage-time';
import { expectNear } from '../../support/near';

describe('storage time', () => {
  // Charge control model (Gray and Meyer, from memory: confirm) worked by hand: 200 ns ln(2/1.05).
  it('is 128.9 ns for 1 mA in and out of the base at 10 mA and a gain of 200', () => {
    expectNear(storageTime(200e-9, 1e-3, -1e-3, 10e-3, 200), 128.9e-9, 5e-4);
    expect(storageTime(200e-9, 1e-3, 0, 10e-3, 200)).toBeUndefined();
  });
  it('is none out of saturation', () => {
    expect(storageTime(200e-9, 1e-3, -1e-3, 0.3, 200)).toBe(0);
  });
  it('gives its time constant back from the test of a data sheet', () => {
    expectNear(storageConstant(128.9e-9, 200), 200e-9, 5e-4);
    expect(storageConstant(100e-9, 10)).toBeUndefined();
  });
});

describe('overlap of a complementary pair', () => {
  // min(bF Ib, limit) t worked by hand: 100 x 3.55 mA x 150 ns.
  it('takes 53.25 nC, 266.3 nJ at 5 V and 1.065 mA at 10 kHz', () => {
    const charge = overlapCharge(100, 3.55e-3, 1, 150e-9)!;
    expectNear(charge, 53.25e-9, 1e-9);
    expectNear(5 * charge, 266.3e-9, 5e-4);
    expectNear(2 * 10e3 * charge, 1.065e-3, 1e-9);
  });
  it('is bounded by what supply and resistances let through', () => {
    expectNear(overlapCharge(100, 3.55e-3, 0.1, 150e-9), 15e-9, 1e-9);
    expect(overlapCharge(0, 1e-3, 1, 1e-9)).toBeUndefined();
  });

  /**
   * The charge control equations themselves, integrated: one transistor comes on with its transit time, the other loses
   * its stored charge to the reversed base, to recombination and to the growing collector current.
   */
  function integrated({ tauS, gain, onA, offA, loadA }: Overlap, onGain: number, baseA: number): number {
    const transit = 0.5e-9;
    const step = 0.05e-9;
    let active = 0;
    let stored = tauS * (onA - loadA / gain);
    let moved = 0;
    while (stored > 0) {
      const cross = active / transit;
      active += step * (baseA - active / (onGain * transit));
      stored += step * (offA - (cross + loadA) / gain - stored / tauS);
      moved += step * cross;
    }
    return moved;
  }

  it.each([
    ['1 kohm at 5 V', { tauS: 230e-9, gain: 200, onA: 4.14e-3, offA: -0.7e-3 }, 180, 4.14e-3],
    ['10 kohm at 5 V', { tauS: 230e-9, gain: 200, onA: 0.43e-3, offA: -0.072e-3 }, 180, 0.43e-3],
    ['3.3 kohm at 3.3 V', { tauS: 270e-9, gain: 180, onA: 0.77e-3, offA: -0.22e-3 }, 200, 0.77e-3],
    ['with a load of 10 mA', { tauS: 230e-9, gain: 200, onA: 4.14e-3, offA: -0.7e-3 }, 180, 4.14e-3],
  ])('agrees within a third with both charges integrated: %s', (name, pair, onGain, baseA) => {
    const loadA = name.includes('load') ? 10e-3 : 0;
    const overlap: Overlap = { ...pair, loadA, crossA: onGain * baseA };
    const charge = overlapCharge(onGain, baseA, 10, overlapTime(overlap)!)!;
    const exact = integrated(overlap, onGain, baseA);
    expect(charge / exact).toBeGreaterThan(2 / 3);
    expect(charge / exact).toBeLessThan(4 / 3);
  });
});
