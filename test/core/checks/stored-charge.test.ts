import { describe, expect, it } from 'vitest';
import { touchableCapacitance } from '../../../core/compute/touch-limit';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

const pump =
  'pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: { value: 1 uF, kind: film }, reservoir: { value: 100 uF, kind: film } }';
const high = (reservoir: string) => `
supplies: { lab: { voltage: 48 V } }
clocks: { tick: { external: { frequency: 50 kHz, duty: 50 %, high: 48 V, resistance: 10 ohm } } }
rails:
  vin: { supply: lab }
  up:
    pump: { topology: doubler, input: vin, drive: tick, diode: silicon-switching, flying: { value: 1 uF, kind: film, rated: 100 V }, reservoir: { value: ${reservoir}, kind: film, rated: 160 V } }
    loads: { x: 1 mA }
`;

describe('stored-charge', () => {
  it('says how long a rail stays up, and which bleeder brings it down in time', () => {
    // 9.2 V to 1 V at 2 mA of constant current: 100 uF x 8.2 V / 2 mA = 0.41 s.
    checkRule(
      'stored-charge',
      `${bench}
  up:
    ${pump}
    needs: { discharge: 100 ms }
#                       ^^^^^^ error stored-charge: A bleeder of
    loads: { x: 2 mA }
`,
    );
  });

  it('warns of charge above 60 V that no bleeder takes away', () => {
    checkRule(
      'stored-charge',
      high('10 uF').replace(
        '  up:\n',
        '  up:\n# ^^ warning stored-charge: Discharge and measure before touching\n',
      ),
    );
  });

  it('notes energy that burns at any voltage', () => {
    // E = C V^2 / 2 with 9.2 V: 1 F holds 42 J (any textbook).
    checkRule(
      'stored-charge',
      `${bench}
  up:
# ^^ information stored-charge: a short circuit of its capacitors welds and burns
    ${pump.replace('100 uF', '1 F')}
    loads: { x: 2 mA }
`,
    );
  });

  it('is silent in time, with a bleeder, and for little charge', () => {
    checkSilent(
      'stored-charge',
      `${bench}  up:\n    ${pump}\n    needs: { discharge: 1 s }\n    loads: { x: 2 mA }\n`,
    );
    // 10 uF from 96 V to 60 V in 2 s: 2 s / (10 uF x ln 1.6) = 425 kohm.
    checkSilent('stored-charge', `${high('10 uF')}    bleeder: 390 kohm\n`);
    checkSilent('stored-charge', high('47 nF'));
  });

  it('holds rows of the table of charged capacitors (IEC 62368-1, from memory)', () => {
    for (const [volts, nanofarads] of [
      [75, 170],
      [100, 91],
      [200, 28],
      [1000, 4],
    ] as const)
      expect(touchableCapacitance(volts)! * 1e9).toBeCloseTo(nanofarads, 6);
    expect(touchableCapacitance(-60)).toBe(Number.POSITIVE_INFINITY);
    expect(touchableCapacitance(87)).toBeLessThan(170e-9);
    expect(touchableCapacitance(87)).toBeGreaterThan(91e-9);
  });
});
