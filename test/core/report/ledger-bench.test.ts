import { describe, expect, it } from 'vitest';
import { analyse, ledgerText } from '../../../core/index';
import { bench } from '../../support/bench-board';

const board = `${bench}  up:
    pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: { value: 22 nF +-20 %, kind: film }, reservoir: { value: 10 uF +-10 %, kind: film, esr: 5 mohm } }
    loads: { lamp: 5 mA }
  stray: { pump: { topology: ladder, drive: tick, diode: schottky-signal, flying: 1 uF } }
bench:
  - { rail: up, load: 1 mA, voltage: 9.0 V, ripple: 30 mV }
  - { rail: up, load: 4.7 kohm, voltage: 8.1 V }
  - { rail: stray, load: 1 mA, voltage: 9 V }
`;

function section(width: number): string[] {
  const lines = ledgerText(analyse(board, { file: 'rails.yaml' }), { colour: false, width }).split('\n');
  const from = lines.indexOf('Bench');
  return lines.slice(from, lines.indexOf('', from));
}

describe('bench section of the ledger', () => {
  it('sets each measurement beside its prediction', () => {
    const lines = section(120);
    expect(lines[1]).toMatch(/rail +load +measured +predicted +deviation +verdict$/);
    expect(lines[2]).toMatch(
      /^ {2}✓ {2}up +1 mA +9 V +8\.\d+\.\.9\.0\d\.\.9\.1\d V +\d+ mV below +inside the band$/,
    );
    expect(lines[3]).toMatch(/^ {2}! +ripple +30 mV .* mV above +\d+ mV outside the band$/);
    expect(lines[4]).toMatch(/^ {2}! {2}up +4\.7 kohm +8\.1 V /);
    expect(lines[5]).toMatch(/^ +stray +1 mA +9 V +\? +not compared$/);
  });

  it('tells beneath what would explain it, and what was not compared', () => {
    const notes = section(120).slice(6).join('\n');
    expect(notes).toMatch(
      /up at 1 mA: Within tolerance this would explain the voltage: flying capacitor at /,
    );
    expect(notes).toMatch(/stray at 1 mA is not compared: /);
  });

  it('keeps its table within 100 columns', () => {
    for (const line of section(100).slice(0, 6)) expect([...line].length, line).toBeLessThanOrEqual(100);
  });

  it('is not there without entries', () => {
    expect(ledgerText(analyse(bench, { file: 'x' }), { colour: false, width: 100 })).not.toContain('Bench');
  });
});
