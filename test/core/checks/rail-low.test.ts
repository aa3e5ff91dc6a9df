import { describe, it } from 'vitest';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

const pump =
  'drive: tick, diode: schottky-signal, flying: { value: 1 uF, kind: x7r }, reservoir: { value: 10 uF, kind: x7r }';

describe('rail-low', () => {
  it('is an error at typical values, with the shortfall, and says what resistance cannot be cured by capacitance', () => {
    // Fast limit 2 (Rd1 + Rd2 + ROH + ROL) + 4 ESR + ESR, charge multipliers after Seeman and Sanders, 2008 (from
    // memory: confirm): 2 (2 x 1.15 + 40) + 5 x 0.01 = 84.7 ohm.
    checkRule(
      'rail-low',
      `${bench}
  up:
    pump: { topology: doubler, input: v5, ${pump} }
    needs: { voltage: 9.4..10 V }
    #                 ^^^^^^^^^ error rail-low: The fast limit dominates: drive, diodes and ESR make 84.7 ohm, 0.76 V at 9 mA.
    loads: { lamp: 9 mA }
`,
    );
  });

  it('proposes a larger flying capacitor where the slow limit dominates', () => {
    // 1/(f C) of a doubler: Dickson, 1976 (from memory: confirm): 1/(100 kHz x 10 nF) = 1 kohm.
    checkRule(
      'rail-low',
      `${bench}
  up:
    pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: { value: 10 nF, kind: c0g }, reservoir: { value: 10 uF, kind: x7r } }
    needs: { voltage: 8.5..10 V }
    #                 ^^^^^^^^^ error rail-low: The slow limit dominates: moving charge at 1/(f C) makes 1 kohm, 2 V at 2 mA.
    loads: { lamp: 2 mA }
`,
    );
  });

  it('is a warning when only a corner misses, and names the corner', () => {
    checkRule(
      'rail-low',
      `conditions: { ambient: -20..45 degC }
${bench}
  up:
    pump: { topology: doubler, input: v5, ${pump} }
    needs: { voltage: 9.1..10 V }
    #                 ^^^^^^^^^ warning rail-low: at the corner: mainly lowest ambient (-20 degC)
    loads: { lamp: 2 mA }
`,
    );
  });

  it('judges a negative rail by magnitude and keeps the signs', () => {
    checkRule(
      'rail-low',
      `${bench}
  down:
    pump: { topology: inverter, ${pump} }
    needs: { voltage: -5..-4.5 V }
    #                 ^^^^^^^^^^ error rail-low: short of the -4.5 V it needs
    loads: { bias: 2 mA }
`,
    );
  });

  it('speaks of the mode that is too heavy', () => {
    checkRule(
      'rail-low',
      `${bench}
  up:
    pump: { topology: doubler, input: v5, ${pump} }
    needs: { voltage: 9..10 V }
    #                 ^^^^^^^ error rail-low: in mode busy
    loads: { lamp: { current: 8 mA, in: [busy] }, rest: 0.1 mA }
modes: { idle: { share: 90 % }, busy: { share: 10 % } }
`,
    );
  });

  it('holds for a regulator', () => {
    checkRule(
      'rail-low',
      `${bench}
  v3:
    regulator: { from: v5, output: 3 V }
    needs: { voltage: 3.1..3.5 V }
    #                 ^^^^^^^^^^ error rail-low: v3 reaches only 3 V, 0.1 V short of the 3.1 V it needs
    loads: { radio: 2 mA }
`,
    );
  });

  it('is silent where the window is met at every corner', () => {
    checkSilent(
      'rail-low',
      `${bench}
  up:
    pump: { topology: doubler, input: v5, ${pump} }
    needs: { voltage: 8..10 V }
    loads: { lamp: 2 mA }
  down:
    pump: { topology: inverter, ${pump} }
    needs: { voltage: -5.1..-3 V }
    loads: { bias: 2 mA }
`,
    );
  });
});
