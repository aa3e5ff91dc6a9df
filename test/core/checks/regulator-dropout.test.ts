import { describe, it } from 'vitest';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

describe('regulator-dropout', () => {
  it('fires with figures', () => {
    // Definition of dropout: 3.3 V + 2 V is more than 5 V.
    checkRule(
      'regulator-dropout',
      `${bench}
  v3:
    regulator: { from: v5, output: 3.3 V, dropout: 2 V }
    #                                              ^^^ error regulator-dropout: less than the 5.3 V
    loads: { x: 20 mA }
`,
    );
  });

  it('is silent when the regulator suffices', () => {
    checkSilent(
      'regulator-dropout',
      `${bench}
  v3:
    regulator: { from: v5, output: 3.3 V, dropout: 0.3 V }
    loads: { x: 20 mA }
`,
    );
  });
});
