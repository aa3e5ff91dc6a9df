import { describe, expect, it } from 'vitest';
import { analyse } from '../../../core/index';
import { bench } from '../../support/bench-board';

const file = { file: 'rails.yaml' };
const rail = (text: string, name: string) => analyse(text, file).report.rails[name];

describe('amplifiers as a load', () => {
  const opamps = '{ amplifier: { quiescent: 1.2 mA, output: 0.5 mA, count: 2 } }';

  it('take quiescent and output current from the rail that they stand on, each', () => {
    // Supply current of a push-pull output: Iq + Io. 2 x (1.2 + 0.5) mA = 3.4 mA.
    const text = `${bench}
  v3:
    regulator: { from: v5, output: 3 V }
    loads: { opamps: ${opamps} }
  up:
    pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: { value: 1 uF, kind: film }, reservoir: { value: 1 uF, kind: film } }
    loads: { opamps: ${opamps} }
  down:
    pump: { topology: inverter, drive: tick, diode: schottky-signal, flying: { value: 1 uF, kind: film }, reservoir: { value: 1 uF, kind: film } }
    loads: { opamps: ${opamps} }
`;
    expect(rail(text, 'v3')?.current).toBeCloseTo(3.4e-3, 9);
    expect(rail(text, 'up')?.current).toBeCloseTo(3.4e-3, 6);
    expect(rail(text, 'down')?.current).toBeCloseTo(3.4e-3, 6);
    // Charge balance of a doubler: its supply gives the load's charge twice.
    expect(rail(text, 'v5')?.current).toBeCloseTo(3.4e-3 + 2 * 3.4e-3 + 3.4e-3 + 1e-3, 4);
  });

  it('count like a current of the same size, with their band and in their modes', () => {
    const board = (load: string) => `${bench}
  up:
    pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: { value: 1 uF, kind: film }, reservoir: { value: 1 uF, kind: film } }
    loads: { opamp: ${load}, rest: 0.1 mA }
modes: { on: { share: 50 % }, off: { share: 50 % } }
`;
    const amplifier = rail(
      board('{ amplifier: { quiescent: 1..1.2..1.5 mA, output: 0.5 mA, count: 2 }, in: [on] }'),
      'up',
    );
    const current = rail(board('{ current: 3..3.4..4 mA, in: [on] }'), 'up');
    expect(amplifier).toEqual(current);
  });

  it('draw nothing that the file does not say', () => {
    const { findings, report } = analyse(
      `${bench}
  v3: { regulator: { from: v5, output: 3 V }, loads: { opamp: { amplifier: { output: 1 mA } } } }
`,
      file,
    );
    expect(findings.map(({ code, at }) => `${code} ${at}`)).toContain(
      'missing-key rails.v3.loads.opamp.amplifier.quiescent',
    );
    expect(report.rails['v3']?.current).toBe(0);
  });
});
