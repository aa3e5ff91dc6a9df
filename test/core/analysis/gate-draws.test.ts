import { describe, expect, it } from 'vitest';
import { analyse } from '../../../core/index';
import { bench } from '../../support/bench-board';

describe('gates that drive a pump', () => {
  it('draw their own current from their rail, once for the package', () => {
    const current = (draws: string) => {
      const text = `${bench.replace('  chips:\n', `  gates: { mine: { high-resistance: 30 ohm, low-resistance: 30 ohm${draws} } }\n  chips:\n`)}
  up:
    pump: { topology: doubler, input: v5, drive: amp, diode: schottky-signal, flying: { value: 1 uF, kind: film }, reservoir: { value: 1 uF, kind: film } }
    loads: { lamp: 1 mA }
  down:
    pump: { topology: inverter, drive: amp, diode: schottky-signal, flying: { value: 1 uF, kind: film }, reservoir: { value: 1 uF, kind: film } }
    loads: { lamp: 1 mA }
drivers:
  amp: { input: tick, rail: v5, gates: { part: mine, parallel: 3 } }
`;
      return analyse(text, { file: 'rails.yaml' }).report.rails['v5']!.current!;
    };
    expect(current(', draws: 2 mA') - current('')).toBeCloseTo(2e-3, 9);
  });
});
