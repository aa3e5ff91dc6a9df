import { describe, expect, it } from 'vitest';
import { diodeCurrent, omega } from '../../../core/compute/diode-current';
import { diodeForwardVoltage } from '../../../core/compute/diode-forward-voltage';
import { saturationAtTemperature, temperatureLaws } from '../../../core/compute/diode-saturation-temperature';
import { effectiveDiodeDrop } from '../../../core/compute/effective-diode-drop';
import { thermalVoltage } from '../../../core/compute/thermal-voltage';
import { expectNear } from '../../support/near';

const roomVt = thermalVoltage(298.15)!;
const switching = { saturationA: 2.5e-9, slopeV: 1.75 * roomVt, seriesOhm: 0.6 };

describe('thermal voltage', () => {
  // NIST CODATA 2018, exact constants of the SI: k T/q at 298.15 K and 300.15 K.
  it('is 25.69 mV at 25 degC and 25.86 mV at 27 degC', () => {
    expectNear(roomVt, 25.6926e-3, 1e-5);
    expectNear(thermalVoltage(300.15), 25.8649e-3, 1e-5);
  });
  it('has no answer at or below absolute zero', () => {
    expect(thermalVoltage(0)).toBeUndefined();
    expect(thermalVoltage(Number.NaN)).toBeUndefined();
  });
});

describe('forward voltage', () => {
  // Class values of a silicon switching diode, 25 degC.
  it('follows the class curve over three decades', () => {
    expectNear(diodeForwardVoltage(switching, 0.1e-3), 0.4765, 2e-4);
    expectNear(diodeForwardVoltage(switching, 1e-3), 0.5806, 2e-4);
    expectNear(diodeForwardVoltage(switching, 10e-3), 0.6895, 2e-4);
    expectNear(diodeForwardVoltage(switching, 100e-3), 0.847, 2e-4);
  });
  it('has no answer beyond the reverse saturation current', () => {
    expect(diodeForwardVoltage(switching, -3e-9)).toBeUndefined();
    expect(diodeForwardVoltage({ ...switching, saturationA: 0 }, 1e-3)).toBeUndefined();
  });
});

describe('current with series resistance', () => {
  // Banwell and Jayakumar 2000, closed form by the Lambert function: 5 V over 1000.6 ohm in all.
  it('matches the published closed form', () => {
    expectNear(diodeCurrent(switching, 5, 1000), 4.351e-3, 1e-4);
  });
  // The equation itself is the outside check: current put back into voltage must return what was applied.
  it.each([-5, -0.1, 0.01, 0.3, 0.7, 5, 100, 1e5])('returns the applied %d V when put back', (volts) => {
    const amps = diodeCurrent(switching, volts, 0.4)!;
    const back =
      switching.slopeV * Math.log1p(amps / switching.saturationA) + amps * (switching.seriesOhm + 0.4);
    if (volts > 0) expectNear(back, volts, 1e-7);
    else expect(amps).toBeLessThan(0);
  });
  it('survives 1e5 V across 1 ohm and refuses what overflows without resistance', () => {
    expectNear(diodeCurrent({ ...switching, seriesOhm: 0 }, 1e5, 1), 1e5, 1e-3);
    expect(diodeCurrent({ ...switching, seriesOhm: 0 }, 1e3, 0)).toBeUndefined();
  });
  // Known values of the omega function: omega(1) = 1, omega(0) is the omega constant 0.567143290409784
  // (Corless and others, "On the Lambert W function", 1996; from memory: confirm).
  it('uses an omega function with its known values', () => {
    expectNear(omega(1), 1, 1e-15);
    expectNear(omega(0), 0.567143290409784, 1e-14);
    expectNear(omega(1 + Math.E), Math.E, 1e-14);
    expect(omega(-800)).toBe(0);
  });
});

describe('saturation current over temperature', () => {
  const slope = (saturation: number, ideality: number, law: keyof typeof temperatureLaws) => {
    const hot = saturationAtTemperature(saturation, ideality, temperatureLaws[law], 298.15, 358.15)!;
    const volts = (is: number, kelvin: number) =>
      diodeForwardVoltage(
        { saturationA: is, slopeV: ideality * thermalVoltage(kelvin)!, seriesOhm: 0 },
        1e-3,
      )!;
    return (volts(hot, 358.15) - volts(saturation, 298.15)) / 60;
  };
  // Trade figure: silicon loses about 2 mV/K, Schottky diodes 1 to 2 mV/K at 1 mA (common practice).
  it('makes silicon lose 2.06 mV/K and a Schottky diode 1.58 mV/K', () => {
    expectNear(slope(2.5e-9, 1.75, 'silicon'), -2.06e-3, 0.005);
    expectNear(slope(0.11e-6, 1.17, 'schottky'), -1.58e-3, 0.005);
  });
  it('changes nothing at the reference and refuses a temperature of zero', () => {
    expectNear(saturationAtTemperature(1e-9, 1.5, temperatureLaws.silicon, 298.15, 298.15), 1e-9, 1e-12);
    expect(saturationAtTemperature(1e-9, 1.5, temperatureLaws.silicon, 298.15, 0)).toBeUndefined();
  });
});

describe('drop of a diode without resistance', () => {
  const transfer = {
    saturationA: 2.5e-9,
    slopeV: 1.75 * 25.69e-3,
    capacitanceF: 1e-6,
    conductionS: 50e-6,
    chargeC: 1e-6,
  };
  // Worked by hand from the exponential decay of the current.
  it('is 0.5751 V at an effective current of 0.8991 mA', () => {
    const drop = effectiveDiodeDrop(transfer)!;
    expectNear(drop.currentA, 0.8991e-3, 1e-4);
    expectNear(drop.dropV, 0.5751, 1e-4);
  });
  it('is the plain forward voltage for small charge and stops growing for large charge', () => {
    const small = effectiveDiodeDrop({ ...transfer, chargeC: 1e-12 })!;
    expectNear(small.currentA, 1e-12 / 50e-6, 1e-4);
    const large = effectiveDiodeDrop({ ...transfer, chargeC: 1 })!;
    expectNear(effectiveDiodeDrop({ ...transfer, chargeC: 2 })!.dropV, large.dropV, 1e-12);
  });
  // Transient integration of a doubler with a stiff solver for exponential diodes: 5 V, 10 kHz, 1 uF and 10 uF, Is 2.52 nA, n 1.752, 27 degC.
  it.each([
    [1e-6, 9.395],
    [10e-6, 9.186],
    [100e-6, 8.977],
    [1e-3, 8.75],
    [10e-3, 7.819],
  ])('explains a transient doubler at %d A', (amps, volts) => {
    const slopeV = 1.752 * thermalVoltage(300.15)!;
    const drop = (capacitanceF: number) =>
      effectiveDiodeDrop({
        saturationA: 2.52e-9,
        slopeV,
        capacitanceF,
        conductionS: 50e-6,
        chargeC: amps / 1e4,
      })!.dropV;
    const output = 10 - drop(1e-6) - drop(10e-6 / 11) - amps / (1e4 * 1e-6);
    expectNear(output, volts, 0.004);
  });
  it('has no answer without time to conduct', () => {
    expect(effectiveDiodeDrop({ ...transfer, conductionS: 0 })).toBeUndefined();
  });
});
