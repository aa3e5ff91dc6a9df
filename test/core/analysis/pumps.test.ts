import { describe, expect, it } from 'vitest';
import { analyse } from '../../../core/index';

/** A board with round figures; tests add drivers and rails. */
function rails(text: string, drivers = '') {
  const board = `supplies:
  lab: { voltage: 5 V }
  soft: { voltage: 5 V, resistance: 10 ohm }
parts:
  chips: { plain: { pins: { high-resistance: 20 ohm, low-resistance: 20 ohm } } }
  diodes: { sharp: { saturation: 1 nA, ideality: 0.5, resistance: 10 mohm, kind: silicon } }
chips: { mcu: { part: plain, rail: v5, draws: 1 mA } }
clocks:
  a: { pin: mcu.P1, frequency: 20 kHz, duty: 50 % }
  b: { pin: mcu.P2, inverse-of: a }
  slow: { rail: v5, astable: { charge: 10 kohm, discharge: 33 kohm, timing: 100 nF, part: bipolar-astable } }
${drivers}rails:
  v5: { supply: lab }
${text}`;
  const { report, board: analysis } = analyse(board, { file: 'rails.yaml' });
  return { report, analysis };
}

const caps = 'flying: { value: 100 nF, kind: film }, reservoir: { value: 100 uF, kind: film }';

describe('pumps of the language', () => {
  it('a multiplier of three stages has the open voltage and the slow limit of its formula', () => {
    // J. F. Dickson, IEEE JSSC SC-11(3), 1976 (form from memory): Vin + N V, R = N / (f C) = 3 / (20 kHz 100 nF).
    const { report } = rails(
      `  up:\n    pump: { topology: multiplier, stages: 3, input: v5, drive: [a, b], diode: sharp, ${caps} }\n    loads: { x: 1 mA }\n`,
    );
    const up = report.rails['up']!;
    // Four diodes of 0.1 to 0.3 V each.
    expect(up.openCircuit).toBeGreaterThan(20 - 4 * 0.3);
    expect(up.openCircuit).toBeLessThan(20 - 4 * 0.1);
    expect(Math.abs(up.outputResistance! / 1500 - 1)).toBeLessThan(0.05);
  });

  it('a ladder of two stages below ground drops 5.5 I / (f C) from twice the swing', () => {
    // Half-wave ladder on a square wave with a large reservoir: n (n + 1) (5 n + 1) / 12 = 5.5 for n = 2, derived from
    // charge balance (M. D. Seeman, S. R. Sanders, 2008, method from memory).
    const { report } = rails(
      `  down:\n    pump: { topology: ladder, stages: 2, polarity: negative, drive: a, diode: sharp, ${caps} }\n    loads: { x: 0.5 mA }\n`,
    );
    const down = report.rails['down']!;
    expect(down.openCircuit).toBeLessThan(-(10 - 4 * 0.3));
    expect(down.openCircuit).toBeGreaterThan(-(10 - 4 * 0.1));
    expect(Math.abs(down.outputResistance! / 2750 - 1)).toBeLessThan(0.08);
  });

  it('refuses a multiplier whose phases do not fit', () => {
    const { report } = rails(
      `  up:\n    pump: { topology: multiplier, stages: 2, input: v5, drive: a, diode: sharp, ${caps} }\n`,
    );
    expect(report.rails['up']!.voltage).toBeNull();
    expect(report.findings.find((f) => f.at === 'rails.up.pump.drive')?.message).toMatch(/needs two phases/);
  });

  it('a doubler behind a push-pull stage on a bipolar timer: about 9.0 V open, 8.4 V on 4.7 kohm', () => {
    // Bench values, common practice, no source; a plain model lands within 2 %.
    const pump =
      'pump: { topology: doubler, input: v5, drive: amp, diode: silicon-switching, flying: { value: 100 uF, kind: aluminium }, reservoir: { value: 100 uF, kind: aluminium } }';
    const { report } = rails(
      `  open:\n    ${pump}\n    loads: { meter: 1 Mohm }\n  loaded:\n    ${pump}\n    loads: { r: 4.7 kohm }\n`,
      'drivers:\n  amp: { input: slow, rail: v5, push-pull: { npn: npn-small-signal, pnp: pnp-small-signal, base: { npn: 15 kohm, pnp: 15 kohm } } }\n',
    );
    for (const [name, volts] of [
      ['open', 9.0],
      ['loaded', 8.4],
    ] as const) {
      const { voltage } = report.rails[name]!;
      expect(Math.abs(voltage!.typical / volts - 1)).toBeLessThan(0.02);
      expect(voltage!.min).toBeLessThan(volts);
      expect(voltage!.max).toBeGreaterThan(volts);
    }
    expect(report.drivers['amp']!.forcedGain).toBeGreaterThan(5);
    // Cross-conduction is named where the volts go, and all entries still add up.
    const loaded = report.rails['loaded']!;
    const drops = new Map(loaded.drops!.map((drop) => [drop.in, drop.volts]));
    expect(drops.get('driver cross-conduction')).toBeGreaterThan(0);
    const sum = [...drops.values()].reduce((a, b) => a + b, 0);
    expect(Math.abs(10 - loaded.voltage!.typical - sum)).toBeLessThan(1e-3 * 10);
  });

  it('lets a soft supply give way to everything that it feeds', () => {
    // Ohm's law: 5 V behind 10 ohm, a load of 40 mA and a doubler that takes twice its own 2 mA.
    const { report } = rails(
      `  vs: { supply: soft, loads: { heater: 40 mA } }\n  up:\n    pump: { topology: doubler, input: vs, drive: a, diode: schottky-signal, flying: { value: 1 uF, kind: film }, reservoir: { value: 10 uF, kind: film } }\n    loads: { x: 2 mA }\n`,
    );
    expect(report.rails['vs']!.voltage!.typical).toBeCloseTo(5 - 10 * 0.042, 3);
    const input = report.rails['up']!.inputCurrent!;
    expect(report.supplies['soft']!.current!.typical).toBeCloseTo(0.04 + input, 6);
  });

  it('carries a rail that stands on a pump', () => {
    const pump = (input: string, drive: string) =>
      `pump: { topology: doubler, input: ${input}, drive: ${drive}, diode: schottky-signal, flying: { value: 1 uF, kind: film }, reservoir: { value: 10 uF, kind: film } }`;
    const { report } = rails(
      `  mid:\n    ${pump('v5', 'a')}\n  top:\n    ${pump('mid', 'b')}\n    loads: { x: 1 mA }\n`,
    );
    // The upper pump's input current is the lower pump's load.
    expect(report.rails['mid']!.current).toBeCloseTo(report.rails['top']!.inputCurrent!, 6);
    expect(report.rails['top']!.voltage!.typical).toBeGreaterThan(
      report.rails['mid']!.voltage!.typical + 3.5,
    );
  });

  it('draws one period and the load line when asked', () => {
    const { analysis } = rails(
      `  up:\n    pump: { topology: doubler, input: v5, drive: a, diode: schottky-signal, flying: { value: 1 uF, kind: film }, reservoir: { value: 10 uF, kind: film } }\n    loads: { x: 2 mA }\n`,
    );
    const up = analysis.rails.get('up')!;
    const wave = up.waveform!()!;
    expect(wave.time.at(-1)).toBeCloseTo(1 / 20e3, 9);
    expect(Math.max(...wave.output) - Math.min(...wave.output)).toBeCloseTo(up.pump!.heaviest.ripple, 4);
    expect(Math.max(...wave.drives[0]!)).toBeGreaterThan(0);
    expect(Math.min(...wave.drives[0]!)).toBeLessThan(0);
    const line = up.loadLine!(4e-3, 5);
    expect(line.map(({ current }) => current)).toEqual([0, 1e-3, 2e-3, 3e-3, 4e-3]);
    expect(line[2]!.voltage).toBeCloseTo(up.pump!.heaviest.voltage, 3);
    for (let k = 1; k < line.length; k++) expect(line[k]!.voltage).toBeLessThan(line[k - 1]!.voltage!);
  });

  it('follows the way up with the currents of the drive and of its transistors', () => {
    const { analysis } = rails(
      '  up:\n    pump: { topology: doubler, input: v5, drive: amp, diode: schottky-signal, flying: { value: 1 uF, kind: film }, reservoir: { value: 10 uF, kind: film } }\n    loads: { x: 1 mA }\n',
      'drivers:\n  amp: { input: a, rail: v5, push-pull: { npn: npn-small-signal, pnp: pnp-small-signal, base: { npn: 1 kohm, pnp: 1 kohm } } }\n',
    );
    const course = analysis.rails.get('up')!.transients!()!;
    const { time, output, drives } = course.startTrace!;
    expect(output).toHaveLength(time.length);
    expect(drives[0]).toHaveLength(time.length);
    for (let k = 1; k < time.length; k++) expect(time[k]).toBeGreaterThanOrEqual(time[k - 1]!);
    expect(output.at(-1)).toBeGreaterThan(0.8 * analysis.rails.get('up')!.pump!.heaviest.voltage);
    // A transistor carries at most its base current times its gain: 4.3 mA times 200 (and a little overdrive).
    const { npn, pnp } = course.transistorPeaks![0]!;
    expect(Math.max(npn, pnp)).toBeGreaterThan(0.02);
    expect(Math.max(npn, pnp)).toBeLessThan(0.9);
    expect(course.diodePeaks).toHaveLength(2);
    expect(course.railEnergy.get('v5')).toBeGreaterThan(0);
  });

  it('takes a value for each stage and a diode for each position', () => {
    const { report } = rails(
      '  up:\n    pump: { topology: ladder, stages: 2, input: v5, drive: a, diode: [sharp, sharp, schottky-signal, silicon-switching], flying: [1 uF, 220 nF], smoothing: [1 uF, 470 nF], reservoir: 10 uF, series: 22 ohm }\n    loads: { x: 0.2 mA }\n',
    );
    expect(report.findings.filter((f) => f.severity === 'error')).toEqual([]);
    expect(Object.keys(report.parts)).toEqual([
      'up.flying[0]',
      'up.flying[1]',
      'up.smoothing[0]',
      'up.smoothing[1]',
      'up.reservoir',
      'up.diode[0]',
      'up.diode[1]',
      'up.diode[2]',
      'up.diode[3]',
    ]);
    expect(report.rails['up']!.drops!.some((drop) => drop.in === 'series resistor')).toBe(true);
  });
});

it('says which resistance of a supply it took from the catalogue', () => {
  const check = (resistance: string) =>
    analyse(
      `supplies: { cell: { battery: li-ion, capacity: 1 Ah${resistance} } }\nrails: { vb: { supply: cell, loads: { x: 10 mA } } }\n`,
      {
        file: 'rails.yaml',
      },
    ).findings.filter((finding) => finding.code === 'assumed');
  expect(check('').map((finding) => finding.message)).toEqual([
    expect.stringContaining('resistance is not given'),
  ]);
  expect(check(', resistance: 80 mohm')).toEqual([]);
});
