import { describe, it } from 'vitest';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

const pump = (reservoir: string) =>
  `pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: { value: 100 nF, kind: x7r }, reservoir: { value: ${reservoir}, kind: x7r } }`;

describe('start-slow', () => {
  it('says how long the rail takes', () => {
    // Rout C ln 10 (charging through a resistance): at least 1/(f C) = 100 ohm times 100 uF times 2.3 is 23 ms.
    checkRule(
      'start-slow',
      `${bench}
  up:
    ${pump('100 uF')}
    needs: { start: 5 ms }
    #               ^^^^ error start-slow: times the 5 ms allowed
    loads: { lamp: 1 mA }
`,
    );
  });

  it('is silent for a small reservoir, and without a need', () => {
    checkSilent(
      'start-slow',
      `${bench}
  up:
    ${pump('1 uF')}
    needs: { start: 5 ms }
    loads: { lamp: 1 mA }
  slow:
    ${pump('100 uF')}
    loads: { lamp: 1 mA }
`,
    );
  });
});
