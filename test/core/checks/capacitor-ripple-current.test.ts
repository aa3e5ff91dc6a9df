import { describe, it } from 'vitest';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

const pump = (flying: string, reservoir: string) =>
  `pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: ${flying}, reservoir: ${reservoir} }`;

describe('capacitor-ripple-current', () => {
  it('fires above the rating of the file', () => {
    // Behind 20 ohm all charge moves slowly: about twice the load's 20 mA, rms (physics of the fast limit, F3.3).
    checkRule(
      'capacitor-ripple-current',
      `${bench}
  up:
    ${pump('{ value: 1 uF, kind: x7r, ripple: 30 mA }', '{ value: 10 uF, kind: x7r }')}
#                                                                                                                        ^^^^^ error capacitor-ripple-current: more than the 30 mA it is rated for
    loads: { x: 20 mA }
`,
    );
  });

  it('fires when the series resistance gets hot', () => {
    // Twice the load (as above) in 60 ohm: 54 mW, and 50 mW is the limit (common practice, no source).
    checkRule(
      'capacitor-ripple-current',
      `${bench}
  up:
    ${pump('{ value: 10 uF, kind: aluminium, esr: 60 ohm }', '{ value: 10 uF, kind: x7r }')}
#                                                                                      ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ warning capacitor-ripple-current: what a usual part of this kind bears
    loads: { x: 15 mA }
`,
    );
  });

  it('is silent within both', () => {
    checkSilent(
      'capacitor-ripple-current',
      `${bench}
  up:
    ${pump('{ value: 10 uF, kind: aluminium, esr: 2 ohm, ripple: 60 mA }', '{ value: 10 uF, kind: aluminium }')}
    loads: { x: 20 mA }
`,
    );
  });
});
