/**
 * A sound file of every section becomes the board it describes. Outside source: the figures in the text itself, and
 * ESR = tan delta / (2 pi f C), the definition of the loss factor.
 */
import { describe, expect, test } from 'vitest';
import { checkFindings } from '../../support/check-findings';
import { expectNear } from '../../support/near';

const text = `board: "Weir gauge, rev B"   # title
conditions: { ambient: -20..45 degC }
supplies:
  pack: { battery: li-ion, cells: 2, current: 500 mA }
  port: { standard: port-a }
  bench: { voltage: 5 V ±1 % }
chips:
  mcu:
    part: mcu-a
    rail: v3
    draws: { active: 24 mA, asleep: 0.4 mA }
    pins:
      GP15: { strength: 12mA, sources: 1 mA }
      GP2:
  radio: { rail: v3, draws: 3 mA }
clocks:
  tick: { pin: mcu.GP15, frequency: 100 kHz, duty: 45..55 % }
rails:
  vbat: { supply: pack }
  v3: { regulator: { from: vbat, output: 3.3 V ±2 %, ground: 50 uA } }
  v6:
    pump:
      topology: doubler
      input: v3
      drive: tick
      diode: schottky-a
      flying: { value: 1 uF ±10 %, kind: x7r }
      reservoir: { value: 100 uF, kind: aluminium }
      series: 4R7
    needs: { voltage: 5.2..6.5 V, ripple: 30 mV }
    loads:
      bridge: { current: "= 2 * 0.6 mA", in: [active] }
      reference: 47k
    bleeder: 100 kohm
  vneg:
    pump:
      topology: inverter
      drive: tick
      diode: [silicon-a, { saturation: 10 nA, ideality: 1.05, resistance: 1 ohm, kind: schottky }]
      flying: [{ value: 1 uF, kind: x7r, esr: 50 mohm }]
      reservoir: { value: 10 uF, kind: x7r }
    needs: { voltage: -3.1..-2.0 V }
    loads: { bias: 0.2 mA }
modes:
  asleep: { share: 98 % }
  active: { share: 0.02 }
`;
const reading = checkFindings(text);
const { board } = reading;
const v6 = board.rails.get('v6');
const pump = v6?.origin?.kind === 'pump' ? v6.origin.pump : undefined;
const negative = board.rails.get('vneg')?.origin;

test('title and conditions', () => {
  expect(board.title).toBe('Weir gauge, rev B');
  expect(text.slice(board.titleSpan!.start, board.titleSpan!.end)).toBe('Weir gauge, rev B');
  expectNear(board.ambient.min, 253.15, 1e-9);
  expectNear(board.ambient.max, 318.15, 1e-9);
});

test('supplies', () => {
  expect(board.supplies.get('pack')).toMatchObject({
    battery: { ref: { name: 'li-ion' }, data: { key: 'li-ion' } },
    cells: { typical: 2 },
    current: { typical: 0.5, unit: 'A' },
    path: 'supplies.pack',
  });
  expect(board.supplies.get('port')?.standard?.data?.voltage.typical).toBe(5);
  expectNear(board.supplies.get('bench')?.voltage?.max, 5.05, 1e-9);
});

test("chips: a drive setting goes by the part's own name of it", () => {
  const mcu = board.chips.get('mcu');
  expect(mcu?.pins.get('GP15')).toMatchObject({ strength: { name: '12 mA' }, sources: { typical: 1e-3 } });
  expect([...(mcu?.pins.keys() ?? [])]).toEqual(['GP15', 'GP2']);
  expect(mcu?.draws.map(({ mode, current }) => [mode?.name, current.typical])).toEqual([
    ['active', 0.024],
    ['asleep', 0.0004],
  ]);
  expect(board.chips.get('radio')?.draws).toMatchObject([{ current: { typical: 3e-3 } }]);
});

test('clocks', () => {
  expect(board.clocks.get('tick')).toMatchObject({
    pin: { chip: 'mcu', pin: 'GP15' },
    frequency: { typical: 1e5 },
    duty: { min: 0.45, max: 0.55 },
  });
});

describe('rails', () => {
  test('their origins', () => {
    const kinds = [...board.rails.values()].map(({ name, origin }) => [name, origin?.kind]);
    expect(kinds).toEqual([
      ['vbat', 'supply'],
      ['v3', 'regulator'],
      ['v6', 'pump'],
      ['vneg', 'pump'],
    ]);
  });
  test('a pump', () => {
    expect(pump).toMatchObject({
      topology: 'doubler',
      polarity: 'positive',
      input: { name: 'v3' },
      drive: [{ name: 'tick' }],
      flying: [{ path: 'rails.v6.pump.flying', toleranceGiven: true, kind: { assumed: false } }],
      reservoir: { toleranceGiven: false },
      diodes: [{ path: 'rails.v6.pump.diode', data: { key: 'schottky-a' } }],
      series: { typical: 4.7 },
    });
    expect(negative?.kind === 'pump' && negative.pump.polarity).toBe('negative');
  });
  test("a kind's typical ESR: as stated, or from its loss factor", () => {
    expect(pump?.flying[0]?.esr?.typical).toBe(0.01);
    // 100 uF with tan delta 0.16 at 120 Hz.
    expectNear(pump?.reservoir?.esr?.typical, 2.122, 1e-3);
    expect(pump?.reservoir?.esr?.origin.kind).toBe('derived');
  });
  test('diodes and capacitors in place and in lists', () => {
    if (negative?.kind !== 'pump') throw new Error('no pump');
    expect(
      negative.pump.diodes.map(({ path, data }) => [path, data?.saturation.typical, data?.kind]),
    ).toEqual([
      ['rails.vneg.pump.diode[0]', 2.5e-9, 'silicon'],
      ['rails.vneg.pump.diode[1]', 1e-8, 'schottky'],
    ]);
    expect(negative.pump.flying).toMatchObject([
      { path: 'rails.vneg.pump.flying[0]', esr: { typical: 0.05 } },
    ]);
  });
  test('loads by their unit, and expressions', () => {
    expect(v6?.loads.get('bridge')).toMatchObject({
      current: { typical: 1.2e-3 },
      modes: [{ name: 'active' }],
    });
    expect(v6?.loads.get('reference')).toMatchObject({ resistance: { typical: 47e3 } });
    expect(v6?.bleeder?.typical).toBe(1e5);
  });
  test('needs', () => {
    expect(v6?.needs).toMatchObject({ voltage: { min: 5.2, max: 6.5 }, ripple: { typical: 0.03 } });
    expect(board.rails.get('vneg')?.needs?.voltage).toMatchObject({ min: -3.1, max: -2 });
  });
});

test('modes', () => {
  expect([...board.modes.values()].map(({ name, share }) => [name, share?.typical])).toEqual([
    ['asleep', 0.98],
    ['active', 0.02],
  ]);
});

describe('for features', () => {
  const at = (word: string) => text.indexOf(word) + 1;
  test('quantities know their place', () => {
    const found = reading.quantityAt(at('45..55 %'));
    expect(found).toMatchObject({ path: 'clocks.tick.duty', expression: false, figure: { typical: 0.5 } });
    expect(text.slice(found!.span.start, found!.span.end)).toBe('45..55 %');
    expect(reading.quantityAt(at('= 2 * 0.6'))).toMatchObject({
      expression: true,
      figure: { typical: 1.2e-3 },
    });
  });
  test('names know what they point to', () => {
    const found = reading.referenceAt(at('mcu.GP15'));
    expect(found).toMatchObject({ to: 'chips', name: 'mcu' });
    expect(text.slice(found!.target!.start, found!.target!.end)).toBe('mcu');
    expect(reading.referenceAt(text.indexOf('GP15, frequency'))).toMatchObject({
      to: 'pin',
      name: 'mcu.GP15',
    });
    expect(reading.referenceAt(at('schottky-a'))).toMatchObject({ to: 'part', name: 'schottky-a' });
  });
  test('the key path at an offset', () => {
    expect(reading.nodeAt(at('4R7'))).toMatchObject({ path: ['rails', 'v6', 'pump', 'series'], on: 'value' });
  });
});

test('the same file with CR LF and a byte-order mark reads the same', () => {
  const crlf = checkFindings(`\ufeff${text.replaceAll('\n', '\r\n')}`);
  expect(crlf.text.startsWith('board')).toBe(true);
  const figures = (all: typeof reading) =>
    all.quantities.map(({ path, figure }) => [path, figure.min, figure.max]);
  expect(figures(crlf)).toEqual(figures(reading));
  for (const { span } of crlf.quantities)
    expect(crlf.text.slice(span.start, span.end)).toMatch(/^\S.*\S$|^\d$/);
});

test('the same file through an anchor and a merge key', () => {
  const { board: merged } = checkFindings(`
supplies: { p: { voltage: 5 V } }
chips: { mcu: { part: mcu-b, rail: v5 } }
clocks: { tick: { pin: mcu.P1, frequency: 10 kHz, duty: 50 % } }
rails:
  v5: { supply: p }
  a:
    pump: &pump { topology: inverter, drive: tick, diode: silicon-a, flying: &c { value: 1 uF, kind: x7r }, reservoir: *c }
  b:
    pump: { <<: *pump, series: 10 ohm }
`);
  const origin = merged.rails.get('b')?.origin;
  expect(origin?.kind === 'pump' && origin.pump).toMatchObject({
    topology: 'inverter',
    series: { typical: 10 },
    flying: [{ path: 'rails.b.pump.flying', value: { typical: 1e-6 } }],
    reservoir: { path: 'rails.b.pump.reservoir' },
  });
});
