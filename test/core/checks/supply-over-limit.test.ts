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
  #                 ^^^^^^^^^^^^^^^^^^ error supply-over-limit: draws 150 mA from port in mode run, 50 % above the 100 mA
rails:
  v5: { supply: port, loads: { motor: { current: 140 mA, in: [run] }, rest: 10 mA } }
modes: { wait: { share: 99 % }, run: { share: 1 % } }
`,
    );
  });

  it('judges the pulse of a coin cell, not its average', () => {
    // Usual advice of makers: pulses of 10 to 15 mA at most.
    checkRule(
      'supply-over-limit',
      `
supplies:
  cell: { battery: lithium-coin }
  #                ^^^^^^^^^^^^ error supply-over-limit: draws 15 mA from cell in mode send, 50 % above the 10 mA
rails:
  vb: { supply: cell, loads: { radio: { current: 15 mA, in: [send] }, rest: { current: 2 uA, in: [wait] } } }
modes: { wait: { share: 99.9 % }, send: { share: 0.1 % } }
`,
    );
  });

  it('warns when only a corner draws too much', () => {
    checkRule(
      'supply-over-limit',
      `
supplies:
  lab: { voltage: 5 V, current: 100 mA }
  #                             ^^^^^^ warning supply-over-limit: draws 110 mA from lab where everything takes most, 10 % above
rails:
  v5: { supply: lab, loads: { heater: 70..90..110 mA } }
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
