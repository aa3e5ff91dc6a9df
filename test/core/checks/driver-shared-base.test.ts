import { describe, it } from 'vitest';
import { checkRule, checkSilent } from '../../support/check-rule';
import { pushPullBoard } from '../../support/push-pull-board';

describe('driver-shared-base', () => {
  it('gives the current that flows through joined bases', () => {
    // (5 V - 2 junctions) over the base resistances of both transistors: of the order of 0.1 A in the bases alone.
    checkRule(
      'driver-shared-base',
      pushPullBoard(`shared-base: 1 kohm`, 'a').replace(
        '    # marks\n',
        '    #                                                                                               ^^^^^^ error driver-shared-base: Give each base a resistor of its own\n',
      ),
    );
  });

  it('is silent for separate base resistors', () => {
    checkSilent('driver-shared-base', pushPullBoard('base: { npn: 1 kohm, pnp: 1 kohm }', 'a'));
  });
});
