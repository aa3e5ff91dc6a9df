import { describe, it } from 'vitest';
import { checkRule, checkSilent } from '../../support/check-rule';
import { mosfetBoard } from '../../support/mosfet-board';
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

  it('counts what saturation stores, and proposes base resistors that store less', () => {
    // Charge control (Gray and Meyer, from memory: confirm): (5 - 0.7 V) / 1 kohm in the base, 0.7 V / 1 kohm out of it,
    // 150 ns of storage at the usual test: about 0.1 uC for each edge, twice at 50 kHz: about 10 mA.
    checkRule(
      'driver-shoot-through',
      pushPullBoard('base: { npn: 1 kohm, pnp: 1 kohm }', 'a').replace(
        '  # name\n',
        '# ^^^ warning driver-shoot-through: instead of 1 kohm still saturate it and store less\n',
      ),
    );
  });

  it('is silent for small base currents and few edges', () => {
    // A fifth of the charge above, 2000 edges a second: some 50 uA.
    checkSilent(
      'driver-shoot-through',
      pushPullBoard('base: { npn: 4.7 kohm, pnp: 4.7 kohm }', 'a')
        .replace('50 kHz', '1 kHz')
        .replaceAll('{ value: 1 uF', '{ value: 100 uF'),
    );
  });

  it('is silent without stored charge when the clock reaches the rail', () => {
    const own = (polarity: string) => `{ polarity: ${polarity}, saturation: 10 fA, gain: 200 }`;
    checkSilent(
      'driver-shoot-through',
      pushPullBoard('base: { npn: 1 kohm, pnp: 1 kohm }', 'a')
        .replace('npn-small-signal', own('npn'))
        .replace('pnp-small-signal', own('pnp')),
    );
  });

  it('counts what flows while the gates of MOSFETs are between both thresholds', () => {
    // Veendrick, 1984 (from memory: confirm), with 9 and 3.3 A/V^2, 3.5 V beyond both thresholds and some 160 ns: a good
    // part of a microcoulomb for each edge.
    checkRule(
      'driver-shoot-through',
      mosfetBoard('nmos: nmos-logic-level, pmos: pmos-logic-level, gate: 22 ohm')
        .replace('  # name\n', '')
        .replace(
          '  amp:\n',
          '  amp:\n# ^^^ warning driver-shoot-through: a gate resistor below its 22 ohm or a lower frequency\n',
        ),
    );
  });

  it('is silent for MOSFETs whose thresholds leave no room at that supply', () => {
    // 1.7 V and 1.5 V are together above 3 V.
    checkSilent(
      'driver-shoot-through',
      mosfetBoard('nmos: nmos-small-signal, pmos: pmos-small-signal', { supply: '3 V' }),
    );
  });
});
