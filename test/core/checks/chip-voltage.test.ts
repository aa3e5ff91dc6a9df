import { describe, it } from 'vitest';
import { checkRule, checkSilent } from '../../support/check-rule';

const board = (volts: string, mark = '') => `
supplies: { lab: { voltage: ${volts} } }
chips:
  mcu: { part: stm32f103, rail: v3, draws: 30 mA }
${mark}rails: { v3: { supply: lab } }
`;

describe('chip-voltage', () => {
  it('fires with figures', () => {
    // Data sheet of the STM32F103: 2.0 to 3.6 V.
    checkRule(
      'chip-voltage',
      board('5 V', '  #                             ^^ error chip-voltage: works from 2 V to 3.6 V\n'),
    );
    checkRule(
      'chip-voltage',
      board(
        '3.2..3.7 V',
        '  #                             ^^ warning chip-voltage: gets 3.7 V from v3 at a corner\n',
      ),
    );
  });

  it('is silent within the range', () => {
    checkSilent('chip-voltage', board('3.0..3.6 V'));
  });
});
