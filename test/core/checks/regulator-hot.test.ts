import { describe, it } from 'vitest';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

describe('regulator-hot', () => {
  it('fires with figures', () => {
    // Tj = Ta + (Vin - Vout) I Rth: 25 degC + 1.7 V x 20 mA x 4000 K/W = 161 degC.
    checkRule(
      'regulator-hot',
      `${bench}
  v3:
    regulator: { from: v5, output: 3.3 V, thermal: 4000 K/W }
    #                                              ^^^^^^^^ error regulator-hot: reaches 161 degC
    loads: { x: 20 mA }
`,
    );
  });

  it('is silent when the regulator suffices', () => {
    checkSilent(
      'regulator-hot',
      `${bench}
  v3:
    regulator: { from: v5, output: 3.3 V, thermal: 200 K/W }
    loads: { x: 20 mA }
`,
    );
  });
});
