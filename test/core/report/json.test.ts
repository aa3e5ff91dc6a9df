import { describe, expect, it } from 'vitest';
import { analyse, type Report } from '../../../core/index';

const text = `board: Bench lamp
supplies:
  lab: { voltage: 4.8..5.2 V, current: 1 A }
parts:
  chips:
    plain:
      pins: { high-resistance: 20 ohm, low-resistance: 20 ohm, absolute: 40 mA }
      groups: { port A: { pins: [A1, A2], source: 60 mA, sink: 60 mA } }
      total: { source: 100 mA, sink: 100 mA }
chips:
  mcu: { part: plain, rail: v5, draws: 1 mA }
clocks:
  tick: { pin: mcu.A1, frequency: 100 kHz, duty: 50 % }
rails:
  v5: { supply: lab }
  up:
    pump:
      topology: doubler
      input: v5
      drive: tick
      diode: schottky-signal
      flying: { value: 1 uF, kind: x7r }
      reservoir: { value: 10 uF, kind: x7r }
    needs: { voltage: 9.5..10 V }
    loads: { lamp: { current: 2 mA, in: [lit] }, sense: 100 kohm }
modes: { dark: { share: 75 % }, lit: { share: 25 % } }
`;

const report: Report = analyse(text, { file: 'lamp.rails.yaml' }).report;
const up = report.rails['up'];

describe('report', () => {
  it('has the sections and fields that outside readers rely on', () => {
    expect(Object.keys(report)).toEqual([
      'format',
      'tool',
      'file',
      'board',
      'rails',
      'pins',
      'groups',
      'chips',
      'clocks',
      'drivers',
      'supplies',
      'parts',
      'bench',
      'balance',
      'findings',
      'waived',
    ]);
    expect(report).toMatchObject({ format: 1, file: 'lamp.rails.yaml', board: 'Bench lamp' });
    expect(Object.keys(report.rails)).toEqual(['v5', 'up']);
    expect(Object.keys(up ?? {})).toEqual([
      'voltage',
      'ripple',
      'current',
      'inputCurrent',
      'power',
      'efficiency',
      'openCircuit',
      'outputResistance',
      'headroom',
      'drops',
      'startTime',
      'dischargeTime',
      'storedEnergy',
      'modes',
    ]);
    expect(Object.keys(report.parts)).toEqual(['up.flying[0]', 'up.reservoir', 'up.diode[0]', 'up.diode[1]']);
    expect(Object.keys(report.pins)).toEqual(['mcu.A1']);
    expect(Object.keys(report.groups)).toEqual(['mcu.port A']);
  });

  it('carries bands as three plain numbers', () => {
    expect(report.rails['v5']?.voltage).toEqual({ min: 4.8, typical: 5, max: 5.2 });
    expect(report.clocks['tick']).toEqual({
      frequency: { min: 1e5, typical: 1e5, max: 1e5 },
      duty: { min: 0.5, typical: 0.5, max: 0.5 },
      high: 5,
      low: 0,
    });
  });

  it('says null, never 0, for what is not computed', () => {
    expect(report.rails['v5']).toMatchObject({ startTime: null, dischargeTime: null });
    expect(report.supplies['lab']?.life).toBeNull();
    expect(report.rails['v5']?.ripple).toBeNull();
    expect(report.findings.some(({ code }) => code === 'not-computed')).toBe(true);
  });

  it('follows switch-on and switch-off', () => {
    // Ohm's law at the first edge: no more than 5 V over the pin's 20 ohm, and with the diode's drop not far below.
    const inrush = report.pins['mcu.A1']?.inrushPeak ?? Number.NaN;
    expect(inrush).toBeLessThan(5 / 20);
    expect(inrush).toBeGreaterThan(0.7 * (5 / 20));
    expect(up?.startTime).toBeGreaterThan(1e-5);
    expect(up?.startTime).toBeLessThan(1e-2);
    // 2 mA out of 10 uF (10 % tolerance apart) from the rail's voltage to 1 V: C V / I.
    const expected = (10e-6 * (up!.modes['lit']!.voltage! - 1)) / 2.05e-3;
    expect(up?.dischargeTime).toBeGreaterThan(0.9 * expected);
    expect(up?.dischargeTime).toBeLessThan(1.1 * expected);
  });

  it('agrees with the laws of circuits', () => {
    // Energy and charge balance; the load line passes through the operating point; the drops lead to the voltage.
    expect(report.balance).toBeLessThan(1e-3);
    const lit = up?.modes['lit'];
    const typical = up?.voltage?.typical ?? Number.NaN;
    expect(lit?.voltage).toBe(typical);
    const heaviest = lit?.current ?? Number.NaN;
    const lineDrop = heaviest * (up?.outputResistance ?? Number.NaN);
    expect((up?.openCircuit ?? Number.NaN) - lineDrop).toBeCloseTo(typical, 6);
    const drops = (up?.drops ?? []).reduce((sum, { volts }) => sum + volts, 0);
    expect(10 - drops).toBeCloseTo(typical, 3);
    expect(heaviest).toBeCloseTo(2e-3 + typical / 100e3, 9);
    expect(report.pins['mcu.A1']?.sourceAverage).toBeCloseTo(heaviest, 6);
    // 75 % of the time only the resistor draws.
    const dark = up?.modes['dark'];
    expect(up?.current).toBeCloseTo(0.75 * (dark?.current ?? Number.NaN) + 0.25 * heaviest, 9);
    expect(up?.headroom).toBeCloseTo((up?.voltage?.min ?? Number.NaN) - 9.5, 9);
  });

  it('places findings by line, column and offset, all from the file', () => {
    const low = report.findings.find(({ code }) => code === 'rail-low');
    const offset = text.indexOf('9.5..10 V');
    expect(low?.range).toEqual({
      start: { line: 24, column: 23, offset },
      end: { line: 24, column: 32, offset: offset + 9 },
    });
    expect(low).toMatchObject({
      severity: 'error',
      at: 'rails.up.needs.voltage',
      expected: 'at least 9.5 V',
      fixes: [],
    });
    const offsets = report.findings.map(({ range }) => range.start.offset);
    expect(offsets).toEqual([...offsets].sort((a, b) => a - b));
  });

  it('survives JSON without loss', () => {
    expect(JSON.parse(JSON.stringify(report))).toEqual(report);
  });

  it('keeps names that mean something to JavaScript', () => {
    const odd = analyse(
      'supplies: { lab: { voltage: 5 V } }\nrails: { __proto__: { supply: lab }, constructor: { supply: lab } }\n',
      {
        file: 'x',
      },
    ).report;
    expect(Object.keys(odd.rails)).toEqual(['__proto__', 'constructor']);
  });

  it('is empty but whole for a text that is no board', () => {
    for (const broken of ['', ': : :', '[1, 2]', 'rails: 5', '\u0000']) {
      const { report: empty } = analyse(broken, { file: 'x' });
      expect(empty.rails).toEqual({});
      expect(empty.balance).toBeNull();
    }
  });

  it('has the life of a battery in seconds, and null for what does not run down', () => {
    const { supplies } = analyse(
      `supplies: { cell: { voltage: 3 V, capacity: 1 Ah }, lab: { voltage: 5 V } }
rails: { vb: { supply: cell, loads: { x: 10 mA } }, v5: { supply: lab, loads: { x: 10 mA } } }
`,
      { file: 'rails.yaml' },
    ).report;
    // 1 Ah over 10 mA: 100 h.
    expect(supplies['cell']?.life).toBeCloseTo(360_000, 6);
    expect(supplies['lab']?.life).toBeNull();
  });
});
