import { describe, expect, it } from 'vitest';
import { esrFromLoss } from '../../../core/compute/esr-from-loss';
import { firstEdgeCharge, inrushPeak, inrushResistor } from '../../../core/compute/inrush';
import { selfCapacitance, startTime } from '../../../core/compute/start-time';
import { bleeder, dischargeTime, storedEnergy } from '../../../core/compute/stored-energy';
import { expectNear } from '../../support/near';

describe('loss factor', () => {
  // Definition (IEC 60384-1): tan delta = 2 pi f C R; 0.16 at 120 Hz and 100 uF.
  it('gives 2.122 ohm', () => {
    expectNear(esrFromLoss(0.16, 100e-6), 2.122, 2e-4);
    expect(esrFromLoss(0.16, 0)).toBeUndefined();
  });
});

describe('stored charge', () => {
  // Definition of energy and the exponential law, worked by hand; 60 V d.c. is the ES1 limit of IEC 62368-1.
  it('of 100 uF at 100 V takes a bleeder of 39.15 kohm to reach 60 V in 2 s', () => {
    expectNear(storedEnergy(100e-6, 100), 0.5, 1e-12);
    expectNear(storedEnergy(100e-6, -60), 0.18, 1e-12);
    const found = bleeder(100e-6, 100, 60, 2)!;
    expectNear(found.resistanceOhm, 39.15e3, 2e-4);
    expectNear(found.powerW, 0.2554, 2e-4);
    expectNear(dischargeTime(found.resistanceOhm, 100e-6, 100, 60), 2, 1e-12);
  });
  it('leaves through 10 kohm from 12 V to 1 V in 2.485 s, and the same below ground', () => {
    expectNear(dischargeTime(10e3, 100e-6, 12, 1), 2.485, 2e-4);
    expectNear(dischargeTime(10e3, 100e-6, -12, -1), 2.485, 2e-4);
    expect(dischargeTime(10e3, 100e-6, 1, 12)).toBe(0);
  });
  it('has no answer across zero', () => {
    expect(dischargeTime(10e3, 100e-6, 12, 0)).toBeUndefined();
    expect(bleeder(100e-6, 12, -1, 1)).toBeUndefined();
    expect(bleeder(100e-6, 1, 12, 1)).toBeUndefined();
  });
});

describe('first edge', () => {
  // Ohm's law, worked by hand: 4.3 V over 41.2 ohm.
  it('draws 104.4 mA, and 173.8 ohm more bring it to 20 mA', () => {
    expectNear(inrushPeak(5, 0.7, 41.2), 104.4e-3, 5e-4);
    expectNear(inrushResistor(5, 0.7, 41.2, 20e-3), 173.8, 1e-4);
    expect(inrushResistor(5, 0.7, 300, 20e-3)).toBe(0);
    expect(inrushPeak(0.5, 0.7, 41.2)).toBe(0);
    expect(inrushPeak(5, 0.7, 0)).toBeUndefined();
  });
  // A public tutorial on the first edge of a doubler (1 uF, 10 uF, 16 V clock and supply) prints 14.54 uC.
  it('moves 14.55 uC', () => {
    expectNear(firstEdgeCharge(16, 1e-6, 10e-6), 14.54e-6, 1e-3);
    expect(firstEdgeCharge(16, 0, 10e-6)).toBeUndefined();
  });
});

describe('start', () => {
  // Tanzawa and Tanaka 1997; simulation with ideal diodes, 4 stages, 1 uF, 10 uF, 10 kHz: 105.3 cycles to 90 %.
  it('of four stages takes 104 periods, simulated 105', () => {
    const own = selfCapacitance(4, 1e-6)!;
    expectNear(own, 1.3e-6, 1e-12);
    expectNear(startTime(400, Number.POSITIVE_INFINITY, 10e-6 + own, 0.9), 10.41e-3, 1e-3);
    expectNear(startTime(400, Number.POSITIVE_INFINITY, 10e-6 + own, 0.9)! * 1e4, 105.3, 0.03);
  });
  it('is quicker beside a load, since less is reached', () => {
    expectNear(startTime(400, 400, 10e-6, 0.9), startTime(200, Number.POSITIVE_INFINITY, 10e-6, 0.9)!, 1e-12);
    expect(startTime(400, 400, 10e-6, 1)).toBeUndefined();
    expect(selfCapacitance(0, 1e-6)).toBeUndefined();
  });
});
