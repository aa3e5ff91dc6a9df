import { describe, it } from 'vitest';
import { checkRule, checkSilent } from '../../support/check-rule';

/** A pump behind a driver on 5 V whose clock comes from a generator. */
const board = (high: string, stage: string, mark = '') => `
supplies: { lab: { voltage: 5 V } }
clocks: { gen: { external: { frequency: 50 kHz, duty: 50 %, high: ${high}, resistance: 50 ohm } } }
drivers:
  amp: { input: gen, rail: v5, ${stage} }
${mark}rails:
  v5: { supply: lab }
  up:
    pump: { topology: doubler, input: v5, drive: amp, diode: schottky-signal, flying: { value: 1 uF, kind: x7r }, reservoir: { value: 10 uF, kind: x7r } }
    loads: { lamp: 2 mA }
`;

describe('clock-level', () => {
  it('says when a p-channel MOSFET never turns off', () => {
    checkRule(
      'clock-level',
      board(
        '3.3 V',
        'mosfet-pair: { nmos: nmos-logic-level, pmos: pmos-logic-level }',
        '  #             ^^^ error clock-level: never turns off\n',
      ),
    );
  });

  it('says when gates do not switch for sure', () => {
    // JEDEC JESD7-A: an HC input on 4.5 V wants 3.15 V at most as its upper level (from memory).
    checkRule(
      'clock-level',
      board(
        '3 V',
        'gates: { part: hc-schmitt, parallel: 2 }',
        '  #             ^^^ error clock-level: switch for sure only above\n',
      ),
    );
  });

  it('is silent for a clock that reaches the rail', () => {
    checkSilent(
      'clock-level',
      board('5 V', 'mosfet-pair: { nmos: nmos-logic-level, pmos: pmos-logic-level }'),
    );
    checkSilent('clock-level', board('5 V', 'gates: { part: hc-schmitt, parallel: 2 }'));
  });
});
