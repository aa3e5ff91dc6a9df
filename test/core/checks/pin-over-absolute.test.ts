import { describe, it } from 'vitest';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

const pump =
  'pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: { value: 10 uF, kind: x7r }, reservoir: { value: 10 uF, kind: x7r } }';

const chip = `
supplies:
  lab: { voltage: 5 V, current: 1 A }
parts:
  chips:
    plain:
      pins: { high-resistance: 20 ohm, low-resistance: 20 ohm, absolute: 40 mA }
`;

describe('pin-over-absolute', () => {
  it('points at the clock of a pin that the file does not list', () => {
    // Charge balance: the pin gives and takes the load's charge once in every period, so its average each way is the
    // load; with square pulses of half the period the rms of both together is twice that: 2 x 25 mA.
    checkRule(
      'pin-over-absolute',
      `${chip}
chips:
  mcu: { part: plain, rail: v5, draws: 1 mA }
clocks:
  tick: { pin: mcu.P1, frequency: 100 kHz, duty: 50 % }
  #            ^^^^^^ error pin-over-absolute: above its absolute maximum of 40 mA. A lighter load, at least 2 pins
rails:
  v5: { supply: lab }
  up:
    ${pump}
    loads: { lamp: 25 mA }
`,
    );
  });

  it('points at the pin where it is listed, and counts its own load', () => {
    checkRule(
      'pin-over-absolute',
      `${chip}
chips:
  mcu:
    part: plain
    rail: v5
    draws: 1 mA
    pins:
      P7: { sources: 45 mA }
#     ^^ error pin-over-absolute: mcu.P7 carries 45 mA rms (average 45 mA out
rails:
  v5: { supply: lab }
`,
    );
  });

  it('is silent below', () => {
    checkSilent('pin-over-absolute', `${bench}  up:\n    ${pump}\n    loads: { lamp: 12 mA }\n`);
  });
});
