import { describe, expect, it } from 'vitest';
import { analyse, ledgerText } from '../../../core/index';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

/** One rail too low, at `rails.up.needs.voltage`. */
const board = (waivers: string, rails = '') => `${bench}
  up:
    pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: 1 uF, reservoir: 10 uF }
    needs: { voltage: 9.8..10 V }
    loads: { lamp: 2 mA }
${rails}waivers:
  - ${waivers}
`;

const because = 'because: the lamp works from 8 V on';

describe('waivers', () => {
  it.each(['rails.up.needs.voltage', 'rails.up', 'rails'])('at %s silence the one finding there', (at) => {
    const text = board(`{ finding: rail-low, at: ${at}, ${because}, until: rev D }`);
    const analysis = analyse(text, { file: 'rails.yaml', today: '2026-06-01' });
    expect(analysis.findings.filter(({ severity }) => severity !== 'information')).toEqual([]);
    expect(analysis.report.findings.some(({ code }) => code === 'rail-low')).toBe(false);
    expect(analysis.report.waived).toMatchObject([
      {
        code: 'rail-low',
        at: 'rails.up.needs.voltage',
        because: 'the lamp works from 8 V on',
        until: 'rev D',
      },
    ]);
    const ledger = ledgerText(analysis, { colour: false, width: 120 });
    expect(ledger).toMatch(
      /Waived\nrails\.yaml:\d+:\d+ rail-low rails\.up\.needs\.voltage: the lamp works from 8 V on \(until rev D\)/,
    );
  });

  it('silence nothing else', () => {
    const more =
      '  down:\n    pump: { topology: inverter, drive: tick, diode: schottky-signal, flying: 1 uF, reservoir: 10 uF }\n    needs: { voltage: -6..-5 V }\n    loads: { lamp: 2 mA }\n';
    const text = board(`{ finding: rail-low, at: rails.up, ${because} }`, more);
    const { findings } = analyse(text, { file: 'rails.yaml' });
    expect(findings.filter(({ code }) => code === 'rail-low').map(({ at }) => at)).toEqual([
      'rails.down.needs.voltage',
    ]);
  });

  it('run out with their date, and not without a clock', () => {
    const text = board(`{ finding: rail-low, at: rails.up, ${because}, until: 2027-03-31 }`);
    const codes = (today?: string) =>
      analyse(text, { file: 'rails.yaml', ...(today ? { today } : {}) })
        .findings.map(({ code }) => code)
        .filter((code) => code === 'rail-low' || code === 'waiver-stale');
    expect(codes()).toEqual([]);
    expect(codes('2027-03-31')).toEqual([]);
    expect(codes('2027-04-01').sort()).toEqual(['rail-low', 'waiver-stale']);
  });
});

describe('waiver-stale', () => {
  it('fires where nothing is left to waive, and where it could mean several', () => {
    checkRule(
      'waiver-stale',
      board(`{ finding: ripple-high, at: rails.up, ${because} }
#              ^^^^^^^^^^^ warning waiver-stale: no \`ripple-high\` any more`),
    );
    checkRule(
      'waiver-stale',
      board(`{ finding: rail-low, at: rails.upp, ${because} }
#                            ^^^^^^^^^ warning waiver-stale: there is one at rails.up.needs.voltage`),
    );
    checkRule(
      'waiver-stale',
      board(
        `{ finding: assumed, at: rails, ${because} }
#                           ^^^^^ warning waiver-stale: name one place`,
        '  more: { pump: { topology: doubler, input: v5, drive: tick, diode: { saturation: 1 nA }, flying: 1 uF, reservoir: 10 uF } }\n',
      ),
    );
  });
  it('fires for a second waiver of the same finding, without a reason, and for errors of the file', () => {
    checkRule(
      'waiver-stale',
      board(
        `{ finding: rail-low, at: rails.up, ${because} }
  - { finding: rail-low, at: rails.up.needs.voltage, ${because} }
#              ^^^^^^^^ warning waiver-stale: another waiver takes it`.replace('takes it', 'takes the same'),
      ),
    );
    checkRule(
      'waiver-stale',
      board(`{ finding: rail-low, at: rails.up, because: ' ' }
#                            ^^^^^^^^ warning waiver-stale: it gives no reason`),
    );
    checkRule(
      'waiver-stale',
      board(`{ finding: unknown-key, at: rails.up, ${because} }
#                               ^^^^^^^^ warning waiver-stale: cannot be waived`),
    );
  });
  it('is silent for waivers that fit', () => {
    checkSilent('waiver-stale', board(`{ finding: rail-low, at: rails.up, ${because} }`));
  });
});
