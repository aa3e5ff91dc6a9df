import { describe, expect, it } from 'vitest';
import { attachedTo } from '../../../core/analysis/attached';
import { analyse } from '../../../core/index';
import { checkRule, checkSilent } from '../../support/check-rule';

const board = (supply: string, rails: string) => `
supplies:
  ${supply}
parts: { chips: { plain: { pins: { high-resistance: 20 ohm, low-resistance: 20 ohm } } } }
chips: { mcu: { part: plain, rail: v5 } }
clocks: { tick: { pin: mcu.P1, frequency: 100 kHz, duty: 50 % } }
rails:
  v5: { supply: port }
${rails}`;

const up = (reservoir: string, flying = '1 uF') =>
  `  up: { pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: ${flying}, reservoir: ${reservoir} }, loads: { x: 2 mA } }\n`;

describe('inrush-supply', () => {
  it('counts what the diode chain of a pump connects at once', () => {
    // USB 2.0, section 7.2.4.1: at most 10 uF, 50 uC at 5 V, may stand on the port.
    checkRule(
      'inrush-supply',
      board(
        `port: { standard: usb-2-configured }
#                   ^^^^^^^^^^^^^^^^ warning inrush-supply: 23 µF (115 µC at 5 V) stand on port`,
        up('22 uF'),
      ),
    );
    checkRule(
      'inrush-supply',
      board(
        `port: { voltage: 5 V, bulk: 4.7 uF }
#                             ^^^^^^ warning inrush-supply: It allows 4.7 µF`,
        up('4.7 uF'),
      ),
    );
  });

  it('the way up may take more than the supply gives', () => {
    // Ohm's law: a stage behind 20 ohm pins charges its reservoir through about 80 ohm, with twice that current drawn.
    checkRule(
      'inrush-supply',
      board(
        `port: { voltage: 5 V, current: 20 mA }
#                                ^^^^^ warning inrush-supply: While its rails come up together`,
        up('100 uF', '10 uF'),
      ),
    );
  });

  it('is silent within the limits, behind a regulator and without a limit', () => {
    checkSilent('inrush-supply', board('port: { standard: usb-2-configured }', up('8.2 uF')));
    checkSilent('inrush-supply', board('port: { voltage: 5 V, current: 300 mA }', up('100 uF', '10 uF')));
    checkSilent(
      'inrush-supply',
      board(
        'port: { standard: usb-2-configured }',
        `  v4: { regulator: { from: v5, output: 4 V } }\n${up('100 uF').replace('input: v5', 'input: v4')}`,
      ),
    );
  });

  it('a filter counts unless its resistor keeps the surge below the limit of the supply', () => {
    const attached = (resistor: string) => {
      const { board: analysis } = analyse(
        board(
          'port: { standard: usb-2-configured }',
          `  quiet: { filter: { from: v5, resistor: ${resistor}, capacitor: 47 uF }, loads: { x: 1 mA } }\n`,
        ),
        { file: 'rails.yaml' },
      );
      return attachedTo(analysis.reading.board, analysis.supplies.get('port')!).map(({ key }) => key);
    };
    // 5.25 V over 500 mA is 10.5 ohm.
    expect(attached('10 ohm')).toEqual(['quiet']);
    expect(attached('11 ohm')).toEqual([]);
  });
});
