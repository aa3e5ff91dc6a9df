import { describe, expect, it } from 'vitest';
import { caseHalfShare, curveHalfShare, valueLeft } from '../../../core/compute/bias-loss';
import { filteredRipple } from '../../../core/compute/filtered-ripple';
import { equivalentJunction } from '../../../core/compute/junction-capacitance';
import { solveValues } from '../../support/check-pump';
import { capacitor, pinDrive, pump } from '../../support/circuits';
import { expectNear } from '../../support/near';

describe('value left under direct voltage', () => {
  // Generic curve 1 / (1 + (V / Vh)^2) with Vh at half of a 10 V rating: the project's reference sheet, from memory.
  const points = [0.1, 0.5, 1].map((share) => ({ share, left: 1 / (1 + (share / 0.5) ** 2) }));
  it.each([
    [1, 0.9615],
    [2.5, 0.8],
    [3.3, 0.6966],
    [5, 0.5],
    [8, 0.2809],
  ])('at %d V of 10 V is %d, between the points as on them', (volts, left) => {
    expectNear(valueLeft(points, volts / 10), left, 2e-4);
  });

  it('falls steadily for any falling points, goes on beyond the last, and needs a share', () => {
    const measured = [
      { share: 1, left: 0.2 },
      { share: 0.25, left: 0.9 },
    ];
    const course = Array.from({ length: 31 }, (_, k) => valueLeft(measured, k / 20)!);
    for (let k = 1; k < course.length; k++) expect(course[k]).toBeLessThanOrEqual(course[k - 1]!);
    expect(course[5]).toBeCloseTo(0.9, 12);
    expect(course[20]).toBeCloseTo(0.2, 12);
    expect(valueLeft(measured, Number.NaN)).toBeUndefined();
    expect(valueLeft([], 0.5)).toBe(1);
  });

  it('knows cases by their code, and the half share of a curve', () => {
    expect(caseHalfShare('0402', 10e-6)).toBeLessThan(caseHalfShare('0805', 10e-6)!);
    expect(caseHalfShare('6.3x11', 10e-6)).toBeUndefined();
    expectNear(curveHalfShare(points), 0.5, 1e-9);
  });
});

describe('junction capacitance', () => {
  it('moves the charge of the graded junction', () => {
    // Integral of Cj0 / (1 + V/Vj)^M over the swing, by the midpoint rule with 100,000 steps.
    const steps = 100_000;
    let charge = 0;
    for (let k = 0; k < steps; k++)
      charge += (10 / (1 + (((k + 0.5) / steps) * 5) / 0.8) ** 0.4) * (5 / steps);
    expectNear(equivalentJunction(10e-12, 5, 'silicon')! * 1e12, charge / 5, 1e-6);
    expectNear(equivalentJunction(10e-12, 0, 'schottky'), 10e-12, 1e-9);
    expect(equivalentJunction(0, 5, 'silicon')).toBeUndefined();
  });

  // Two antiphase phases, junctions of C/20 between neighbouring nodes: the tridiagonal charge balance
  // (C + 2 Cj) a_k + Cj (a_(k-1) + a_(k+1)) = C V of the project's reference sheet (derived and simulated there).
  it.each([
    [1, 9.545],
    [2, 13.7],
    [3, 17.86],
    [4, 22.03],
  ])('takes its share of a multiplier of %d stages: %d V from 5 V', (stages, volts) => {
    const values = pump({
      stages,
      frequency: 10e3,
      drives: stages > 1 ? [pinDrive(1), pinDrive(1, 1, true)] : [pinDrive(1)],
      flying: Array.from({ length: stages }, () => capacitor(1e-6, 0.1)),
      // Large, since the last junction also shakes the output.
      reservoir: capacitor(1e-3, 0.01),
      // Next to no drop, so that only the junctions lower the output.
      diodes: Array.from({ length: stages + 1 }, () => ({
        saturation: 1e-9,
        slope: 1e-4,
        ohms: 1,
        junctionFarads: 50e-9,
      })),
      loads: [{ name: 'load', kind: 'current', amps: 1e-6 }],
    });
    expectNear(solveValues(values).average, volts, 2e-3);
  });
});

describe('ripple behind a filter', () => {
  const triangle = { time: [0, 5e-6, 1e-5], volts: [-0.5, 0.5, -0.5] };
  const parts = { ohms: 100, henries: 0, farads: 1e-6, esrOhms: 0, loadOhms: Number.POSITIVE_INFINITY };
  it('of a triangle is T / (8 R C) of it, the integral of a triangle', () => {
    expectNear(filteredRipple(triangle.time, triangle.volts, parts), 1e-5 / (8 * 100 * 1e-6), 3e-3);
  });
  it('of an inductor falls with the square of the frequency: the first harmonic over w^2 L C - 1', () => {
    // First harmonic of a triangle of 1 V peak to peak: 4 / pi^2 amplitude (Fourier series).
    const w = 2 * Math.PI * 1e5;
    const expected = (2 * (4 / Math.PI ** 2)) / (w * w * 100e-6 * 1e-6 - 1);
    const found = filteredRipple(triangle.time, triangle.volts, { ...parts, ohms: 0, henries: 100e-6 });
    expectNear(found, expected, 0.02);
  });
  it('of a series resistance in the capacitor divides the rest', () => {
    const found = filteredRipple(triangle.time, triangle.volts, { ...parts, farads: 1, esrOhms: 10 });
    expectNear(found, 10 / 110, 1e-2);
  });
  it('needs a curve and parts', () => {
    expect(filteredRipple([0], [1], parts)).toBeUndefined();
    expect(filteredRipple([0, 1], [1, 2], { ...parts, farads: 0 })).toBeUndefined();
  });
});
