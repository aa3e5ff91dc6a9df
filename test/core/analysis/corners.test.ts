/**
 * Corners found by the signs of derivatives against every corner there is, solved one by one.
 */
import { describe, expect, it } from 'vitest';
import { hasBand, typicalPoint } from '../../../core/analysis/pump-model';
import { solvePoint } from '../../../core/analysis/pump-point';
import { railVoltages } from '../../../core/analysis/rail-voltages';
import type { PumpPoint } from '../../../core/analysis/types';
import { catalogue } from '../../../core/catalog';
import { analyse } from '../../../core/index';
import { readBoard } from '../../../core/model/build';

/** Few bands, so that all their ends can be tried: supply, temperature, pins, clock, both capacitors, load. */
const board = (pump: string, load = '1..1.2..2 mA') => `
conditions: { ambient: -20..60 degC }
supplies: { lab: { voltage: 4.75..5.25 V } }
parts:
  chips: { plain: { pins: { high-resistance: 20..30..60 ohm, low-resistance: 25 ohm } } }
  diodes: { d: { kind: silicon, saturation: 2 nA, ideality: 1.8, resistance: 0.6 ohm } }
  capacitors:
    steady: { tolerance: +-10 %, esr: 20 mohm }
    soft: { tolerance: +-20 %, esr: 20 mohm, bias: [{ share: 50 %, left: 50..60..80 % }, { share: 100 %, left: 20..25..40 % }] }
chips: { mcu: { part: plain, rail: v5 } }
clocks: { tick: { pin: mcu.P1, frequency: 19..20..21 kHz, duty: 50 % } }
rails:
  v5: { supply: lab }
  out: { pump: { drive: tick, diode: d, ${pump} }, loads: { x: ${load} } }
`;

function everyCorner(text: string): readonly PumpPoint[] {
  const solved = railVoltages(readBoard(text, catalogue).board);
  const model = solved.models.get('out')![0]!.model;
  const moving = model.variables.flatMap((variable, k) => (hasBand(variable) ? [k] : []));
  expect(moving.length).toBeLessThanOrEqual(10);
  return Array.from({ length: 2 ** moving.length }, (_, bits) => {
    const at = typicalPoint(model);
    moving.forEach((k, n) => {
      const { min, max } = model.variables[k]!.band;
      at[k] = (bits >> n) & 1 ? max : min;
    });
    const point = solvePoint(model, at, undefined, 'figures');
    if ('reason' in point) throw new Error(point.reason);
    return point.point;
  });
}

describe('the band of a report', () => {
  const steady = 'flying: { value: 470 nF, kind: steady }, reservoir: { value: 4.7 uF, kind: steady }';
  it.each([
    ['doubler', `topology: doubler, input: v5, ${steady}`],
    ['inverter', `topology: inverter, ${steady}`],
    ['ladder', `topology: ladder, stages: 2, input: v5, ${steady}`],
    [
      'doubler with capacitors that lose value',
      'topology: doubler, input: v5, flying: { value: 1 uF, kind: soft, rated: 10 V }, reservoir: { value: 10 uF, kind: soft, rated: 16 V }',
    ],
  ])('of a %s is the extreme of all corners', (_, pump) => {
    const text = board(pump);
    const { report, board: analysis } = analyse(text, { file: 'rails.yaml' });
    const corners = everyCorner(text);
    const of = (value: (point: PumpPoint) => number) => {
      const all = corners.map(value);
      return { min: Math.min(...all), max: Math.max(...all) };
    };
    const { voltage, ripple } = report.rails['out']!;
    const volts = of((point) => point.voltage);
    expect(voltage!.min).toBeCloseTo(volts.min, 4);
    expect(voltage!.max).toBeCloseTo(volts.max, 4);
    const waves = of((point) => point.ripple);
    expect(Math.abs(ripple!.max / waves.max - 1)).toBeLessThan(0.005);
    expect(Math.abs(ripple!.min / waves.min - 1)).toBeLessThan(0.005);

    // The charge that a load takes comes from the sources a whole number of times: their bands are extremes too.
    const drawn = of((point) => [...point.railCurrents.values()].reduce((sum, amps) => sum + amps, 0));
    const supply = report.supplies['lab']!.current!;
    expect(Math.abs(supply.max / drawn.max - 1)).toBeLessThan(0.002);
    expect(Math.abs(supply.min / drawn.min - 1)).toBeLessThan(0.002);
    const pin = analysis.pins.get('mcu.P1')!.corner!;
    const rms = of((point) => point.drives[0]!.rms);
    expect(Math.abs(pin.rms / rms.max - 1)).toBeLessThan(0.02);
  });

  it('names the corner, the most influential quantity first', () => {
    const { board: analysis } = analyse(
      board('topology: doubler, input: v5, flying: 470 nF +-5 %, reservoir: 4.7 uF +-5 %'),
      { file: 'rails.yaml' },
    );
    const { lowest, highest } = analysis.rails.get('out')!.pump!.voltage;
    expect(lowest.settings[0]).toMatchObject({ label: 'rail v5', end: 'lowest' });
    expect(highest.settings[0]).toMatchObject({ label: 'rail v5', end: 'highest' });
    // Silicon diodes drop more in the cold, about 2 mV/K each (any handbook; from memory).
    expect(lowest.settings.find(({ label }) => label === 'ambient')?.end).toBe('lowest');
    expect(lowest.settings.find(({ label }) => label === 'load x')?.end).toBe('highest');
  });
});

describe('modes', () => {
  it('make the band of a rail and of what it draws, and their shares the average', () => {
    const text = `${board('topology: doubler, input: v5, flying: 1 uF +-0 %, reservoir: 10 uF +-0 %', '{ current: 2 mA, in: [on] }').replace('4.75..5.25 V', '5 V').replace('-20..60 degC', '25 degC')}modes: { off: { share: 90 % }, on: { share: 10 % } }\n`;
    const { report } = analyse(text, { file: 'rails.yaml' });
    const { modes, voltage, current } = report.rails['out']!;
    expect(modes['off']!.voltage).toBeGreaterThan(modes['on']!.voltage!);
    expect(voltage!.typical).toBe(modes['on']!.voltage);
    expect(voltage!.max).toBeGreaterThanOrEqual(modes['off']!.voltage!);
    expect(current).toBeCloseTo(0.1 * 2e-3, 8);
    // A doubler takes twice its load from the supply (charge balance).
    const supply = report.supplies['lab']!.current!;
    expect(Math.abs(supply.typical / (2 * 0.1 * 2e-3) - 1)).toBeLessThan(0.02);
    expect(Math.abs(supply.max / (2 * 2e-3) - 1)).toBeLessThan(0.02);
  });
});
