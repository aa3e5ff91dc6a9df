import { describe, it } from 'vitest';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

describe('not-computed', () => {
  it('says once for a board with pumps which figures of the report are empty', () => {
    const pump =
      'pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: { value: 1 uF, kind: x7r }, reservoir: { value: 1 uF, kind: x7r } }';
    checkRule(
      'not-computed',
      `${bench}
  up:
    ${pump}
#   ^^^^ information not-computed: neither a pump nor a filter
    loads: { lamp: 2 mA }
  more:
    ${pump}
    loads: { lamp: 2 mA }
`,
    );
  });

  it('says which bench entries have nothing to be compared with', () => {
    checkRule(
      'not-computed',
      `supplies: { lab: { voltage: 5 V }, dead: { current: 1 A } }
rails:
  v5: { supply: lab, loads: { x: 1 mA } }
  v0: { supply: dead, loads: { x: 1 mA } }
bench:
  - { rail: v5, load: 1 mA, voltage: 5 V, ripple: 1 mV }
#                                                 ^^^^ information not-computed: no pump makes v5
  - { rail: v0, load: 1 mA, voltage: 5 V }
#           ^^ information not-computed: v0 is not compared: the voltage of dead is not known
`,
    );
  });

  it('says which capacities have no effect, and which battery has no life', () => {
    checkRule(
      'not-computed',
      `supplies:
  port: { standard: usb-3, capacity: 1 Ah }
#                                    ^^^^ information not-computed: a port does not run down
  pack: { voltage: 3..4 V, capacity: 1 Ah }
# ^^^^ information not-computed: The life of pack is not computed: nothing draws from pack
rails:
  v5: { supply: port, loads: { x: 1 mA } }
  vb: { supply: pack }
`,
    );
  });

  it('is silent on a board without', () => {
    checkSilent(
      'not-computed',
      'supplies: { lab: { voltage: 5 V } }\nrails: { v5: { supply: lab, loads: { x: 1 mA } } }\n',
    );
  });
});
