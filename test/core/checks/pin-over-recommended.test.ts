import { describe, it } from 'vitest';
import { checkRule, checkSilent } from '../../support/check-rule';

const board = (sources: string, mark = '') => `
supplies:
  lab: { voltage: 5 V, current: 1 A }
parts:
  chips:
    plain:
      pins: { high-resistance: 20 ohm, low-resistance: 20 ohm, recommended: 20 mA, absolute: 40 mA }
chips:
  mcu:
    part: plain
    rail: v5
    draws: 1 mA
    pins:
      P7: { sources: ${sources} }
${mark}
rails:
  v5: { supply: lab }
`;

describe('pin-over-recommended', () => {
  it('warns between the two limits', () => {
    checkRule(
      'pin-over-recommended',
      board(
        '30 mA',
        '#     ^^ warning pin-over-recommended: 50 % above the 20 mA up to which its levels are specified',
      ),
    );
  });

  it('points at the drive setting and names one that is enough', () => {
    checkRule(
      'pin-over-recommended',
      `
supplies: { lab: { voltage: 3.3 V, current: 1 A } }
chips:
  mcu:
    part: rp2040
    rail: v3
    pins:
      GP3: { strength: 4 mA, sources: 6 mA }
      #                ^^^^ warning pin-over-recommended: Its 8 mA drive setting covers that.
rails:
  v3: { supply: lab }
`,
    );
  });

  it('leaves a pin above its absolute maximum to the graver rule', () => {
    checkSilent('pin-over-recommended', board('45 mA'));
  });

  it('is silent below', () => {
    checkSilent('pin-over-recommended', board('15 mA'));
  });
});
