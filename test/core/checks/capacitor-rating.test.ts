import { describe, it } from 'vitest';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

describe('capacitor-rating', () => {
  it('fires with figures', () => {
    // About 9.3 V stand across the reservoir; 80 % of 10 V is 8 V (common practice, no source).
    checkRule(
      'capacitor-rating',
      `${bench}
  up:
    pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: { value: 1 uF, kind: x7r }, reservoir: { value: 10 uF, kind: aluminium, rated: 10 V } }
#                                                                                                                                                                     ^^^^ warning capacitor-rating: the usual derating
    loads: { x: 2 mA }
`,
    );
  });

  it('is silent within the limits', () => {
    checkSilent(
      'capacitor-rating',
      `${bench}
  up:
    pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: { value: 1 uF, kind: x7r }, reservoir: { value: 10 uF, kind: aluminium, rated: 16 V } }
    loads: { x: 2 mA }
`,
    );
  });
});
