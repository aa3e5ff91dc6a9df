import { describe, expect, it } from 'vitest';
import { analyse } from '../../../core/index';

/** The report's clock `tick` on a 5 V board. */
function clock(entry: string, more = '') {
  const text = `supplies: { lab: { voltage: 5 V } }
parts:
  chips: { plain: { pins: { high-resistance: 20 ohm, low-resistance: 20 ohm } } }
chips: { mcu: { part: plain, rail: v5, draws: 1 mA } }
clocks:
  tick: ${entry}
${more}rails: { v5: { supply: lab } }
`;
  return analyse(text, { file: 'rails.yaml' }).report.clocks['tick']!;
}

const near = (value: number | undefined, expected: number, share: number) =>
  expect(Math.abs(value! / expected - 1), `${value} against ${expected}`).toBeLessThan(share);

describe('clocks', () => {
  it('a pin: frequency and duty as written, levels of its rail', () => {
    const tick = clock('{ pin: mcu.P1, frequency: 100 kHz, duty: 40 % }');
    expect(tick).toMatchObject({ frequency: { typical: 1e5 }, duty: { typical: 0.4 }, high: 5, low: 0 });
  });

  it('registers: 16 MHz / (8 x 45)', () => {
    // Data sheets: f = clk / (P (TOP + 1)) (from memory): 44 444 Hz, duty 9/45.
    const tick = clock('{ pin: mcu.P1, timer: { input: 16 MHz, prescaler: 8, top: 44, compare: 9 } }');
    near(tick.frequency?.typical, 44_444.4, 1e-5);
    near(tick.duty?.typical, 0.2, 1e-9);
  });

  it('the inverse of a clock: same frequency, the rest of the duty', () => {
    const tick = clock(
      '{ pin: mcu.P2, inverse-of: first }',
      '  first: { pin: mcu.P1, frequency: 20 kHz, duty: 30 % }\n',
    );
    near(tick.frequency?.typical, 20e3, 1e-9);
    near(tick.duty?.typical, 0.7, 1e-9);
  });

  it('the astable timer: 1 kohm, 10 kohm, 10 nF', () => {
    // Charge and discharge between thirds of the supply: tH = ln 2 (RA + RB) C, tL = ln 2 RB C: 6870 Hz, duty 0.5238.
    const tick = clock(
      '{ rail: v5, astable: { charge: 1 kohm, discharge: 10 kohm, timing: 10 nF +-5 %, part: bipolar-astable } }',
    );
    near(tick.frequency?.typical, 6870, 1e-3);
    near(tick.duty?.typical, 0.5238, 1e-3);
    near(tick.frequency?.min, 6870 / 1.05, 1e-3);
    near(tick.frequency?.max, 6870 / 0.95, 1e-3);
    // A bipolar timer's high level stays 1.2 to 1.4 V below its supply at light load (common practice, no source).
    expect(tick.high).toBeGreaterThan(3.4);
    expect(tick.high).toBeLessThan(4);
  });

  it('the Schmitt inverter: thresholds decide, and their spread is a spread of frequency', () => {
    // tH = RC ln((VOH - VT-)/(VOH - VT+)), tL = RC ln((VT+ - VOL)/(VT- - VOL)) with 2.36 and 1.53 V at 4.5 V, typical
    // thresholds of an HC Schmitt inverter (data sheet): 13.14 kHz for 10 kohm and 10 nF, duty 0.4306; ratios hold at 5 V.
    const tick = clock('{ rail: v5, schmitt: { resistor: 10 kohm, capacitor: 10 nF, part: hc-schmitt } }');
    near(tick.frequency?.typical, 13_140, 0.02);
    near(tick.duty?.typical, 0.4306, 0.02);
    expect(tick.frequency!.max / tick.frequency!.min).toBeGreaterThan(2);
  });

  it('a generator: as written', () => {
    const tick = clock(
      '{ external: { frequency: 31.25 kHz, duty: 25 %, high: 9 V, low: 0.5 V, resistance: 50 ohm } }',
    );
    expect(tick).toMatchObject({
      frequency: { typical: 31_250 },
      duty: { typical: 0.25 },
      high: 9,
      low: 0.5,
    });
  });

  it('says nothing of a clock that is the inverse of itself', () => {
    expect(clock('{ pin: mcu.P2, inverse-of: tick }').frequency).toBeNull();
  });
});
