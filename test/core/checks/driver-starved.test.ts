import { describe, it } from 'vitest';
import { checkRule, checkSilent } from '../../support/check-rule';
import { mosfetBoard } from '../../support/mosfet-board';
import { pushPullBoard } from '../../support/push-pull-board';

describe('driver-starved', () => {
  it('says how far the output stops short of its rail', () => {
    // Base current (5 - 0.7) V / 1 Mohm times a gain of 200 is under 1 mA; the pump wants 1 mA on average, 2 while on.
    checkRule(
      'driver-starved',
      pushPullBoard('base: { npn: 1 Mohm, pnp: 1 Mohm }', 'a').replace(
        '  # name\n',
        '# ^^^ error driver-starved: Smaller base resistors\n',
      ),
    );
  });

  it('is silent for a saturated stage', () => {
    checkSilent('driver-starved', pushPullBoard('base: { npn: 1 kohm, pnp: 1 kohm }', 'a'));
  });

  it('says how near the gate voltage of a MOSFET is to its threshold', () => {
    // Threshold of 1.7 V for the n-channel and 1.5 V for the p-channel class (from memory: confirm): 2 V is 0.3 V beyond.
    checkRule(
      'driver-starved',
      mosfetBoard(
        'nmos: nmos-small-signal, pmos: { channel: p, threshold: 0.5 V, on-resistance: 1 ohm, gate-charge: 1 nC }',
        {
          supply: '2 V',
        },
      ).replace(
        '    # pair\n',
        '    #       ^^^^^^^^^^^^^^^^^ error driver-starved: gives the gate of its n-channel MOSFET 2 V, and its threshold is 1.7 V\n',
      ),
    );
  });

  it('warns where only a corner comes near, and is silent for MOSFETs of low threshold', () => {
    const pair = 'nmos: nmos-logic-level, pmos: pmos-small-signal';
    // Up to 2 V of threshold: 0.3 V beyond it at a supply of 2.3 V.
    checkRule(
      'driver-starved',
      mosfetBoard(pair, { supply: '2.3 V' }).replace(
        '    # pair\n',
        '    #                               ^^^^^^^^^^^^^^^^^ warning driver-starved: 2.3 V at a corner, and a threshold may be 2 V\n',
      ),
    );
    checkSilent(
      'driver-starved',
      mosfetBoard('nmos: nmos-logic-level, pmos: pmos-logic-level', { supply: '2.3 V' }),
    );
  });
});
