import { describe, it } from 'vitest';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

const pump = (flying: string, reservoir: string) =>
  `pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: ${flying}, reservoir: ${reservoir} }`;

describe('capacitor-derated', () => {
  it('fires for a ceramic that loses more than half', () => {
    // Half is lost at 0.6 of the rating (generic X5R curve, from memory): 1 / (1 + (9.3 / 6.0)^2) is about 0.3.
    checkRule(
      'capacitor-derated',
      `${bench}
  up:
    ${pump('{ value: 1 uF, kind: x7r, rated: 50 V }', '{ value: 10 uF, kind: x5r, rated: 10 V }')}
#                                                                                                                                          ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ warning capacitor-derated: up.reservoir keeps 3 µF, 30 % of its 10 µF
    loads: { x: 2 mA }
`,
    );
  });

  it('fires sooner for a small case', () => {
    checkRule(
      'capacitor-derated',
      `${bench}
  up:
    ${pump('{ value: 1 uF, kind: x7r, rated: 50 V }', '{ value: 10 uF, kind: x5r, rated: 16 V, size: 0603 }')}
#                                                                                                                                          ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ warning capacitor-derated: A rating of 32 V
    loads: { x: 2 mA }
`,
    );
  });

  it('is silent with a high rating, for a kind that keeps its value, and without a rating', () => {
    checkSilent(
      'capacitor-derated',
      `${bench}
  up:
    ${pump('{ value: 1 uF, kind: x7r }', '{ value: 10 uF, kind: x7r, rated: 25 V }')}
    loads: { x: 2 mA }
  also:
    ${pump('{ value: 1 uF, kind: film, rated: 10 V }', '{ value: 10 uF, kind: aluminium, rated: 16 V }')}
    loads: { x: 2 mA }
`,
    );
  });
});
