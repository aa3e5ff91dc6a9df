import { describe, it } from 'vitest';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

describe('load-voltage', () => {
  it('fires with figures', () => {
    // Two diodes below 10 V: the rail cannot reach 9.9 V.
    checkRule(
      'load-voltage',
      `${bench}
  up:
    pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: { value: 1 uF, kind: x7r }, reservoir: { value: 10 uF, kind: x7r } }
    loads: { amp: { current: 2 mA, least: 9.9 V }, ok: { current: 1 mA, least: 4 V, most: 12 V } }
#                                         ^^^^^ error load-voltage: less than the 9.9 V that it needs
`,
    );
  });

  it('is silent within the limits', () => {
    checkSilent(
      'load-voltage',
      `${bench}
  up:
    pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: { value: 1 uF, kind: x7r }, reservoir: { value: 10 uF, kind: x7r } }
    loads: { ok: { current: 1 mA, least: 4 V, most: 12 V } }
`,
    );
  });
});
