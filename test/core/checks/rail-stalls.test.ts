import { describe, it } from 'vitest';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

const pump = (flying: string) =>
  `pump: { topology: inverter, drive: tick, diode: schottky-signal, flying: { value: ${flying}, kind: c0g }, reservoir: { value: 10 uF, kind: x7r } }`;

describe('rail-stalls', () => {
  it('says how much of the load is carried', () => {
    // A pump moves at most f C V in a second (Dickson, 1976, at zero output; from memory: confirm):
    // 100 kHz x 1 nF x 5 V = 0.5 mA, less what the diodes take.
    checkRule(
      'rail-stalls',
      `${bench}
  down:
# ^^^^ error rail-stalls: its loads ask for 2 mA and it carries
    ${pump('1 nF')}
    loads: { bias: 2 mA }
`,
    );
  });

  it('is silent for a pump that only sags', () => {
    checkSilent(
      'rail-stalls',
      `${bench}
  down:
    ${pump('22 nF')}
    loads: { bias: 2 mA }
  soft:
    ${pump('1 nF')}
    loads: { meter: 10 kohm }
`,
    );
  });
});
