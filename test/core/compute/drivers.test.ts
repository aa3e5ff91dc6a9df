import { describe, expect, it } from 'vitest';
import {
  crossingCharge,
  drivenResistance,
  gateCurrent,
  gatePulseRms,
  gateRamp,
  transconductance,
  unequalCrossingCharge,
} from '../../../core/compute/gate-drive';
import {
  saturatingCurrent,
  saturatingDrop,
  saturatingOnResistance,
} from '../../../core/compute/saturating-output';
import { thermalVoltage } from '../../../core/compute/thermal-voltage';
import { saturationVoltage } from '../../../core/compute/transistor-saturation';
import { expectNear } from '../../support/near';

describe('saturating CMOS output', () => {
  const output = { saturationA: 80e-3, saturationV: 2.5 };
  // Shichman and Hodges 1968, worked by hand.
  it('carries 28.8 mA at 0.5 V and drops 0.3349 V at 20 mA', () => {
    expectNear(saturatingCurrent(output, 0.5), 28.8e-3, 1e-9);
    expectNear(saturatingDrop(output, 20e-3), 0.3349, 2e-4);
    expectNear(saturatingOnResistance(output), 15.63, 5e-4);
  });
  it('carries no more beyond saturation, where the drop is unknown', () => {
    expect(saturatingCurrent(output, 4)).toBe(80e-3);
    expect(saturatingDrop(output, 80e-3)).toBeUndefined();
    expect(saturatingCurrent(output, -1)).toBeUndefined();
  });
});

describe('saturated transistor', () => {
  const is = 1e-14;
  const vt = thermalVoltage(298.15)!;
  const transistor = { gain: 200, reverseGain: 5, thermalV: vt, collectorOhm: 0 };
  // Ebers and Moll 1954, both currents solved together for the two junction voltages.
  it('keeps 31.20 mV at 10 mA and 69.46 mV at 50 mA with 1 mA of base current', () => {
    expectNear(saturationVoltage(transistor, 10e-3, 1e-3), 31.2e-3, 5e-4);
    expectNear(saturationVoltage(transistor, 50e-3, 1e-3), 69.46e-3, 5e-4);
  });
  // The equations themselves: junction exponentials from the currents, put back.
  it('satisfies the transport equations at a point between', () => {
    const [ic, ib] = [23e-3, 0.7e-3];
    // ic = Is (E - C) - (Is/bR)(C - 1), ib = (Is/bF)(E - 1) + (Is/bR)(C - 1), linear in E and C.
    const [a, b, c, d] = [is, -is - is / 5, is / 200, is / 5];
    const [p, q] = [ic - is / 5, ib + is / 200 + is / 5];
    const determinant = a * d - b * c;
    const e = (p * d - b * q) / determinant;
    const col = (a * q - c * p) / determinant;
    expectNear(saturationVoltage(transistor, ic, ib), vt * Math.log(e / col), 1e-6);
  });
  it('has no answer when it does not saturate', () => {
    expect(saturationVoltage(transistor, 0.25, 1e-3)).toBeUndefined();
  });
});

describe('MOSFET pair', () => {
  it('takes charge times frequency at its gates', () => {
    // Definition of charge: 5 nC at 100 kHz, 5 V: 0.5 mA and 2.5 mW.
    expectNear(gateCurrent(5e-9, 100e3), 0.5e-3, 1e-12);
    expectNear(gateCurrent(5e-9, 100e3)! * 5, 2.5e-3, 1e-12);
  });
  // Veendrick 1984: (beta/12)(VDD - 2 Vt)^3 tau f is 0.9 mW for 20 mA/V^2, 5 V, 1 V, 20 ns, 1 MHz.
  it('burns the published short-circuit power', () => {
    const pair = { beta: 20e-3, thresholdV: 1, supplyV: 5, rampS: 20e-9 };
    expectNear(crossingCharge(pair), 90e-12, 1e-9);
    expectNear(2 * crossingCharge(pair)! * 5 * 1e6, 0.9e-3, 1e-9);
  });
  // Plain quadrature of the saturated current of whichever transistor conducts less, over one linear ramp.
  it('agrees with the integral of its current', () => {
    const [beta, vt, vdd, tau] = [8e-3, 0.8, 3.3, 50e-9];
    const steps = 20000;
    let charge = 0;
    for (let i = 0; i < steps; i++) {
      const gate = ((i + 0.5) / steps) * vdd;
      const over = Math.max(0, Math.min(gate, vdd - gate) - vt);
      charge += (beta / 2) * over ** 2 * (tau / steps);
    }
    expectNear(crossingCharge({ beta, thresholdV: vt, supplyV: vdd, rampS: tau }), charge, 1e-5);
  });
  it('does not conduct below both thresholds together', () => {
    expect(crossingCharge({ beta: 1e-3, thresholdV: 1, supplyV: 1.8, rampS: 1e-8 })).toBe(0);
    expect(crossingCharge({ beta: 1e-3, thresholdV: 1, supplyV: 0, rampS: 1e-8 })).toBeUndefined();
  });
  // The same quadrature with transistors that differ.
  it('agrees with the integral for unequal transistors', () => {
    const [betaN, betaP, tn, tp, vdd, tau] = [9, 3.3, 0.75, 0.9, 5, 260e-9];
    const steps = 20000;
    let charge = 0;
    for (let i = 0; i < steps; i++) {
      const gate = ((i + 0.5) / steps) * vdd;
      const n = (betaN / 2) * Math.max(0, gate - tn) ** 2;
      const p = (betaP / 2) * Math.max(0, vdd - gate - tp) ** 2;
      charge += Math.min(n, p) * (tau / steps);
    }
    const pair = { betaN, betaP, thresholdN: tn, thresholdP: tp, supplyV: vdd, rampS: tau };
    expectNear(unequalCrossingCharge(pair), charge, 1e-5);
  });
  // Exponential of a capacitor behind a resistor, stepped: 10 to 90 % of it as long as those of the ramp.
  it('slows its edges as a capacitor behind a resistor does', () => {
    const [ohms, charge, swing] = [50, 5e-9, 5];
    const step = 1e-12;
    const reach = (share: number) => {
      let time = 0;
      for (let volts = 0; volts < share * swing; time += step)
        volts += (step * (swing - volts)) / (ohms * (charge / swing));
      return time;
    };
    expectNear(gateRamp(ohms, charge, swing)! * 0.8, reach(0.9) - reach(0.1), 1e-3);
    expect(gateRamp(50, 5e-9, 0)).toBeUndefined();
  });
  it('has pulses whose heat is half of what the source gives', () => {
    // Energy of a charged capacitor: Q V out of the source, half of it lost in the resistance, each way.
    const rms = gatePulseRms(100e3, 5e-9, 5, 50, 50)!;
    expectNear(rms * rms * 50, 100e3 * 5e-9 * 5, 1e-12);
    expectNear(rms, 7.071e-3, 1e-4);
  });
  it('has more resistance with less gate voltage', () => {
    // Shichman and Hodges 1968 (from memory: confirm), worked by hand: 2 x 3.3 / 1.6.
    expectNear(drivenResistance(2, 5, 1.7, 3.3), 4.125, 1e-9);
    expect(drivenResistance(2, 5, 1.7, 12)).toBe(2);
    expect(drivenResistance(2, 5, 1.7, 1.7)).toBeUndefined();
    expectNear(transconductance(2, 5, 1.7), 0.1515, 1e-3);
  });
});
