import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { analyse } from '../../../core/index';
import { expectShare, railOf, yieldOf } from '../../support/yield-of';

const demo = readFileSync(new URL('../../../media/demo/rails.yaml', import.meta.url), 'utf8');

describe('pumps drawn by lot', () => {
  it('deep in the slow limit spread as R = 1/(f C) does', () => {
    // Doubler, R = 1/(f C) (M. D. Seeman, S. R. Sanders 2008). Check 33, a run of 1e6: f even within 5 %, C within
    // 20 %: mean 1.0145, sigma 0.1227, quantiles 0.801..1.300 of nominal. Tolerances: three standard errors of 4000
    // samples (mean sigma/sqrt N, sigma by a kurtosis of 2, quantiles by the density near the ends), and 0.2 % of
    // what is left of diodes and the 10 milliohm.
    const board = `supplies: { lab: { voltage: 100 V } }
clocks: { tick: { external: { frequency: 10 kHz +-5 %, high: 100 V, resistance: 10 mohm } } }
parts: { diodes: { sharp: { saturation: 1 nA, ideality: 0.5, resistance: 10 mohm, kind: silicon } } }
rails:
  in: { supply: lab }
  up:
    pump:
      { topology: doubler, input: in, drive: tick, diode: sharp,
        flying: { value: 1 uF +-20 %, kind: film, esr: 1 mohm }, reservoir: { value: 1 mF +-0 %, kind: film, esr: 1 mohm } }
    needs: { voltage: 100 V }
    loads: { x: 200 mA }`;
    const analysis = analyse(board, { file: 'rails.yaml' });
    const open = analysis.report.rails['up']!.openCircuit!;
    const result = yieldOf(board, { samples: 4000 });
    const { voltage } = railOf(result, 'up').modes[0]!;
    const relative = (volts: number) => (open - volts) / (0.2 * 100);
    const quantile = (share: number) => voltage!.quantiles.find((q) => q.share === share)!.value;
    expect(Math.abs(relative(voltage!.mean) - 1.0145)).toBeLessThan(0.0058 + 0.002);
    expect(Math.abs(voltage!.deviation / 20 - 0.1227)).toBeLessThan(0.003 + 0.0003);
    expect(Math.abs(relative(quantile(0.99865)) - 0.801)).toBeLessThan(0.007 + 0.002);
    expect(Math.abs(relative(quantile(0.00135)) - 1.3)).toBeLessThan(0.016 + 0.002);
    // Extreme value +31.58 %: nothing lies beyond it.
    expect(relative(voltage!.min)).toBeLessThan(1.3158 + 0.002);
    const [first, second] = railOf(result, 'up').leading;
    expect([first!.label, second!.label]).toEqual(['flying capacitor', 'tick frequency']);
    // Shares of the variance: 20 % against 5 %, so about 4 : 1 in the correlations, which square to 1.
    expect(first!.correlation / second!.correlation).toBeGreaterThan(3.5);
    expect(first!.correlation / second!.correlation).toBeLessThan(4.5);
    expect(first!.correlation ** 2 + second!.correlation ** 2).toBeGreaterThan(0.95);
  });

  const parts =
    'diode: sharp, flying: { value: 1 uF +-0 %, kind: film, esr: 10 mohm }, reservoir: { value: 10 uF +-0 %, kind: film, esr: 10 mohm }';
  const pumped = (
    clock: string,
    rails: string,
    voltage = '5 V',
  ) => `supplies: { lab: { voltage: ${voltage} } }
clocks: { tick: { external: { high: 5 V, resistance: 20 ohm, ${clock} } } }
parts: { diodes: { sharp: { saturation: 1 nA, ideality: 1, resistance: 1 ohm, kind: silicon } } }
rails:
  v5: { supply: lab }
${rails}`;

  it('of one clock share its frequency in each sample', () => {
    const pump = `{ pump: { topology: doubler, input: v5, drive: tick, ${parts.replace('1 uF', '100 nF')} }, needs: { voltage: 9 V }, loads: { x: 5 mA } }`;
    const result = yieldOf(pumped('frequency: 100 kHz +-30 %', `  a: ${pump}\n  b: ${pump}`), {
      samples: 50,
    });
    expect(result.quantities).toBe(1);
    const [a, b] = result.rails;
    expect(a!.modes).toEqual(b!.modes);
    expect(a!.modes[0]!.voltage!.deviation).toBeGreaterThan(0.01);
  });

  it('that stand on each other follow what is below them in the same sample', () => {
    const rails = `  a: { pump: { topology: doubler, input: v5, drive: tick, ${parts} } }
  b: { pump: { topology: doubler, input: a, drive: tick, ${parts} }, needs: { voltage: 12 V }, loads: { x: 1 mA } }`;
    const result = yieldOf(pumped('frequency: 100 kHz', rails, '4.5..5..5.5 V'), { samples: 300 });
    const b = railOf(result, 'b');
    expect(b.leading.map(({ label }) => label)).toEqual(['supply lab']);
    expect(b.leading[0]!.correlation).toBeGreaterThan(0.9999);
    // 1 V even: sigma 1 / sqrt 12; volt for volt, and a standard error of 300 samples.
    expect(Math.abs(b.modes[0]!.voltage!.deviation * Math.sqrt(12) - 1)).toBeLessThan(0.1);
  });

  it('without a steady state in a sample are counted apart and never as met', () => {
    // Edges of 1 us leave no level in 10 us when the duty is below 10 %: 5 of the 55 points of the band.
    const samples = 500;
    const rails = `  up: { pump: { topology: doubler, input: v5, drive: tick, ${parts} }, needs: { voltage: 1 V }, loads: { x: 1 mA } }
  on: { pump: { topology: doubler, input: up, drive: tick, ${parts} }, needs: { voltage: 1 V }, loads: { x: 1 mA } }`;
    const clock = 'frequency: 100 kHz, duty: 5..50..60 %';
    const board = pumped(clock, rails).replace(
      'duty: 5..50..60 % } }',
      'duty: 5..50..60 % }, rise: 1 us, fall: 1 us }',
    );
    const result = yieldOf(board, { samples });
    expectShare(result.outcome!.unsolved, samples, 5 / 55);
    expect(result.outcome!.met + result.outcome!.missed + result.outcome!.unsolved).toBe(samples);
    expect(result.outcome!.yield).toBe(result.outcome!.met / samples);
    for (const rail of result.rails) {
      expect(rail.outcome!.unsolved).toBe(result.outcome!.unsolved);
      expect(rail.modes[0]!.voltage!.count).toBe(rail.outcome!.met);
    }
  });

  it('of both signs and in every mode lie within the corners of the analysis', () => {
    const sized = (c: string) => parts.replaceAll('+-0 %', c);
    const boards = [
      demo,
      pumped(
        'frequency: 100 kHz +-20 %, duty: 40..50..60 %',
        `  up: { pump: { topology: doubler, input: v5, drive: tick, ${sized('+-20 %')} }, needs: { voltage: 9 V, ripple: 10 mV }, loads: { x: 4..5..8 mA } }
  low: { pump: { topology: inverter, drive: tick, ${sized('+-10 %')} }, needs: { voltage: -3 V, ripple: 10 mV }, loads: { x: { current: 3 mA, in: [run] }, r: 10 kohm +-5 % } }
  quiet: { filter: { from: up, resistor: 47 ohm +-5 %, capacitor: 10 uF }, needs: { voltage: 8 V }, loads: { x: 1..2..3 mA } }
  top: { pump: { topology: ladder, stages: 2, drive: tick, ${sized('+-20 %')} }, needs: { voltage: 3 V, ripple: 100 mV }, loads: { x: 0.5 mA } }
  on: { pump: { topology: doubler, input: up, drive: tick, ${sized('+-20 %')} }, needs: { voltage: 10 V, ripple: 10 mV }, loads: { x: 1 mA } }
modes: { run: {}, idle: {} }
conditions: { ambient: -20..60 degC }`,
        '4.8..5..5.2 V, resistance: 0.5..1..2 ohm',
      ),
    ];
    for (const board of boards) {
      const analysis = analyse(board, { file: 'rails.yaml' });
      const result = yieldOf(board, { samples: 300 });
      expect(result.rails.length).toBeGreaterThan(2);
      for (const { rail, modes } of result.rails) {
        const { voltage, ripple } = analysis.board.rails.get(rail)!;
        // What the integration may be off by: 0.02 % of the average, 1 % of the ripple.
        const near = 2e-4 * Math.abs(voltage!.typical);
        for (const mode of modes) {
          expect(mode.voltage!.min, rail).toBeGreaterThan(voltage!.min - near);
          expect(mode.voltage!.max, rail).toBeLessThan(voltage!.max + near);
          if (mode.ripple) expect(mode.ripple.max, rail).toBeLessThan(1.01 * ripple!.max);
        }
      }
    }
  });
});
