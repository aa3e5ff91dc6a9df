/**
 * Discharge against closed forms worked by hand: charge balance with Ohm's law, integrated over a voltage that falls in
 * a straight line with the charge.
 */
import { describe, expect, it } from 'vitest';
import { type Cell, discharge } from '../../../core/compute/discharge';
import { expectNear } from '../../support/near';

const hour = 3600;
const [full, empty] = [4.2, 3];

/** 1 Ah, open voltage from 4.2 V to 3 V in a straight line, 0.5 ohm. */
function cell(changes: Partial<Cell> = {}): Cell {
  return {
    open: (left) => empty + (full - empty) * left,
    resistance: () => 0.5,
    knots: [1, 0.5, 0],
    charge: hour,
    selfCurrent: 0,
    end: null,
    ...changes,
  };
}

const always = (current: (volts: number) => number) => [{ share: 1, current }];

describe('discharge', () => {
  it('at constant current takes the charge over the current, self-discharge beside it', () => {
    expectNear(
      discharge(
        cell(),
        always(() => 0.1),
      )!.seconds,
      10 * hour,
      1e-12,
    );
    expectNear(
      discharge(
        cell({ selfCurrent: 0.025 }),
        always(() => 0.1),
      )!.seconds,
      8 * hour,
      1e-12,
    );
  });

  it('of 220 mAh lasts 1782 h at 10 mA for 1 % of the time and 5 uA otherwise', () => {
    // Charge balance by hand: 104.95 uA on average, 0.85 of the nameplate.
    const found = discharge(cell({ charge: 0.85 * 0.22 * hour, resistance: () => 10 }), [
      { share: 0.01, current: () => 10e-3 },
      { share: 0.99, current: () => 5e-6 },
    ])!;
    expectNear(found.seconds / hour, 1782, 5e-4);
    expectNear(found.taken[0]! / 0.22 / hour, 0.85 * (100 / 104.95), 1e-9);
    expectNear(found.taken[0]! + found.taken[1]!, 0.85 * 0.22 * hour, 1e-9);
  });

  it('at constant power follows the integral of (E + sqrt(E^2 - 4 R P)) / (2 P)', () => {
    // Antiderivative of sqrt(x^2 - a^2): (x sqrt(x^2 - a^2) - a^2 arcosh(x/a)) / 2 (any table of integrals).
    const [ohms, watts] = [0.5, 1.5];
    const a = Math.sqrt(4 * ohms * watts);
    const roots = (x: number) => (x * Math.sqrt(x * x - a * a) - a * a * Math.acosh(x / a)) / 2;
    const whole = (x: number) => x ** 2 / 2 + roots(x);
    const ends = 3 + (ohms * watts) / 3;
    const byHand = (hour * (whole(full) - whole(ends))) / (full - empty) / (2 * watts);
    const found = discharge(
      cell({ end: 3 }),
      always((volts) => watts / volts),
    )!;
    expectNear(found.seconds, byHand, 1e-4);
    expectNear(found.left, (ends - empty) / (full - empty), 1e-9);
    expect(found.endedBy).toBe(0);
  });

  it('into a resistor follows (R + Rl) ln(E1/E0) / (E1 - E0)', () => {
    const found = discharge(
      cell(),
      always((volts) => volts / 40),
    )!;
    expectNear(found.seconds, (hour * 40.5 * Math.log(full / empty)) / (full - empty), 1e-5);
    expect(found.left).toBe(0);
  });

  it('ends where the heaviest drain pulls it to the end voltage, however rarely that runs', () => {
    // 3.3 V + 0.5 ohm * 0.6 A = 3.6 V: half of the charge.
    const found = discharge(cell({ end: 3.3 }), [
      { share: 1, current: () => 0.01 },
      { share: 0, current: () => 0.6 },
    ])!;
    expectNear(found.left, 0.5, 1e-9);
    expectNear(found.seconds, 50 * hour, 1e-9);
    expect(found.endedBy).toBe(1);
    expect(found.taken[1]).toBe(0);
  });

  it('ends where a load of constant power asks for more than E^2 / (4 R)', () => {
    // 7.22 W needs 3.8 V behind 0.5 ohm: largest power of a source with a resistance (Jacobi).
    const found = discharge(
      cell(),
      always((volts) => 7.22 / volts),
    )!;
    expectNear(found.left, (3.8 - empty) / (full - empty), 2e-3);
    expect(found.endedBy).toBe(0);
  });

  it('lasts no time under a load that it cannot feed when full', () => {
    expect(
      discharge(
        cell({ end: 3 }),
        always(() => 3),
      ),
    ).toMatchObject({ seconds: 0, left: 1, endedBy: 0 });
  });

  it('is limited by self-discharge alone without a load, and has no answer without either', () => {
    expectNear(
      discharge(
        cell({ selfCurrent: 1e-6, end: 3 }),
        always(() => 0),
      )!.seconds,
      hour / 1e-6,
      1e-9,
    );
    expect(
      discharge(
        cell({ end: 3 }),
        always(() => 0),
      ),
    ).toBeUndefined();
    expect(
      discharge(
        cell(),
        always(() => Number.NaN),
      ),
    ).toBeUndefined();
  });
});
