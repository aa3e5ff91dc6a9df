import { describe, it } from 'vitest';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

const parts =
  'drive: tick, diode: schottky-signal, flying: { value: 1 uF, kind: x7r }, reservoir: { value: 10 uF, kind: x7r }';

describe('rail-high', () => {
  it('is an error when the typical rail is beyond the window', () => {
    checkRule(
      'rail-high',
      `${bench}
  up:
    pump: { topology: doubler, input: v5, ${parts} }
    needs: { voltage: 7..8 V }
    #                 ^^^^^^ error rail-high: beyond the 8 V it may have
    loads: { lamp: 2 mA }
`,
    );
  });

  it('names the mode in which the load is gone', () => {
    checkRule(
      'rail-high',
      `${bench}
  up:
    pump: { topology: doubler, input: v5, ${parts} }
    needs: { voltage: 8..9.4 V }
    #                 ^^^^^^^^ error rail-high: in mode idle
    loads: { lamp: { current: 5 mA, in: [busy] }, rest: 10 uA }
modes: { idle: { share: 90 % }, busy: { share: 10 % } }
`,
    );
  });

  it('is a warning at a corner, which it names', () => {
    checkRule(
      'rail-high',
      `${bench}
  v4:
    regulator: { from: v5, output: 4 V +-2 % }
    needs: { voltage: 3.9..4.05 V }
    #                 ^^^^^^^^^^^ warning rail-high: v4 rises to 4.08 V at the corner of its tolerance, 30 mV beyond the 4.05 V
    loads: { radio: 2 mA }
`,
    );
  });

  it('takes the far side of a negative window', () => {
    checkRule(
      'rail-high',
      `${bench}
  down:
    pump: { topology: inverter, ${parts} }
    needs: { voltage: -3.5..-3 V }
    #                 ^^^^^^^^^^ error rail-high: beyond the -3.5 V it may have
    loads: { bias: 1 mA }
`,
    );
  });

  it('is silent inside the window', () => {
    checkSilent(
      'rail-high',
      `${bench}
  up:
    pump: { topology: doubler, input: v5, ${parts} }
    needs: { voltage: 7..10 V }
    loads: { lamp: 2 mA }
  down:
    pump: { topology: inverter, ${parts} }
    needs: { voltage: -5.1..-3 V }
    loads: { bias: 1 mA }
`,
    );
  });
});
