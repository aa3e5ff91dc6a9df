import { describe, it } from 'vitest';
import { checkRule, checkSilent } from '../../support/check-rule';

const board = (current: string, mark = '') => `
supplies: { lab: { voltage: 5 V, current: 1 A } }
parts:
  chips:
    plain:
      pins: { high-resistance: 20 ohm, low-resistance: 20 ohm }
      total: { source: 100 mA, sink: 80 mA }
chips:
  mcu:
    part: plain${mark}
    rail: v5
    draws: 1 mA
    pins:
      P1: { sinks: ${current} }
      P2: { sinks: ${current} }
      P3: { sources: 90 mA }
rails:
  v5: { supply: lab }
`;

describe('chip-over-limit', () => {
  it('sums each way for itself', () => {
    // 2 x 50 mA = 100 mA into the pins, a quarter above 80 mA; out of them 90 of 100 mA.
    checkRule(
      'chip-over-limit',
      board(
        '50 mA',
        '\n#         ^^^^^ error chip-over-limit: All pins of mcu together sink 100 mA, 25 % above the 80 mA',
      ),
    );
  });

  it('is silent at the limit', () => {
    checkSilent('chip-over-limit', board('40 mA'));
  });
});
