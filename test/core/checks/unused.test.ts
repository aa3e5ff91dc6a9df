import { describe, it } from 'vitest';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

const pump =
  'pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: { value: 1 uF, kind: x7r }, reservoir: { value: 1 uF, kind: x7r } }';

describe('unused', () => {
  it('finds supplies, parts, pins, clocks, rails and modes that nothing refers to', () => {
    checkRule(
      'unused',
      `
supplies:
  lab: { voltage: 5 V }
  spare: { voltage: 9 V }
# ^^^^^ information unused: no rail comes from it
parts:
  diodes:
    odd: { saturation: 1 nA, ideality: 1.5, resistance: 1 ohm, kind: silicon }
#   ^^^ information unused: odd is not used: no entry names it
    even: { saturation: 1 nA, ideality: 1.5, resistance: 1 ohm, kind: silicon }
chips:
  mcu:
    part: rp2040
    rail: v5
    draws: 10 mA
    pins:
      GP1: { sources: 1 mA }
      GP2: { strength: 12 mA }
#     ^^^ information unused: it has no load of its own and no clock comes from it
      GP3: { strength: 12 mA }
clocks:
  tick: { pin: mcu.GP3, frequency: 100 kHz, duty: 50 % }
  tock: { pin: mcu.GP1, frequency: 100 kHz, duty: 50 % }
# ^^^^ information unused: no pump or driver is driven by it
rails:
  v5: { supply: lab }
  up:
    pump: { topology: doubler, input: v5, drive: tick, diode: even, flying: { value: 1 uF, kind: x7r }, reservoir: { value: 1 uF, kind: x7r } }
    loads: { lamp: 1 mA }
  idle:
# ^^^^ information unused: it has no load and nothing stands on it
    regulator: { from: v5, output: 3 V }
modes:
  one: { share: 100 % }
# ^^^ information unused: all modes are the same
`,
    );
  });

  it('is silent about a mode that only stands for the rest of the time', () => {
    checkSilent(
      'unused',
      `${bench}
  up:
    ${pump}
    loads: { lamp: { current: 1 mA, in: [busy] } }
modes: { idle: { share: 90 % }, busy: { share: 10 % } }
`,
    );
  });
});
