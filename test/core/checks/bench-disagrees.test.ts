import { describe, it } from 'vitest';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

const parts = (flying: string) =>
  `drive: tick, diode: schottky-signal, flying: { value: ${flying}, kind: film }, reservoir: { value: 10 uF +-10 %, kind: film, esr: 5 mohm }`;
const up = `  up:
    pump: { topology: doubler, input: v5, ${parts('22 nF +-10 %')} }
    loads: { lamp: 1 mA }
`;
const down = `  down:
    pump: { topology: inverter, ${parts('1 uF +-10 %')} }
    loads: { bias: 1 mA }
`;

describe('bench-disagrees', () => {
  it('warns where no tolerance leads, and says what would', () => {
    // Slow limit, Dickson, 1976 (from memory): 1 / (100 kHz 22 nF) = 455 ohm; half the capacitance costs 0.455 V more at
    // 1 mA, and no other part of this board is good for that much.
    checkRule(
      'bench-disagrees',
      `${bench}${up}bench:
  - { rail: up, load: 1 mA, voltage: 8.6 V }
#                                    ^^^^^ warning bench-disagrees: up: measured 8.6 V with 1 mA
  - { rail: up, load: 1 mA, voltage: 8.61 V }
#                                    ^^^^^^ warning bench-disagrees: V of the lowest corner; 9.0
  - { rail: up, load: 1 mA, voltage: 8.62 V }
#                                    ^^^^^^ warning bench-disagrees: a flying capacitor that its d.c. bias or its kind leaves short of capacitance
  - { rail: up, load: 1 mA, voltage: 8.6 V }
#                                    ^^^^^ warning bench-disagrees: where its tolerance ends at 19.8 nF
`,
    );
  });

  it('fits the usual causes to the sign', () => {
    checkRule(
      'bench-disagrees',
      `${bench}${up}bench:
  - { rail: up, load: 1 mA, voltage: 9.6 V }
#                                    ^^^^^ warning bench-disagrees: V of the highest corner; 9.0
  - { rail: up, load: 1 mA, voltage: 9.5 V }
#                                    ^^^^^ warning bench-disagrees: a supply above its nominal voltage; a load that draws less than entered
`,
    );
  });

  it('counts the meter as a load where that tells', () => {
    // Without a load the diodes carry next to nothing, and a meter's half a microampere moves their drop.
    checkRule(
      'bench-disagrees',
      `${bench}${up}bench:
  - { rail: up, load: 0 A, voltage: 9.75 V }
#                                   ^^^^^^ warning bench-disagrees: the meter as a load of 10 Mohm, which costs
`,
    );
  });

  it('keeps the sign of a negative rail', () => {
    checkRule(
      'bench-disagrees',
      `${bench}${down}bench:
  - { rail: down, load: 1 mA, voltage: -4.0 V }
#                                      ^^^^^^ warning bench-disagrees: short of the -4.2
  - { rail: down, load: 1 mA, voltage: -4.8 V }
#                                      ^^^^^^ warning bench-disagrees: beyond the -4.3
  - { rail: down, load: 1 mA, voltage: 4.3 V }
#                                      ^^^^^ warning bench-disagrees: a sign or swapped leads, since down is negative
`,
    );
  });

  it('judges ripple beside the voltage', () => {
    // At most I / (f C) = 1 mV for 1 mA, 100 kHz, 10 uF (Dickson, 1976, upper bound).
    checkRule(
      'bench-disagrees',
      `${bench}${up}bench:
  - { rail: up, load: 1 mA, voltage: 9.05 V, ripple: 12 mV }
#                                                    ^^^^^ warning bench-disagrees: a long ground lead of the probe
  - { rail: up, load: 1 mA, voltage: 9.05 V, ripple: 0.1 mV }
#                                                    ^^^^^^ warning bench-disagrees: a bandwidth limit
`,
    );
  });

  it('knows supplies and regulators', () => {
    checkRule(
      'bench-disagrees',
      `${bench.replace('lab:', 'soft: { voltage: 5 V +-1 %, resistance: 1 ohm }\n  lab:')}  vs: { supply: soft, loads: { x: 1 mA } }
  v3: { regulator: { from: v5, output: 3.3 V +-2 % }, loads: { x: 1 mA } }
bench:
  - { rail: vs, load: 50 ohm, voltage: 4.5 V }
#                                      ^^^^^ warning bench-disagrees: below the 4.85 V of the lowest corner
  - { rail: v3, load: 10 mA, voltage: 3.1 V }
#                                     ^^^^^ warning bench-disagrees: an input that sags
  - { rail: v5, load: 10 mA, voltage: 5.2 V }
#                                     ^^^^^ warning bench-disagrees: the 5 V without tolerance
`,
    );
  });

  it('is silent inside the band, also where something explains the difference', () => {
    checkSilent(
      'bench-disagrees',
      `${bench}${up}${down}bench:
  - { rail: up, load: 1 mA, voltage: 9.02 V, ripple: 0.7 mV, note: board 3 }
  - { rail: up, load: 9 kohm, voltage: 9.05 V }
  - { rail: down, load: 1 mA, voltage: -4.3 V }
  - { rail: v5, load: 1 A, voltage: 5 V }
`,
    );
  });

  it('takes a reading with a band of its own by its ends', () => {
    checkSilent('bench-disagrees', `${bench}${up}bench: [{ rail: up, load: 1 mA, voltage: 8.6 V +-5 % }]\n`);
  });
});
