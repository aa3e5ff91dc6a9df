import { describe, it } from 'vitest';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

const withClocks = (clocks: string) => bench.replace(/clocks:\n/, `clocks:\n${clocks}`);

describe('clock-frequency', () => {
  it('sets registers against the frequency that is written', () => {
    // Data sheet form f = clk / (P (TOP + 1)): 16 MHz / (8 x 45) = 44.44 kHz, 0.78 % above 44.1 kHz.
    checkRule(
      'clock-frequency',
      withClocks(
        '  reg: { pin: mcu.P2, frequency: 44.1 kHz, timer: { input: 16 MHz, prescaler: 8, top: 44 } }\n' +
          '  #                              ^^^^^^^^ warning clock-frequency: make 44.44 kHz, 0.78 % above\n',
      ),
    );
  });

  it('knows how fast a timer runs', () => {
    // f = 1.4427 / ((RA + 2 RB) C): 1.4427 / (3 kohm x 100 pF) = 4.8 MHz.
    checkRule(
      'clock-frequency',
      withClocks(
        '  osc: { rail: v5, astable: { charge: 1 kohm, discharge: 1 kohm, timing: 100 pF, part: bipolar-astable } }\n' +
          '  #                                                                      ^^^^^^ error clock-frequency: faster than\n',
      ),
    );
  });

  it('is silent when both agree', () => {
    checkSilent(
      'clock-frequency',
      withClocks(
        '  reg: { pin: mcu.P2, frequency: 44.4 kHz, timer: { input: 16 MHz, prescaler: 8, top: 44 } }\n' +
          '  osc: { rail: v5, astable: { charge: 1 kohm, discharge: 10 kohm, timing: 10 nF, part: bipolar-astable } }\n',
      ),
    );
  });
});
