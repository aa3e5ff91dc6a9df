import { describe, it } from 'vitest';
import { checkRule, checkSilent } from '../../support/check-rule';

const board = (current: string, mark = '') => `
supplies: { lab: { voltage: 5 V, current: 1 A } }
parts:
  chips:
    plain:
      pins: { high-resistance: 20 ohm, low-resistance: 20 ohm, absolute: 40 mA }
      groups: { port B: { pins: [PB0, PB1, PB2], source: 60 mA, sink: 60 mA } }
chips:
  mcu:
    part: plain
    rail: v5
    draws: 1 mA
    pins:${mark}
      PB0: { sources: ${current} }
      PB1: { sources: ${current} }
      PB2: { sources: ${current} }
      PC0: { sources: 39 mA }
rails:
  v5: { supply: lab }
`;

describe('group-over-limit', () => {
  it('adds up the pins of the group only', () => {
    // 3 x 25 mA = 75 mA, a quarter above 60 mA; the fourth pin belongs to another port.
    checkRule(
      'group-over-limit',
      board(
        '25 mA',
        '\n#   ^^^^ error group-over-limit: mcu.port B together source 75 mA, 25 % above the 60 mA allowed',
      ),
    );
  });

  it('is silent at the limit', () => {
    checkSilent('group-over-limit', board('20 mA'));
  });
});
