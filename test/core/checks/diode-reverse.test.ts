import { describe, it } from 'vitest';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

describe('diode-reverse', () => {
  it('fires with figures', () => {
    // Each diode of a doubler blocks the swing of its drive: 5 V less a diode (charge balance).
    checkRule(
      'diode-reverse',
      `${bench}
  up:
    pump: { topology: doubler, input: v5, drive: tick, diode: { saturation: 22 nA, ideality: 1.03, resistance: 1 ohm, kind: schottky, reverse: 3 V, average: 1 A, peak: 1 A }, flying: { value: 1 uF, kind: x7r }, reservoir: { value: 10 uF, kind: x7r } }
#                                                             ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ error diode-reverse: more than the 3 V it is rated for
    loads: { x: 2 mA }
`,
    );
  });

  it('is silent within the limits', () => {
    checkSilent(
      'diode-reverse',
      `${bench}
  up:
    pump: { topology: doubler, input: v5, drive: tick, diode: { saturation: 22 nA, ideality: 1.03, resistance: 1 ohm, kind: schottky, reverse: 10 V, average: 1 A, peak: 1 A }, flying: { value: 1 uF, kind: x7r }, reservoir: { value: 10 uF, kind: x7r } }
    loads: { x: 2 mA }
`,
    );
  });
});
