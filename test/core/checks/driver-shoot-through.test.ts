import { describe, it } from 'vitest';
import { checkRule, checkSilent } from '../../support/check-rule';
import { pushPullBoard } from '../../support/push-pull-board';

describe('driver-shoot-through', () => {
  it('names the short high level of a bipolar timer and a resistor that cures it', () => {
    // (5 V - 3.7 V - 0.7 V) / 15 kohm of base current in the pnp that should be off, times its gain: some milliampere.
    checkRule(
      'driver-shoot-through',
      pushPullBoard('base: { npn: 15 kohm, pnp: 15 kohm }', 'slow').replace(
        '  # name\n',
        '# ^^^ warning driver-shoot-through: leaves the pnp partly on. A resistor of\n',
      ),
    );
  });

  it('is silent when the clock reaches the rail', () => {
    checkSilent('driver-shoot-through', pushPullBoard('base: { npn: 1 kohm, pnp: 1 kohm }', 'a'));
  });
});
