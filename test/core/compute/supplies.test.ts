import { describe, expect, it } from 'vitest';
import { averageCurrent, batteryLife, selfDischargeCurrent } from '../../../core/compute/battery-life';
import { junctionTemperature, linearRegulator, switchingRegulator } from '../../../core/compute/regulator';
import { sampleSize } from '../../../core/compute/sample-size';
import { expectNear } from '../../support/near';

describe('battery', () => {
  // Charge balance worked by hand for a coin cell of 220 mAh.
  it('of 220 mAh lasts 1782 h at 10 mA for 1 % of the time', () => {
    const average = averageCurrent([
      { currentA: 10e-3, share: 0.01 },
      { currentA: 5e-6, share: 0.99 },
    ])!;
    expectNear(average, 104.95e-6, 1e-9);
    expectNear(batteryLife(0.22 * 3600, average, 0.85, 0)! / 3600, 1782, 5e-4);
    expectNear(selfDischargeCurrent(0.22 * 3600, 0.01), 0.2511e-6, 5e-4);
  });
  it('has no answer when the shares do not add up or nothing drains it', () => {
    expect(averageCurrent([{ currentA: 1, share: 0.5 }])).toBeUndefined();
    expect(batteryLife(1, 0, 1, 0)).toBeUndefined();
  });
});

describe('regulators', () => {
  // Power balance worked by hand: 1.7 V at 200 mA; 0.99 W/0.9/5 V; 0.5 W/0.85/3 V.
  it('burn and draw what their balance says', () => {
    expectNear(linearRegulator(5, 3.3, 0.2, 0)?.heatW, 0.34, 1e-9);
    expectNear(switchingRegulator(5, 3.3, 0.3, 0.9)?.inputA, 0.22, 1e-9);
    expectNear(switchingRegulator(3, 5, 0.1, 0.85)?.inputA, 0.1961, 2e-4);
    expectNear(junctionTemperature(298.15, 0.34, 100), 332.15, 1e-9);
  });
  it('keep the energy balance with a ground current', () => {
    const point = linearRegulator(5, 3.3, 0.2, 5e-3)!;
    expectNear(5 * point.inputA - 3.3 * 0.2, point.heatW, 1e-12);
    const step = switchingRegulator(5, 3.3, 0.3, 0.8)!;
    expectNear(5 * step.inputA - 3.3 * 0.3, step.heatW, 1e-12);
  });
  it('have no answer below the output or beyond full efficiency', () => {
    expect(linearRegulator(3, 3.3, 0.1, 0)).toBeUndefined();
    expect(switchingRegulator(5, 3.3, 0.1, 1.1)).toBeUndefined();
    expect(junctionTemperature(298, -1, 100)).toBeUndefined();
  });
});

describe('random samples', () => {
  // S. S. Wilks 1941: distribution-free tolerance bounds at 95 % confidence.
  it.each([
    [0.9, 29, 46],
    [0.95, 59, 93],
    [0.99, 299, 473],
    [0.9973, 1109, 1756],
  ])('that bound %d of all boards: %d for one side, %d for two', (coverage, one, two) => {
    expect(sampleSize(coverage, 0.95, 1)).toBe(one);
    expect(sampleSize(coverage, 0.95, 2)).toBe(two);
  });
  it('have no answer for certainty', () => {
    expect(sampleSize(1, 0.95, 1)).toBeUndefined();
  });
});
