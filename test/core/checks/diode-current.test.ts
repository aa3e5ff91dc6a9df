import { describe, it } from 'vitest';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

describe('diode-current', () => {
  it('fires with figures', () => {
    // Each diode carries the load current on average (charge balance): 2 mA.
    checkRule(
      'diode-current',
      `${bench}
  up:
    pump: { topology: doubler, input: v5, drive: tick, diode: { saturation: 22 nA, ideality: 1.03, resistance: 1 ohm, kind: schottky, reverse: 30 V, average: 1 mA, peak: 1 A }, flying: { value: 1 uF, kind: x7r }, reservoir: { value: 10 uF, kind: x7r } }
#                                                             ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ error diode-current: on average
    loads: { x: 2 mA }
`,
    );
  });

  it('is silent within the limits', () => {
    checkSilent(
      'diode-current',
      `${bench}
  up:
    pump: { topology: doubler, input: v5, drive: tick, diode: { saturation: 22 nA, ideality: 1.03, resistance: 1 ohm, kind: schottky, reverse: 30 V, average: 10 mA, peak: 1 A }, flying: { value: 1 uF, kind: x7r }, reservoir: { value: 10 uF, kind: x7r } }
    loads: { x: 2 mA }
`,
    );
  });
});
