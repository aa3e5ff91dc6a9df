import { describe, it } from 'vitest';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

const parts =
  'topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: { value: 1 uF, kind: x7r }';

describe('ripple-high', () => {
  it('is an error at typical values and proposes a reservoir', () => {
    // Form of pump chip data sheets at half duty (Sipex SP682 data sheet, 2000): I (1/(2 f C) + 2 ESR)
    // = 2 mA (1/(2 x 100 kHz x 10 uF) + 2 x 10 mohm) = 1.04 mV.
    checkRule(
      'ripple-high',
      `${bench}
  up:
    pump: { ${parts}, reservoir: { value: 10 uF, kind: x7r } }
    needs: { voltage: 8..10 V, ripple: 0.5 mV }
    #                                  ^^^^^^ error ripple-high: up has 1.04 mV of ripple, 2.1 times the 500 µV
    loads: { lamp: 2 mA }
`,
    );
  });

  it('says that capacitance does not help where the series resistance makes the ripple', () => {
    // Same form: the step alone is 2 I ESR = 2 x 2 mA x 1 ohm = 4 mV.
    checkRule(
      'ripple-high',
      `${bench}
  up:
    pump: { ${parts}, reservoir: { value: 100 uF, kind: aluminium, esr: 1 ohm } }
    needs: { voltage: 8..10 V, ripple: 3 mV }
    #                                  ^^^^ error ripple-high: ESR of 1 ohm alone steps by about 4 mV
    loads: { lamp: 2 mA }
`,
    );
  });

  it('is a warning when only the smallest reservoir misses', () => {
    // Ripple goes with 1/C: a ceramic of -10 % makes 1.04 mV into 1.15 mV.
    checkRule(
      'ripple-high',
      `${bench}
  up:
    pump: { ${parts}, reservoir: { value: 10 uF, kind: x7r } }
    needs: { voltage: 8..10 V, ripple: 1.1 mV }
    #                                  ^^^^^^ warning ripple-high: at the corner: mainly lowest reservoir capacitor (9 µF)
    loads: { lamp: 2 mA }
`,
    );
  });

  it('is silent with enough capacitance, and without a need', () => {
    checkSilent(
      'ripple-high',
      `${bench}
  up:
    pump: { ${parts}, reservoir: { value: 10 uF, kind: x7r } }
    needs: { voltage: 8..10 V, ripple: 2 mV }
    loads: { lamp: 2 mA }
  also:
    pump: { ${parts}, reservoir: { value: 100 nF, kind: x7r } }
    loads: { lamp: 2 mA }
`,
    );
  });
});
