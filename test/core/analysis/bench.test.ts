import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { analyse } from '../../../core/index';
import { expectNear } from '../../support/near';

/** Pins of little resistance and sharp diodes, so that the slow limit rules; tolerances only where a test puts them. */
function board(rails: string, bench: string, frequency = '20 kHz') {
  const text = `supplies:
  lab: { voltage: 5 V }
  soft: { voltage: 5 V +-2 %, resistance: 1..2 ohm }
parts:
  chips: { plain: { pins: { high-resistance: 0.5 ohm, low-resistance: 0.5 ohm } } }
  diodes: { sharp: { saturation: 1 nA, ideality: 0.5, resistance: 10 mohm, kind: silicon } }
chips: { mcu: { part: plain, rail: v5, draws: 1 mA } }
clocks: { a: { pin: mcu.P1, frequency: ${frequency}, duty: 50 % } }
rails:
  v5: { supply: lab }
${rails}bench:
${bench}`;
  const { report, board: analysis, findings } = analyse(text, { file: 'rails.yaml' });
  return { report, analysis, findings };
}

const pump = (flying: string, reservoir: string, topology = 'doubler, input: v5') =>
  `pump: { topology: ${topology}, drive: a, diode: sharp, flying: { value: ${flying}, kind: film, esr: 10 mohm }, reservoir: { value: ${reservoir}, kind: film, esr: 1 mohm } }`;

/**
 * A doubler in the slow limit, average output and ripple: Dickson, IEEE JSSC SC-11(3), 1976 (from memory: confirm),
 * with the mean of a finite reservoir and the effective diode drop by charge balance, F1.1 to F1.8 of the physics
 * sheet that the tests of the closed forms check.
 */
function doubler(amps: number, flying: number, reservoir: number, frequency = 20e3) {
  const duty = 0.5;
  const slope = (0.5 * 1.380649e-23 * 298.15) / 1.602176634e-19;
  const drop = (farads: number) => {
    const effective =
      ((slope * farads) / (duty / frequency)) * -Math.expm1(-amps / frequency / (slope * farads));
    return slope * Math.log(effective / 1e-9 + 1);
  };
  const drops = drop(flying) + drop((flying * reservoir) / (flying + reservoir));
  const mean =
    1 / (frequency * flying) +
    ((1 - duty) ** 2 / reservoir - duty ** 2 / (flying + reservoir)) / (2 * frequency);
  return {
    voltage: 10 - drops - amps * mean,
    ripple: (amps / frequency) * ((1 - duty) / reservoir + duty / (flying + reservoir)),
  };
}

describe('bench entries of a pump', () => {
  it('are predicted at their own load by the formula of the doubler, whatever the rail carries', () => {
    const up = `  up:\n    ${pump('1 uF', '10 uF')}\n    loads: { heavy: 40 mA }\n`;
    const formula = doubler(20e-3, 1e-6, 10e-6);
    const { report } = board(
      up,
      `  - { rail: up, load: 20 mA, voltage: ${formula.voltage} V, ripple: 40 mV }\n`,
    );
    const entry = report.bench[0]!;
    expectNear(entry.predicted.voltage!.typical, formula.voltage, 3e-3);
    // Between the ripple of the slow limit (F1.5) and, where resistance rules, (1 - D) I / (f C) (F1.6).
    expect(entry.predicted.ripple!.typical).toBeLessThan(formula.ripple);
    expect(entry.predicted.ripple!.typical).toBeGreaterThan((0.5 * 20e-3) / (20e3 * 10e-6));
    expect(entry).toMatchObject({ rail: 'up', load: 20e-3, unit: 'A', measured: { ripple: 40e-3 } });
    expect(entry.deviation.voltage).toBeCloseTo(formula.voltage - entry.predicted.voltage!.typical, 9);
    expect(report.rails['up']!.voltage!.typical).toBeLessThan(formula.voltage - 0.4);
  });

  it('a flying capacitor 20 % small is named, with its value', () => {
    // The measured value is the formula's with 0.8 uF; the diodes and all else are as in the file.
    const up = `  up: { ${pump('1 uF +-30 %', '10 uF')} }\n`;
    const { voltage } = doubler(20e-3, 0.8e-6, 10e-6);
    const { report, findings } = board(up, `  - { rail: up, load: 20 mA, voltage: ${voltage} V }\n`);
    const entry = report.bench[0]!;
    expect(entry.inside).toBe(true);
    expect(entry.explained).toHaveLength(1);
    expect(entry.explained[0]).toMatchObject({
      by: 'flying capacitor',
      at: 'rails.up.pump.flying',
      unit: 'F',
      typical: 1e-6,
      explains: 'voltage',
    });
    expectNear(entry.explained[0]!.value, 0.8e-6, 0.02);
    expect(findings.filter(({ code }) => code === 'bench-disagrees')).toEqual([]);
  });

  it('two capacitors, from voltage and ripple together', () => {
    const up = `  up: { ${pump('1 uF +-30 %', '10 uF +-30 %')} }\n`;
    const { report } = board(up, '  - { rail: up, load: 20 mA, voltage: 8 V }\n');
    const model = report.bench[0]!.predicted;
    // Only what the formula says about the change is taken from it, so that a few percent of ripple do not matter.
    const before = doubler(20e-3, 1e-6, 10e-6);
    const after = doubler(20e-3, 0.85e-6, 8e-6);
    const volts = model.voltage!.typical + after.voltage - before.voltage;
    const ripple = (model.ripple!.typical * after.ripple) / before.ripple;
    const second = board(up, `  - { rail: up, load: 20 mA, voltage: ${volts} V, ripple: ${ripple} V }\n`)
      .report.bench[0]!;
    expect(second.together).toBe(true);
    const values = new Map(second.explained.map(({ by, value }) => [by, value]));
    expectNear(values.get('flying capacitor'), 0.85e-6, 0.03);
    expectNear(values.get('reservoir capacitor'), 8e-6, 0.03);
    expect(second.explained.every(({ explains }) => explains === 'both')).toBe(true);
  });

  it('two where one does not do, all where two do not, by the same share', () => {
    // R = 1/(f C): 10 % of C and 10 % of f move 10 mA through 50 ohm by 50 mV each (1/0.9 times as much on the way down).
    const up = `  up: { ${pump('1 uF +-10 %', '10 uF')} }\n`;
    const at = (volts: number) =>
      board(up, `  - { rail: up, load: 10 mA +-1 %, voltage: ${volts} V }\n`, '20 kHz +-10 %');
    const { min, typical } = at(8).report.bench[0]!.predicted.voltage!;
    const fall = doubler(10e-3, 1e-6, 10e-6).voltage - doubler(10.1e-3, 0.9e-6, 10e-6, 18e3).voltage;
    expectNear(typical - min, fall, 0.02);
    const pair = at(typical - 0.08).report.bench[0]!;
    expect(pair.together).toBe(true);
    expect(pair.explained.map(({ by }) => by).sort()).toEqual(['a frequency', 'flying capacitor']);
    // 0.5 V / x^2 = 0.5 V + 80 mV.
    for (const { value, typical: middle } of pair.explained)
      expectNear(value / middle, 0.5 / Math.sqrt(0.5 * 0.58), 0.01);
    const all = at(min + 2e-3);
    expect(all.report.bench[0]).toMatchObject({ inside: true, explained: [] });
    const share = all.analysis.bench()[0]!.explanation!().all!;
    expect(share).toBeGreaterThan(0.95);
    expect(share).toBeLessThan(1);
  });

  it('nothing is to be explained where a meter could not tell', () => {
    const up = `  up: { ${pump('1 uF +-30 %', '10 uF')} }\n`;
    const typical = board(up, '  - { rail: up, load: 1 mA, voltage: 9 V }\n').report.bench[0]!.predicted
      .voltage!.typical;
    const near = board(up, `  - { rail: up, load: 1 mA, voltage: ${typical * 1.0005} V }\n`);
    expect(near.report.bench[0]).toMatchObject({ inside: true, explained: [] });
    // A reading with a band of its own knows better.
    const sharp = board(up, `  - { rail: up, load: 1 mA, voltage: ${typical * 1.0005} V +-0.1 mV }\n`);
    expect(sharp.report.bench[0]!.explained.map(({ by }) => by)).toEqual(['flying capacitor']);
  });

  it('a resistance is a load, a bleeder stays, what stands on the rail is taken off', () => {
    // At the load's own voltage a resistor and the current through it are one load, but for the ripple.
    const rails = (bleeder: string, on = '') =>
      `  up:\n    ${pump('1 uF', '10 uF')}\n    loads: { x: 1 mA }\n${bleeder}${on}`;
    const volts = (lines: string, load: string) =>
      board(lines, `  - { rail: up, load: ${load}, voltage: 9 V }\n`).report.bench[0]!.predicted.voltage!
        .typical;
    const current = volts(rails(''), '5 mA');
    expectNear(volts(rails(''), `${current / 5e-3} ohm`), current, 1e-4);
    const half = `    bleeder: ${current / 2.5e-3} ohm\n`;
    expectNear(volts(rails(half), '2.5 mA'), current, 1e-4);
    expectNear(volts(rails(half), '0 mA'), volts(rails(''), `${current / 2.5e-3} ohm`), 1e-4);
    const regulator = '  low: { regulator: { from: up, output: 3.3 V }, loads: { y: 20 mA } }\n';
    expectNear(volts(rails('', regulator), '5 mA'), current, 1e-6);
  });

  it('a negative rail is judged by its signs, and a sign the wrong way round is told', () => {
    const down = `  down: { ${pump('1 uF +-30 %', '10 uF', 'inverter')} }\n`;
    // The doubler's formula without the input, turned over.
    const volts = 5 - doubler(20e-3, 0.8e-6, 10e-6).voltage;
    const { report } = board(down, `  - { rail: down, load: 20 mA, voltage: ${volts} V }\n`);
    expect(report.bench[0]!.deviation.voltage).toBeGreaterThan(0.1);
    expectNear(report.bench[0]!.explained[0]?.value, 0.8e-6, 0.02);
    const turned = board(down, '  - { rail: down, load: 10 mA, voltage: 4.4 V }\n');
    const finding = turned.findings.find(({ code }) => code === 'bench-disagrees');
    expect(finding?.message).toContain('a sign or swapped leads, since down is negative');
  });

  it('counts in the mode in which the rest of the board draws least', () => {
    // Ohm's law: in mode day the heater takes 100 mA through 1.5 ohm, which both terms of the doubler feel.
    const rails = `  vs: { supply: soft, loads: { heater: { current: 100 mA, in: [day] } } }
  up: { ${pump('1 uF', '10 uF', 'doubler, input: vs')} }
modes: { day: { share: 50 % }, night: { share: 50 % } }
`;
    const { report, analysis } = board(rails, '  - { rail: up, load: 1 mA, voltage: 9 V }\n');
    const night = board(
      rails.replace('100 mA', '0 mA'),
      '  - { rail: up, load: 1 mA, voltage: 9 V }\n',
    ).report;
    expect(analysis.bench()[0]!.mode).toBe('night');
    expectNear(report.bench[0]!.predicted.voltage!.typical, night.bench[0]!.predicted.voltage!.typical, 1e-6);
  });
});

describe('bench entries of other rails', () => {
  it("follow Ohm's law behind a supply's resistance, and name what would explain them", () => {
    const vs = '  vs: { supply: soft, loads: { x: 10 mA } }\n';
    const entry = (load: string, volts: number) =>
      board(vs, `  - { rail: vs, load: ${load}, voltage: ${volts} V }\n`).report.bench[0]!;
    const amps = entry('100 mA', 4.8);
    expect(amps.predicted.voltage!.typical).toBeCloseTo(5 - 1.5 * 0.1, 9);
    expect(amps.predicted.voltage!.min).toBeCloseTo(4.9 - 2 * 0.1, 9);
    expect(amps.predicted.voltage!.max).toBeCloseTo(5.1 - 1 * 0.1, 9);
    expect(amps.predicted.ripple).toBeNull();
    expect(amps.explained.map(({ by, at }) => [by, at])).toEqual([
      ['supply soft voltage', 'supplies.soft.voltage'],
      ['supply soft resistance', 'supplies.soft.resistance'],
    ]);
    expectNear(amps.explained[0]!.value, 4.95, 1e-3);
    expectNear(amps.explained[1]!.value, 2, 1e-2);
    const ohms = entry('50 ohm', 4.9);
    expect(ohms.unit).toBe('ohm');
    expect(ohms.predicted.voltage!.typical).toBeCloseTo((5 * 50) / 51.5, 9);
  });

  it("are the regulator's band, or what its input and dropout leave of it", () => {
    const v3 = '  v3: { regulator: { from: v5, output: 3.3 V +-2 % }, loads: { x: 1 mA } }\n';
    const held = board(v3, '  - { rail: v3, load: 10 mA, voltage: 3.27 V, ripple: 2 mV }\n');
    expect(held.report.bench[0]!.predicted).toEqual({
      voltage: { min: 3.3 * 0.98, typical: 3.3, max: 3.3 * 1.02 },
      ripple: null,
    });
    expect(held.report.bench[0]!.explained[0]).toMatchObject({ by: 'regulator output', explains: 'voltage' });
    expect(held.findings.find(({ at }) => at === 'bench[0].ripple')?.code).toBe('not-computed');
    // 5 V less 1.9 V leaves 3.1 V.
    const starved = board(
      v3.replace('+-2 %', '+-2 %, dropout: 1.9 V'),
      '  - { rail: v3, load: 10 mA, voltage: 3.1 V }\n',
    );
    expect(starved.report.bench[0]!.predicted.voltage!.typical).toBeCloseTo(3.1, 9);
  });

  it('behind a filter load the pump in front through the resistor', () => {
    const rails = (loads: string) => `  up:
    ${pump('1 uF', '10 uF')}
    loads: ${loads}
  quiet:
    filter: { from: up, resistor: 100 ohm +-10 %, capacitor: { value: 1 uF, kind: film } }
    loads: { y: 3 mA }
`;
    const entry = (lines: string, load: string, rail = 'quiet') =>
      board(lines, `  - { rail: ${rail}, load: ${load}, voltage: 8 V }\n`).report.bench[0]!.predicted;
    // Ohm's law: the pump alone with both currents, less 5 mA through 100 ohm and its tolerance.
    const front = entry(rails('{ x: 1 mA }'), '7 mA', 'up').voltage!;
    const current = entry(rails('{ x: 2 mA }'), '5 mA');
    expectNear(current.voltage!.typical, front.typical - 0.5, 1e-5);
    expectNear(front.min - current.voltage!.min, 5e-3 * 110, 1e-3);
    expectNear(front.max - current.voltage!.max, 5e-3 * 90, 1e-3);
    expect(current.ripple).toBeNull();
    // The same point as a resistance.
    const ohms = entry(rails('{ x: 2 mA }'), `${current.voltage!.typical / 5e-3} ohm`);
    expectNear(ohms.voltage!.typical, current.voltage!.typical, 1e-5);
    const found = board(
      rails('{ x: 2 mA }'),
      `  - { rail: quiet, load: 5 mA, voltage: ${current.voltage!.typical - 0.03} V }\n`,
    ).report.bench[0]!;
    expect(found.explained[0]).toMatchObject({ by: 'filter resistor', at: 'rails.quiet.filter.resistor' });
    expectNear(found.explained[0]!.value, 106, 1e-3);
    // Behind a rail that holds, nothing but the resistor gives way.
    const held = '  calm: { filter: { from: v5, resistor: 10 ohm, capacitor: 1 uF } }\n';
    expect(entry(held, '20 mA', 'calm').voltage!.typical).toBeCloseTo(5 - 0.2, 9);
    expect(entry(held, '90 ohm', 'calm').voltage!.typical).toBeCloseTo(4.5, 9);
    expect(entry(held, '0 mA', 'calm').voltage!.typical).toBeCloseTo(5, 9);
  });
});

describe('bench entries without a prediction', () => {
  it('stay null with a finding that says why', () => {
    const { report, findings } = board(
      `  odd: { ${pump('1 uF', '10 uF', 'ladder')} }\n`,
      '  - { rail: odd, load: 1 mA, voltage: 9 V }\n  - { rail: od, load: 1 mA, voltage: 9 V }\n  - { rail: v5, voltage: 5 V }\n',
    );
    for (const entry of report.bench)
      expect(entry).toMatchObject({
        predicted: { voltage: null, ripple: null },
        deviation: { voltage: null, ripple: null },
        inside: null,
        explained: [],
      });
    const said = findings.filter(({ at }) => at.startsWith('bench')).map(({ code, at }) => `${code} ${at}`);
    expect(said).toEqual([
      'not-computed bench[0]',
      'unknown-name bench[1].rail',
      'missing-key bench[2].load',
    ]);
    expect(report.bench[1]).toMatchObject({ rail: 'od', load: 1e-3, measured: { voltage: 9 } });
  });

  it('never throws, whatever stands there', () => {
    const rails = `  up: { ${pump('1 uF +-20 %', '10 uF +-20 %')} }
  vs: { supply: soft }
  v3: { regulator: { from: vs, output: 3.3 V +-2 %, dropout: 0.2 V } }
`;
    const quantity = (unit: string) =>
      fc.oneof(
        fc.double({ min: -1e4, max: 1e4, noNaN: true }).map((value) => `${value} ${unit}`),
        fc.constantFrom(`0 ${unit}`, `1e-12 ${unit}`, `1..2 ${unit}`, '', '{}', 'x'),
      );
    const entry = fc.record({
      rail: fc.constantFrom('up', 'vs', 'v3', 'v5', 'nowhere', ''),
      load: fc.oneof(quantity('mA'), quantity('ohm'), quantity('kohm')),
      voltage: quantity('V'),
      ripple: quantity('mV'),
    });
    fc.assert(
      fc.property(entry, ({ rail, load, voltage, ripple }) => {
        const { report } = board(
          rails,
          `  - { rail: ${rail}, load: ${load}, voltage: ${voltage}, ripple: ${ripple} }\n`,
        );
        expect(JSON.parse(JSON.stringify(report.bench))).toEqual(report.bench);
        for (const { predicted, explained } of report.bench) {
          if (predicted.voltage) expect(predicted.voltage.min).toBeLessThanOrEqual(predicted.voltage.max);
          for (const { value } of explained) expect(Number.isFinite(value)).toBe(true);
        }
      }),
      { numRuns: 60, seed: 7 },
    );
  });
});
