import { describe, it } from 'vitest';
import { checkRule, checkSilent } from '../../support/check-rule';
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
});
