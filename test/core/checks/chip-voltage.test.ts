import { describe, it } from 'vitest';
import { checkRule, checkSilent } from '../../support/check-rule';
import { markUnder } from '../../support/mark-under';

const board = (volts: string, mark = '') => `
supplies: { lab: { voltage: ${volts} } }
chips:
  mcu: { part: stm32f103, rail: v3, draws: 30 mA }
${mark}rails: { v3: { supply: lab } }
`;

describe('chip-voltage', () => {
  it('fires with figures', () => {
    // Data sheet of the STM32F103: 2.0 to 3.6 V.
    checkRule(
      'chip-voltage',
      board('5 V', '  #                             ^^ error chip-voltage: works from 2 V to 3.6 V\n'),
    );
    checkRule(
      'chip-voltage',
      board(
        '3.2..3.7 V',
        '  #                             ^^ warning chip-voltage: gets 3.7 V from v3 at a corner\n',
      ),
    );
  });

  it('is silent within the range', () => {
    checkSilent('chip-voltage', board('3.0..3.6 V'));
  });

  const parts = (volts: string, gates: string, clock: string) => `
supplies: { lab: { voltage: ${volts} } }
chips: { mcu: { part: plain, rail: v5, draws: 5 mA } }
parts: { chips: { plain: { pins: { high-resistance: 25 ohm, low-resistance: 25 ohm } } } }
clocks:
  tick: { pin: mcu.PB1, frequency: 100 kHz, duty: 50 % }
  own: { ${clock}, rail: v5 }
drivers:
  amp: { gates: { part: ${gates} }, input: tick, rail: v5 }
rails:
  v5: { supply: lab }
  up:
    pump: { topology: doubler, input: v5, drive: amp, diode: schottky-signal, flying: { value: 1 uF, kind: film }, reservoir: { value: 1 uF, kind: film } }
    loads: { lamp: 1 mA }
`;
  const timer = 'astable: { charge: 10 kohm, discharge: 33 kohm, timing: 1 nF, part: bipolar-astable }';
  const schmitt = 'schmitt: { resistor: 10 kohm, capacitor: 1 nF, part: hc-schmitt }';

  it('fires for gates of a driver and for the timer or gate of a clock', () => {
    // LVC works up to 3.6 V (JEDEC class, from memory: confirm), a bipolar timer from 4.5 V (data sheets of two makers),
    // HC up to 6 V (JESD7-A class, from memory: confirm).
    checkRule(
      'chip-voltage',
      markUnder(
        parts('5 V', 'lvc', timer),
        'amp:',
        'v5',
        'error chip-voltage: The gates of amp get 5 V from v5 and work from 1.65 V to 3.6 V',
      ),
    );
    checkRule(
      'chip-voltage',
      markUnder(
        parts('3.3 V', 'lvc', timer),
        'own:',
        'v5',
        'error chip-voltage: The timer of own gets 3.3 V from v5 and works from 4.5 V to 16 V',
      ),
    );
    const corner = markUnder(
      parts('5.2..5.7..6.2 V', 'hc', schmitt),
      'amp:',
      'v5',
      'warning chip-voltage: The gates of amp get 6.2 V from v5 at a corner',
    );
    checkRule(
      'chip-voltage',
      markUnder(corner, 'own:', 'v5', 'warning chip-voltage: The gate of own gets 6.2 V'),
    );
  });

  it('is silent for gates and timers within their range', () => {
    checkSilent('chip-voltage', parts('5 V', 'ac', timer));
    checkSilent('chip-voltage', parts('5 V', 'hc', schmitt));
  });
});
