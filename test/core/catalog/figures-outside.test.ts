/** The catalogue's figures against what data sheets and standards print, worked back through the formulas. */
import { describe, expect, it } from 'vitest';
import { catalogue, findPart } from '../../../core/catalog';
import { genericBias } from '../../../core/catalog/capacitors/bias';
import { diodeForwardVoltage } from '../../../core/compute/diode-forward-voltage';
import { outputStageResistance } from '../../../core/compute/output-stage-resistance';
import { thermalVoltage } from '../../../core/compute/thermal-voltage';
import { expectNear } from '../../support/near';

describe('diodes at 25 degC', () => {
  const forward = (key: string, edge: 'typical' | 'high', amps: number) => {
    const diode = findPart(catalogue.diodes, key)!;
    return diodeForwardVoltage(
      {
        saturationA: edge === 'typical' ? diode.saturation.typical : diode.saturation.min,
        slopeV: diode.ideality.typical * thermalVoltage(298.15)!,
        seriesOhm: edge === 'typical' ? diode.resistance.typical : diode.resistance.max,
      },
      amps,
    )!;
  };
  // Columns: current, typical, limit. Schottky 200 mA class: data sheets of several makers. Silicon switching: limit at 1 mA
  // from design notes that quote a data sheet; all other rows are class values (from memory: confirm).
  it.each([
    ['schottky-signal', 0.1e-3, 0.22, 0.24],
    ['schottky-signal', 1e-3, 0.29, 0.32],
    ['schottky-signal', 10e-3, 0.35, 0.4],
    ['schottky-signal', 30e-3, 0.41, 0.5],
    ['schottky-signal', 100e-3, 0.52, 0.8],
    ['silicon-switching', 1e-3, 0.581, 0.715],
    ['silicon-switching', 10e-3, 0.69, 0.855],
    ['silicon-switching', 50e-3, 0.787, 1.0],
    ['silicon-switching', 150e-3, 0.895, 1.25],
    ['silicon-rectifier-1a', 1, 0.923, 1.1],
    ['schottky-1a-20v', 0.1, 0.27, 0.32],
    ['schottky-1a-20v', 1, 0.4, 0.45],
    ['schottky-1a-30v', 0.1, 0.285, 0.33],
    ['schottky-1a-30v', 1, 0.43, 0.55],
    ['schottky-1a-40v', 0.1, 0.3, 0.34],
    ['schottky-1a-40v', 1, 0.47, 0.6],
  ])('%s at %d A is near %d V typical and %d V at the limit', (key, amps, typical, limit) => {
    expect(Math.abs(forward(key, 'typical', amps) - typical)).toBeLessThan(0.015);
    expect(Math.abs(forward(key, 'high', amps) - limit)).toBeLessThan(0.036);
  });
});

describe('worst-case pin resistance', () => {
  // Test points of the data sheets, divided by hand: level drop over test current.
  it.each([
    ['atmega328p', undefined, 5, 45, 40],
    ['atmega328p', undefined, 3, 60, 70],
    ['attiny1614', undefined, 5, 66.7, 66.7],
    ['stm32f103', undefined, 3.3, 50, 50],
    ['rp2040', '12 mA', 3.3, 41.7, 56.7],
    ['rp2040', '4 mA', 3.3, 125, 170],
    ['nrf52840', 'high', 3.3, 66.7, 66.7],
    ['pic16f1939', undefined, 5, 75, 200],
    ['msp430g2553', undefined, 3, 100, 100],
  ])('%s, setting %s, at %d V: %d ohm low, %d ohm high', (key, strength, supply, low, high) => {
    const chip = findPart(catalogue.chips, key)!;
    const pin = strength === undefined ? chip.pins : chip.pins.strengths![strength]!;
    expectNear(outputStageResistance(pin.low!, 'low', supply)?.max, low, 2e-3);
    expectNear(outputStageResistance(pin.high!, 'high', supply)?.max, high, 2e-3);
  });
  // ESP32 data sheet v4.9: typical 28 mA at 0.1 VDD and 40 mA at 0.8 VDD.
  it('esp32 at its strongest setting is 11.8 ohm low and 16.5 ohm high, typical', () => {
    const pin = findPart(catalogue.chips, 'esp32')!.pins.strengths!['40 mA']!;
    expectNear(outputStageResistance(pin.low!, 'low', 3.3)?.typical, 0.33 / 28e-3, 1e-3);
    expectNear(outputStageResistance(pin.high!, 'high', 3.3)?.typical, 16.5, 1e-3);
  });
  // Logic families, limits at 85 degC: HC 0.33 V and 3.84 V at 4 mA, AHC 0.44 V and 3.80 V at 8 mA, both at 4.5 V.
  it.each([
    ['hc', 82.5, 165],
    ['hc-bus-driver', 55, 110],
    ['ahc', 55, 87.5],
    ['ac', 18.3, 30.8],
    ['lvc-single', 17.2, 21.9],
  ])('%s gate at 4.5 V: %d ohm low, %d ohm high', (key, low, high) => {
    const { output } = findPart(catalogue.gates, key)!;
    expectNear(outputStageResistance(output.low!, 'low', 4.5)?.max, low, 3e-3);
    expectNear(outputStageResistance(output.high!, 'high', 4.5)?.max, high, 3e-3);
  });
});

describe('timers', () => {
  // Data sheet rows at 5 V: bipolar high 3.3 V typical and 2.75 V least at 100 mA, low 0.25 V and 0.35 V at 5 mA.
  it('bipolar levels come out as printed', () => {
    const { highDrop, highResistance, lowVoltage, lowResistance } = findPart(
      catalogue.timers,
      'bipolar-astable',
    )!;
    expectNear(5 - highDrop!.typical - 0.1 * highResistance!.typical, 3.3, 1e-3);
    expectNear(5 - highDrop!.max - 0.1 * highResistance!.max, 2.75, 1e-3);
    expectNear(lowVoltage!.typical + 5e-3 * lowResistance!.typical, 0.25, 1e-3);
    expectNear(lowVoltage!.max + 5e-3 * lowResistance!.max, 0.35, 1e-3);
  });
});

describe('ports', () => {
  // USB 2.0, 7.2: unit load 100 mA, five after configuration, 10 uF beside it; USB 3: six of 150 mA.
  it('give the unit loads of their standards', () => {
    const current = (key: string) => findPart(catalogue.standards, key)!.current!.typical;
    expect(current('usb-2-unconfigured')).toBe(0.1);
    expect(current('usb-2-configured')).toBe(0.5);
    expectNear(current('usb-3'), 6 * 0.15, 1e-12);
    // 10 uF at 5 V are the 50 uC that USB 2.0, 7.2.4.1 lets a device take at once.
    const { bulk, voltage } = findPart(catalogue.standards, 'usb-2-configured')!;
    expectNear(bulk!.typical * voltage.typical, 50e-6, 1e-12);
  });
  // USB 2.0, 7.2.2: 4.75 V at the port less 125 mV in each wire leaves 4.5 V at the device at 500 mA.
  it('leave 4.5 V behind the worst cable', () => {
    const port = findPart(catalogue.standards, 'usb-2-configured')!;
    expectNear(port.voltage.min - 0.5 * port.resistance!.max, 4.5, 1e-9);
  });
});

describe('generic voltage dependence of ceramics', () => {
  // Worked by hand from 1/(1 + (V/Vh)^2) with half of the value lost at half the rating.
  it('leaves 0.8 at a quarter and 0.5 at a half of the rating', () => {
    const curve = genericBias({ weakest: 0.35, usual: 0.5, best: 0.9 });
    const left = (share: number) => curve.find((point) => point.share === share)?.left.typical;
    expectNear(left(0.25), 0.8, 1e-9);
    expectNear(left(0.5), 0.5, 1e-9);
  });
});
