/**
 * The file's own parts: new ones, changed ones of the catalogue, figures in place, and what the tool fills in.
 */
import { describe, expect, test } from 'vitest';
import { checkFindings } from '../../support/check-findings';

const pumped = (rest: string) => `
supplies: { p: { voltage: 5 V } }
chips: { mcu: { part: mcu-b, rail: v5 } }
clocks: { tick: { pin: mcu.P1, frequency: 10 kHz, duty: 50 % } }
${rest}`;

describe('parts', () => {
  const { board, catalogue } = checkFindings(
    pumped(`
rails:
  v5: { supply: p }
  v9:
    pump: { topology: doubler, input: v5, drive: tick, diode: mine, flying: { value: 1 uF, kind: stiff }, reservoir: { value: 1 uF, kind: x7r } }
parts:
  chips:
    mcu-a: { pins: { high-resistance: 30..33 ohm, strengths: { 2 mA: { low-resistance: 150 ohm } } }, total: { sink: 100 mA } }
    own:
      source: sheet 7
      pins: { low: [{ current: 4 mA, voltage: 0.4 V, supply: 3.3 V }], absolute: 20 mA }
      pin: { P7: { recommended: 3 mA } }
      groups: { a: { pins: [P1, P2], source: 60 mA } }
  diodes:
    mine: { saturation: 20 nA, ideality: 1.1, resistance: 1 ohm, kind: schottky, source: measured }
    silicon-a: { resistance: 2 ohm }
  capacitors:
    stiff: { tolerance: ±5 %, esr: 20 mohm }
    aluminium: { loss: 0.2 }
  transistors: { t: { polarity: npn, saturation: 1 fA, gain: 100 } }
  mosfets: { m: { channel: n, threshold: 1 V, on-resistance: 1 ohm } }
  gates: { g: { high-resistance: 9 ohm, supply: 2..6 V } }
  timers: { t: { high-drop: 1 V } }
`),
  );
  const find = <T extends { key: string }>(list: readonly T[], key: string) =>
    list.find((entry) => entry.key === key);
  test('a new one is used by its key', () => {
    const origin = board.rails.get('v9')?.origin;
    if (origin?.kind !== 'pump') throw new Error('no pump');
    expect(origin.pump.diodes[0]?.data).toMatchObject({
      key: 'mine',
      source: 'measured',
      saturation: { typical: 2e-8, origin: { kind: 'file', note: 'measured' } },
    });
    expect(origin.pump.flying[0]?.esr?.typical).toBe(0.02);
    expect(origin.pump.flying[0]?.kind.data?.tolerance).toMatchObject({ min: -0.05, max: 0.05 });
  });
  test('one of the catalogue keeps what is not given', () => {
    expect(find(catalogue.diodes, 'silicon-a')).toMatchObject({
      resistance: { typical: 2 },
      saturation: { typical: 2.5e-9, origin: { kind: 'data sheet' } },
      title: 'Silicon diode A',
    });
    expect(find(catalogue.chips, 'mcu-a')).toMatchObject({
      pins: {
        highResistance: { min: 30, max: 33 },
        lowResistance: { typical: 40 },
        strengths: {
          '2 mA': { highResistance: { typical: 200 }, lowResistance: { typical: 150 } },
          '12 mA': { highResistance: { typical: 50 } },
        },
      },
      groups: [{ name: 'bank' }],
      total: { sink: { typical: 0.1 } },
    });
    expect(find(catalogue.capacitors, 'aluminium')).toMatchObject({
      loss: { typical: 0.2 },
      polarised: true,
    });
  });
  test('chips have test points, pins of their own and groups', () => {
    expect(find(catalogue.chips, 'own')).toMatchObject({
      source: 'sheet 7',
      pins: { low: [{ current: { typical: 4e-3 }, voltage: { typical: 0.4 }, supply: { typical: 3.3 } }] },
      pin: { P7: { recommended: { typical: 3e-3 } } },
      groups: [{ name: 'a', pins: ['P1', 'P2'], source: { typical: 0.06 } }],
    });
  });
  test('new ones of the other families are in the catalogue too', () => {
    expect(find(catalogue.transistors, 't')?.gain.typical).toBe(100);
    expect(find(catalogue.mosfets, 'm')?.onResistance.typical).toBe(1);
    expect(find(catalogue.gates, 'g')?.output.highResistance?.typical).toBe(9);
    expect(find(catalogue.timers, 't')?.highDrop?.typical).toBe(1);
  });
});

test('figures left out are typical ones, and named', () => {
  const { board } = checkFindings(
    pumped(`
rails:
  v5: { supply: p }
  v9:
    pump:
      topology: inverter
      drive: tick
      diode: { saturation: 20 nA, kind: schottky }
      #^^^^ assumed: \`ideality\` and \`resistance\` are left out here: the typical figures of \`schottky-a\` stand in.
      flying: { value: 1 uF, kind: x7r }
      reservoir: { value: 1 uF, kind: x7r }
`),
  );
  const origin = board.rails.get('v9')?.origin;
  expect(origin?.kind === 'pump' && origin.pump.diodes[0]?.data).toMatchObject({
    ideality: { typical: 1.05, origin: { kind: 'assumed', note: 'as schottky-a' } },
    resistance: { typical: 2 },
  });
});

test('figures that nothing can stand in for', () => {
  checkFindings(`
rails: {}
parts:
  diodes:
    dd: { ideality: 1.05 }
    #^ missing-key: \`saturation\` is missing
  capacitors:
    kk: { esr: 1 ohm }
    #^ missing-key: \`tolerance\` is missing
  chips:
    cc: { groups: { g: { source: 1 A } } }
    #               ^ missing-key: \`pins\` is missing
`);
});

test('a kind left out is ceramic up to 22 uF, aluminium above, said once', () => {
  const { board } = checkFindings(
    pumped(`
rails:
  v5: { supply: p }
  v9:
    pump: { topology: inverter, drive: tick, diode: silicon-a, flying: 22 uF, reservoir: 47 uF }
    #                                                                  ^^^^^ assumed: taken as \`x7r\`
`),
  );
  const origin = board.rails.get('v9')?.origin;
  if (origin?.kind !== 'pump') throw new Error('no pump');
  const { flying, reservoir } = origin.pump;
  expect([flying[0]?.kind, reservoir?.kind].map((kind) => [kind?.data?.key, kind?.assumed])).toEqual([
    ['x7r', true],
    ['aluminium', true],
  ]);
});

test('a duty left out is half of the period, and said', () => {
  const { board } = checkFindings(`
chips: { mcu: { part: mcu-b } }
clocks: { tick: { pin: mcu.P1, frequency: 10 kHz } }
#         ^^^^ assumed: high for 50 % of its period
rails: {}
`);
  expect(board.clocks.get('tick')?.duty).toMatchObject({ typical: 0.5, origin: { kind: 'assumed' } });
});

test('an ambient left out is 25 degC', () => {
  expect(checkFindings('rails: {}\n').board.ambient).toMatchObject({
    typical: 298.15,
    origin: { kind: 'assumed' },
  });
});
