import { describe, it } from 'vitest';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

const pump = (rest = '') =>
  `pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: { value: 1 uF, kind: film }, reservoir: { value: 10 uF, kind: film }${rest} }`;

describe('inrush-pin', () => {
  it('says how high the first pulse goes and which resistor bounds it', () => {
    // Ohm's law: less than 5 V over 20 ohm is 250 mA, and 5 V over 40 mA less 20 ohm asks for 105 ohm, 120 ohm in E12.
    checkRule(
      'inrush-pin',
      `${bench.replace('tick: { pin: mcu.P1', 'tick: { pin: mcu.P1 ')}
  up:
    ${pump()}
    loads: { x: 1 mA }
`.replace(
        'clocks:\n  tick: { pin: mcu.P1 , frequency: 100 kHz, duty: 50 % }\n',
        'clocks:\n  tick: { pin: mcu.P1, frequency: 100 kHz, duty: 50 % }\n#              ^^^^^^ information inrush-pin: A resistor of 120 ohm in series\n',
      ),
    );
  });

  it('is silent with that resistor, and for pins whose rating nobody states', () => {
    checkSilent('inrush-pin', `${bench}  up:\n    ${pump(', series: 120 ohm')}\n    loads: { x: 1 mA }\n`);
    checkSilent(
      'inrush-pin',
      `${bench.replace(', absolute: 40 mA', '')}  up:\n    ${pump()}\n    loads: { x: 1 mA }\n`,
    );
  });
});
