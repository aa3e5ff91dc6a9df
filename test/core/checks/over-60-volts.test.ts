import { describe, it } from 'vitest';
import { checkRule, checkSilent } from '../../support/check-rule';

describe('over-60-volts', () => {
  it('warns of a supply that is above at its upper end', () => {
    checkRule(
      'over-60-volts',
      `
supplies: { stack: { voltage: 48..54..61 V, current: 1 A } }
rails:
  main: { supply: stack, loads: { lamp: 10 mA } }
# ^^^^ warning over-60-volts: main can reach 61 V, above 60 V d.c.
`,
    );
  });

  it('warns of what a pump reaches without its load', () => {
    // Ideal doubler: twice the input, 2 x 32 V = 64 V; under load it stays below 60 V.
    checkRule(
      'over-60-volts',
      `
supplies: { lab: { voltage: 32 V, current: 1 A } }
parts: { chips: { strong: { pins: { high-resistance: 50 ohm, low-resistance: 50 ohm } } } }
chips: { mcu: { part: strong, rail: v32, draws: 1 mA } }
clocks: { tick: { pin: mcu.P1, frequency: 100 kHz, duty: 50 % } }
rails:
  v32: { supply: lab }
  up:
# ^^ warning over-60-volts: up without its load can reach 64 V
    pump: { topology: doubler, input: v32, drive: tick, diode: silicon-switching, flying: { value: 1 uF, kind: film }, reservoir: { value: 10 uF, kind: film } }
    loads: { lamp: 30 mA }
`,
    );
  });

  it('is silent at 60 V', () => {
    checkSilent(
      'over-60-volts',
      `
supplies: { stack: { voltage: 48..54..60 V, current: 1 A } }
rails:
  main: { supply: stack, loads: { lamp: 10 mA } }
`,
    );
  });
});
