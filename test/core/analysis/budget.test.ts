/**
 * The board as one: what flows into each rail is what flows out of it, and every rail that gives way does.
 */
import { describe, expect, it } from 'vitest';
import { analyse } from '../../../core/index';
import { expectNear } from '../../support/near';

const board = `
supplies: { pack: { voltage: 6.0..7.4..8.4 V, resistance: 2 ohm, current: 1 A } }
parts:
  chips: { plain: { pins: { high-resistance: 30 ohm, low-resistance: 30 ohm } } }
chips:
  mcu: { part: plain, rail: v5, draws: { work: 20 mA, rest: 1 mA }, pins: { P9: { sources: 3 mA } } }
clocks:
  a: { pin: mcu.P1, frequency: 100 kHz, duty: 50 % }
  b: { pin: mcu.P2, frequency: 100 kHz, duty: 50 % }
rails:
  vbat: { supply: pack, loads: { motor: { current: 100 mA, in: [work] }, lamp: { power: 0.5 W } } }
  v5: { regulator: { from: vbat, output: 5 V, ground: 2 mA, dropout: 0.2 V }, loads: { sensor: 1 kohm } }
  v3: { regulator: { from: vbat, output: 3.3 V, kind: switching, efficiency: 85 % }, loads: { radio: { current: 60 mA, in: [work] } } }
  quiet: { filter: { from: v5, resistor: 22 ohm, capacitor: 10 uF }, loads: { adc: 2 mA } }
  up:
    pump: { topology: doubler, input: v5, drive: a, diode: schottky-signal, flying: 1 uF, reservoir: 10 uF }
    loads: { amplifier: 4 mA }
    bleeder: 10 kohm
  smooth: { filter: { from: up, resistor: 100 ohm, capacitor: 4.7 uF }, loads: { reference: 1.5 mA } }
  twice:
    pump: { topology: doubler, input: up, drive: b, diode: schottky-signal, flying: 1 uF, reservoir: 10 uF }
    loads: { bias: 0.3 mA }
modes: { rest: { share: 80 % }, work: { share: 20 % } }
`;

/** The consistency that the project asks of a whole board. */
const consistent = 1e-3;

describe('a board with rails on rails', () => {
  const { report, board: analysis } = analyse(board, { file: 'rails.yaml' });
  const at = (rail: string, mode: string) => report.rails[rail]!.modes[mode]!;

  it.each(['rest', 'work'])('in mode %s the sum into each rail is the sum out of it', (mode) => {
    const up = analysis.rails.get('up')!.pump!.points.find((point) => point.mode === mode)!;
    const twice = analysis.rails.get('twice')!.pump!.points.find((point) => point.mode === mode)!;

    // Behind the filters flow their loads.
    expectNear(at('quiet', mode).current!, 2e-3, consistent);
    expectNear(at('smooth', mode).current!, 1.5e-3, consistent);
    expectNear(at('quiet', mode).voltage!, at('v5', mode).voltage! - 22 * 2e-3, consistent);
    expectNear(at('smooth', mode).voltage!, at('up', mode).voltage! - 100 * 1.5e-3, consistent);

    // The first pump feeds its load, its bleeder, the filter and the second pump.
    const bleeder = up.voltage / 10e3;
    expectNear(up.loadCurrent, 4e-3 + bleeder + 1.5e-3 + twice.inputCurrent, consistent);

    // The 5 V rail: chip with its pins, sensor, filter, and the diode chain of the pump that stands on it. The pin of
    // the second pump swings to 5 V too.
    const chip = (mode === 'work' ? 20e-3 : 1e-3) + 3e-3;
    const pins = up.drives[0]!.sourceAverage + twice.drives[0]!.sourceAverage;
    const five = chip + pins + at('v5', mode).voltage! / 1000 + 2e-3 + up.inputCurrent;
    expectNear(at('v5', mode).current!, five, consistent);

    // The battery rail: lamp of constant power, motor, the linear regulator with its ground current, the switching one.
    const volts = at('vbat', mode).voltage!;
    const radio = mode === 'work' ? 60e-3 : 0;
    const battery = 0.5 / volts + (mode === 'work' ? 0.1 : 0) + five + 2e-3 + (3.3 * radio) / (0.85 * volts);
    expectNear(at('vbat', mode).current!, battery, consistent);
    expectNear(volts, 7.4 - 2 * battery, consistent);
  });

  it('averages are weighted by the share of their mode', () => {
    const mean = (rail: string) => 0.8 * at(rail, 'rest').current! + 0.2 * at(rail, 'work').current!;
    for (const rail of ['vbat', 'v5', 'v3', 'up', 'twice'])
      expectNear(report.rails[rail]!.current!, mean(rail), 1e-9);
    expectNear(report.supplies['pack']!.current!.typical, mean('vbat'), 1e-9);
  });

  it('a weaker supply lowers the pump that stands on it', () => {
    const weak = analyse(
      board.replace('5 V, ground: 2 mA, dropout: 0.2 V', '8 V, ground: 2 mA, dropout: 0.2 V'),
      {
        file: 'rails.yaml',
      },
    ).report;
    // The regulator cannot reach 8 V from 7.4 V: it follows its input less the dropout, in each mode.
    for (const mode of ['rest', 'work']) {
      const { voltage } = weak.rails['v5']!.modes[mode]!;
      expectNear(voltage!, weak.rails['vbat']!.modes[mode]!.voltage! - 0.2, consistent);
    }
    expect(weak.rails['v5']!.modes['work']!.voltage).toBeLessThan(
      weak.rails['v5']!.modes['rest']!.voltage! - 0.1,
    );
  });

  it('rails on one supply pull it down together', () => {
    const rails = analyse(
      'supplies: { lab: { voltage: 5 V, resistance: 2 ohm } }\nrails:\n  a: { supply: lab, loads: { x: 100 mA } }\n  b: { supply: lab, loads: { y: 200 mA } }\n',
      { file: 'rails.yaml' },
    ).report.rails;
    // Ohm's law: 5 V - 2 ohm x 300 mA.
    expectNear(rails['a']!.voltage!.typical, 4.4, consistent);
    expectNear(rails['b']!.voltage!.typical, 4.4, consistent);
  });

  it('reads a circle of rails without an answer and without an end', () => {
    const { findings } = analyse(
      'supplies: { lab: { voltage: 5 V } }\nrails:\n  a: { regulator: { from: b, output: 3 V, dropout: 1 V } }\n  b: { filter: { from: a, resistor: 1 ohm, capacitor: 1 uF } }\n',
      { file: 'rails.yaml' },
    );
    expect(findings.map(({ code }) => code)).toContain('rail-cycle');
  });

  it('energy in is energy out and heat, for every pump', () => {
    expect(report.balance).toBeLessThan(1e-3);
  });
});

describe('a filter behind a pump', () => {
  it('leaves of its ripple what a first-order low pass leaves', () => {
    const filtered = (farads: string) =>
      analyse(
        board.replace(
          'resistor: 100 ohm, capacitor: 4.7 uF',
          `resistor: 100 ohm, capacitor: { value: ${farads}, kind: film, esr: 0 ohm }`,
        ),
        { file: 'rails.yaml' },
      ).report.rails;
    const rails = filtered('4.7 uF');
    const wave = rails['up']!.ripple!.typical;
    const left = rails['smooth']!.ripple!.typical;
    // A triangle of the same height leaves T / (8 R C) of it (integral of a triangle); the pump's wave is between a
    // triangle and a saw, whose ripple is up to a third larger.
    const triangle = 1e-5 / (8 * 100 * 4.7e-6);
    expect(left / wave).toBeGreaterThan(0.5 * triangle);
    expect(left / wave).toBeLessThan(1.4 * triangle);
    // Far above the corner frequency, half the capacitance leaves twice the ripple.
    expectNear(filtered('2.35 uF')['smooth']!.ripple!.typical / left, 2, 0.02);
    expect(rails['smooth']!.ripple!.max).toBeGreaterThan(left);
    expect(rails['smooth']!.drops).toEqual([{ in: 'filter resistor', volts: expect.closeTo(0.15, 3) }]);
  });
});
