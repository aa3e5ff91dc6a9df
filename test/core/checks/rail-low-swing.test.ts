/**
 * `rail-low` at `needs.swing`: an amplifier clips at the weakest moment of the ripple.
 * Required rails: `V+ >= Vp + Vsat+`, `V- <= -Vp - Vsat-`, the output stage of any amplifier between its rails.
 */
import { describe, expect, it } from 'vitest';
import { analyse, sizeRail } from '../../../core/index';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

const pump = (reservoir: string) =>
  `drive: tick, diode: schottky-signal, flying: { value: 1 uF, kind: film }, reservoir: { value: ${reservoir}, kind: film }`;
const up = (reservoir: string, needs: string, mark: string) => `${bench}
  up:
    pump: { topology: doubler, input: v5, ${pump(reservoir)} }
    needs: ${needs}
    ${mark}
    loads: { opamp: { amplifier: { quiescent: 1.2 mA, output: 0.5 mA, count: 2 } } }
`;
const file = { file: 'rails.yaml' };

describe('rail-low at swing', () => {
  it('names swing, headroom and their sum', () => {
    checkRule(
      'rail-low',
      up(
        '10 uF',
        '{ swing: 8 V, headroom: 1.2 V }',
        '#               ^^^ error rail-low: short of the 9.2 V that 8 V of swing and 1.2 V of headroom take',
      ),
    );
  });

  it('judges the weakest moment, not the average, and proposes a reservoir', () => {
    // Ripple of a doubler into 100 nF: at most I / (f C) = 3.4 mA / (100 kHz x 0.1 uF) = 0.34 V (Dickson, 1976; from
    // memory: confirm), at least half of it: the average of about 9.03 V meets 9 V, its lowest moment does not.
    const text = up(
      '100 nF',
      '{ swing: 7.8 V, headroom: 1.2 V }',
      '#               ^^^^^ error rail-low: nF of reservoir instead of 100 nF would do.',
    );
    checkRule('rail-low', text);
    expect(analyse(text, file).report.rails['up']?.voltage?.typical).toBeGreaterThan(9);
    checkSilent('rail-low', up('10 uF', '{ swing: 7.6 V, headroom: 1.2 V }', ''));
  });

  it('is a warning when only a corner misses', () => {
    checkRule(
      'rail-low',
      `conditions: { ambient: -20..45 degC }\n${up(
        '10 uF',
        '{ swing: 7.8 V, headroom: 1.2 V }',
        '#               ^^^^^ warning rail-low: at the corner: mainly lowest ambient (-20 degC)',
      )}`,
    );
  });

  it('reports window and signal each on its own', () => {
    checkRule(
      'rail-low',
      up(
        '10 uF',
        '{ voltage: 9.5..11 V, swing: 8 V, headroom: 1.2 V }',
        `#                 ^^^^^^^^^ error rail-low: short of the 9.5 V it needs
    #                                   ^^^ error rail-low: short of the 9.2 V`,
      ),
    );
  });

  it('takes the usual amplifier where the headroom is left out', () => {
    // Bipolar single-supply amplifier, +-4 V of output: V+ >= 5.5 V, and V- <= -4.7 V when it sinks more than 50 uA
    // (class figures, from memory: confirm).
    const both = (supply: string) => `
supplies: { plus: { voltage: ${supply} }, minus: { voltage: -${supply} } }
rails:
  vp: { supply: plus, needs: { swing: 4 V }, loads: { a: 1 mA } }
  vn: { supply: minus, needs: { swing: 4 V }, loads: { a: 1 mA } }
`;
    const limits = (text: string) =>
      analyse(text, file)
        .findings.filter(({ code }) => code === 'rail-low')
        .map(({ at, expected }) => `${at} ${expected}`);
    expect(limits(both('4.6 V'))).toEqual([
      'rails.vp.needs.swing at least 5.5 V at every moment',
      'rails.vn.needs.swing at least -4.7 V at every moment',
    ]);
    expect(limits(both('5 V'))).toEqual(['rails.vp.needs.swing at least 5.5 V at every moment']);
    expect(limits(both('5.6 V'))).toEqual([]);
    checkRule(
      'assumed',
      `
supplies: { plus: { voltage: 6 V } }
rails:
  vp:
    supply: plus
    needs: { swing: 4 V }
    #        ^^^^^ information assumed: 1.5 V is taken
    loads: { a: 1 mA }
`,
    );
  });

  it('says that a headroom alone asks for nothing', () => {
    checkRule(
      'missing-key',
      `
supplies: { plus: { voltage: 6 V } }
rails:
  vp:
    supply: plus
    needs: { headroom: 1 V }
    #        ^^^^^^^^ warning missing-key: without the peak
    loads: { a: 1 mA }
`,
    );
  });
});

describe('headroom of the report', () => {
  it('is what the tighter of window and signal leaves', () => {
    const rail = (needs: string) => `
supplies: { lab: { voltage: 4.9..5.1 V } }
rails: { v5: { supply: lab, needs: ${needs}, loads: { a: 1 mA } } }
`;
    const headroom = (needs: string) => analyse(rail(needs), file).report.rails['v5']?.headroom;
    expect(headroom('{ voltage: 4.5..6 V }')).toBeCloseTo(0.4, 9);
    expect(headroom('{ voltage: 4.5..6 V, swing: 3 V, headroom: 1 V }')).toBeCloseTo(0.4, 9);
    expect(headroom('{ voltage: 4.5..6 V, swing: 3.5 V, headroom: 1.2 V }')).toBeCloseTo(0.2, 9);
    expect(headroom('{ swing: 3.5 V, headroom: 1.5 V }')).toBeCloseTo(-0.1, 9);
  });
});

describe('size this rail for a signal', () => {
  it('takes the smallest pair whose weakest moment holds it', () => {
    const text = `${bench}
  up:
    pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: { value: 10 nF, kind: film }, reservoir: { value: 10 nF, kind: film } }
    needs: { swing: 7 V, headroom: 1.5 V }
    loads: { opamp: { amplifier: { quiescent: 1.2 mA } } }
`;
    const sized = sizeRail(analyse(text, file), 'up');
    if (!sized.ok) throw new Error(sized.reason);
    let done = text;
    for (const { span, text: value } of [...sized.edits].reverse())
      done = done.slice(0, span.start) + value + done.slice(span.end);
    checkSilent('rail-low', done);
  });
});
