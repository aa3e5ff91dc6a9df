import { describe, it } from 'vitest';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

describe('regulator-over-limit', () => {
  it('fires with figures', () => {
    // 20 mA against 10 mA.
    checkRule(
      'regulator-over-limit',
      `${bench}
  v3:
    regulator: { from: v5, output: 3.3 V, limit: 10 mA }
    #                                            ^^^^^ error regulator-over-limit: 100 % above the 10 mA
    loads: { x: 20 mA }
`,
    );
  });

  it('is silent when the regulator suffices', () => {
    checkSilent(
      'regulator-over-limit',
      `${bench}
  v3:
    regulator: { from: v5, output: 3.3 V, limit: 30 mA }
    loads: { x: 20 mA }
`,
    );
  });
});
