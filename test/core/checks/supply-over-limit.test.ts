import { describe, it } from 'vitest';
import { checkRule, checkSilent } from '../../support/check-rule';

describe('supply-over-limit', () => {
  it('counts the loads of every rail that the supply feeds', () => {
    // Kirchhoff's current law: 80 + 40 mA and the regulator's 1 mA.
    checkRule(
      'supply-over-limit',
      `
supplies:
  lab: { voltage: 5 V, current: 100 mA }
  #                             ^^^^^^ error supply-over-limit: draws 121 mA from lab, 21 % above the 100 mA it may give. Shed 21 mA
rails:
  v5: { supply: lab, loads: { heater: 80 mA } }
  v3:
    regulator: { from: v5, output: 3.3 V, ground: 1 mA }
    loads: { radio: 40 mA }
`,
    );
  });

  it('takes the limit of the port standard and the heaviest mode', () => {
    // USB 2.0, 7.2.1: 100 mA before the port is configured.
    checkRule(
      'supply-over-limit',
      `
supplies:
  port: { standard: usb-2-unconfigured }
  #                 ^^^^^^^^^^^^^^^^^^ error supply-over-limit: draws 150 mA from port in its heaviest mode, 50 % above the 100 mA
rails:
  v5: { supply: port, loads: { motor: { current: 140 mA, in: [run] }, rest: 10 mA } }
modes: { wait: { share: 99 % }, run: { share: 1 % } }
`,
    );
  });

  it('is silent at the limit', () => {
    checkSilent(
      'supply-over-limit',
      `
supplies:
  lab: { voltage: 5 V, current: 100 mA }
rails:
  v5: { supply: lab, loads: { heater: 100 mA } }
`,
    );
  });
});
