/**
 * Fixes as a user gets them: the finding is there, its preferred fix is applied to the text, and it is gone.
 */
import { describe, expect, it } from 'vitest';
import { analyse, applyEdits, type FindingCode } from '../../../core/index';
import { bench } from '../../support/bench-board';

function cured(code: FindingCode, text: string, line: string | RegExp): void {
  const { findings } = analyse(text, { file: 'rails.yaml' });
  const finding = findings.find((each) => each.code === code && each.fixes?.length);
  const fix = finding?.fixes?.find(({ preferred }) => preferred);
  expect(fix, `${code} with a fix among ${findings.map((each) => each.code).join(', ')}`).toBeDefined();
  const after = applyEdits(text, fix!.edits);
  expect(after).toMatch(line);
  const left = analyse(after, { file: 'rails.yaml' }).findings;
  expect(left.filter((each) => each.code === code && each.at === finding!.at)).toEqual([]);
  expect(left.filter(({ severity }) => severity === 'error')).toEqual([]);
}

const pump = (change: { diode?: string; flying?: string; reservoir?: string; rest?: string }) =>
  `pump: { topology: doubler, input: v5, drive: tick, diode: ${change.diode ?? 'schottky-signal'}, flying: ${change.flying ?? '{ value: 1 uF, kind: film }'}, reservoir: ${change.reservoir ?? '{ value: 10 uF, kind: film }'}${change.rest ?? ''} }`;

describe('fixes', () => {
  it('capacitor-rating', () => {
    const text = `${bench}  up:\n    ${pump({ reservoir: '{ value: 10 uF, kind: aluminium, rated: 10 V }' })}\n    loads: { x: 2 mA }\n`;
    cured('capacitor-rating', text, /rated: 16 V/);
  });
  it('capacitor-derated', () => {
    const text = `${bench}  up:\n    ${pump({ reservoir: '{ value: 10 uF, kind: x5r, rated: 10 V } # small' })}\n    loads: { x: 2 mA }\n`;
    cured('capacitor-derated', text.replace(' # small }', ' } # small'), /rated: 25 V \} \} # small/);
  });
  it('diode-reverse and diode-current', () => {
    const parts = bench.replace(
      '  chips:\n',
      '  diodes: { weak: { kind: schottky, saturation: 20 nA, ideality: 1.03, resistance: 1 ohm, reverse: 3 V, average: 1 mA, peak: 5 mA } }\n  chips:\n',
    );
    const text = `${parts}  up:\n    ${pump({ diode: 'weak' })}\n    loads: { x: 2 mA }\n`;
    cured('diode-reverse', text, /diode: schottky-signal/);
    cured('diode-current', text, /diode: schottky-signal/);
  });
  it('driver-shared-base', () => {
    const text = `${bench.replace('rails:\n', 'drivers:\n  amp: { input: tick, rail: v5, push-pull: { npn: npn-small-signal, pnp: pnp-small-signal, shared-base: 1 kohm } }\nrails:\n')}  up:\n    ${pump({}).replace('drive: tick', 'drive: amp')}\n    loads: { x: 2 mA }\n`;
    cured('driver-shared-base', text, /base: \{ npn: 1 kohm, pnp: 1 kohm \}/);
  });
  it('pin-peak puts a resistor in, or makes the present one larger', () => {
    const small = { flying: '{ value: 47 nF, kind: film, esr: 10 mohm }' };
    cured(
      'pin-peak',
      `${bench}  up:\n    ${pump(small)}\n    loads: { x: 5 mA }\n`,
      /diode: schottky-signal, series: \d+ ohm, flying/,
    );
    cured(
      'pin-peak',
      `${bench}  up:\n    ${pump({ ...small, rest: ', series: 1 ohm' })}\n    loads: { x: 5 mA }\n`,
      /series: \d\d ohm \}/,
    );
  });
  it('pin-over-recommended chooses the drive setting', () => {
    const board = (pins: string) => `
supplies: { lab: { voltage: 3.3 V } }
chips: { mcu: { part: rp2040, rail: v3${pins} } }
clocks: { tick: { pin: mcu.GP2, frequency: 100 kHz, duty: 50 % } }
rails:
  v3: { supply: lab }
  up:
    pump: { topology: doubler, input: v3, drive: tick, diode: schottky-signal, flying: { value: 1 uF, kind: film }, reservoir: { value: 10 uF, kind: film } }
    loads: { x: 3 mA }
`;
    cured(
      'pin-over-recommended',
      board(''),
      /part: rp2040, pins: \{ GP2: \{ strength: (8|12) mA \} \}, rail/,
    );
    cured('pin-over-recommended', board(', pins: { GP2: { strength: 2 mA } }'), /strength: (8|12) mA/);
    cured(
      'pin-over-recommended',
      board(', pins: { GP2: { sources: 0.1 mA } }'),
      /GP2: \{ strength: (8|12) mA, sources/,
    );
    cured(
      'pin-over-recommended',
      board(', pins: { GP7: { sources: 0.1 mA } }'),
      /pins: \{ GP2: \{ strength: (8|12) mA \}, GP7/,
    );
  });
});
