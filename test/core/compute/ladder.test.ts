import { describe, expect, it } from 'vitest';
import { swingWithJunctions } from '../../../core/compute/junction-loss';
import {
  reservoirMeanDrop,
  spreadLoadMeanDrop,
  squareWaveMeanDrop,
  textbookMeanDrop,
  textbookPeakDrop,
} from '../../../core/compute/ladder-drop';
import { optimumStages, textbookOptimumStages } from '../../../core/compute/ladder-optimum';
import { columnRipple, reservoirRipple } from '../../../core/compute/ladder-ripple';
import { expectNear } from '../../support/near';

const equal = (n: number, farads: number) => Array.from({ length: n }, () => farads);

describe('drop of a ladder', () => {
  // M. S. Naidu, V. Kamaraju, High Voltage Engineering, example 6.1 (read in public companion code; title from memory: confirm): 8 stages, 0.05 uF, 150 Hz,
  // 5 mA, 125 kV: 248.0 kV, which is 12.40 % of the 2 MV without load.
  it('matches a textbook example of eight stages', () => {
    const volts = textbookPeakDrop(8)! * (5e-3 / (150 * 0.05e-6));
    expectNear(volts, 248.0e3, 1e-3);
    expectNear(volts / (2 * 8 * 125e3), 0.124, 1e-3);
  });
  // C. L. Wadhwa, High Voltage Engineering, example 2.1 (public companion code; title from memory: confirm): 10 stages, 0.06 uF, 150 Hz, 1 mA, without n/6: 79.63 kV.
  it('matches a textbook example of ten stages', () => {
    expectNear((textbookPeakDrop(10)! + 10 / 6) * (1e-3 / (150 * 0.06e-6)), 79.63e3, 1e-3);
  });
  // High-voltage textbook, chapter 16, example 3 (companion code): 12 stages, 0.15 uF, 50 Hz, 5 mA: mean drop 840.7 kV, and
  // 5948 kV left of 12 times twice the peak of 200 kV rms.
  it('matches a textbook example of twelve stages for the mean output', () => {
    const volts = textbookMeanDrop(12)! * (5e-3 / (50 * 0.15e-6));
    expectNear(volts, 840.7e3, 1e-3);
    expectNear(24 * Math.SQRT2 * 200e3 - volts, 5948e3, 1e-3);
  });
  // Simulation with ideal diodes, one to four stages.
  it.each([
    [1, 1.5, 1.0625, 1],
    [2, 8, 6.625, 5.5],
    [3, 23.5, 20.69, 16],
    [4, 52, 47.25, 35],
  ])('of %d stages, load spread %d, square wave %d, with reservoir %d', (n, spread, square, reservoir) => {
    expectNear(spreadLoadMeanDrop(n), spread, 1e-9);
    expectNear(squareWaveMeanDrop(n), square, 2e-4);
    expectNear(reservoirMeanDrop(n), reservoir, 1e-9);
  });
  it('has no answer for half a stage', () => {
    for (const drop of [
      textbookPeakDrop,
      textbookMeanDrop,
      spreadLoadMeanDrop,
      squareWaveMeanDrop,
      reservoirMeanDrop,
    ]) {
      expect(drop(0.5)).toBeUndefined();
      expect(drop(0)).toBeUndefined();
    }
  });
});

describe('ripple of a ladder', () => {
  // Naidu and Kamaraju, example 6.1: with the eight stages, not the sixteen capacitors, 24.00 kV or 1.200 %.
  it('of eight stages is 24 kV', () => {
    expectNear(columnRipple(5e-3, 150, equal(8, 0.05e-6)), 24.0e3, 1e-3);
  });
  // Wadhwa, example 2.1: 6.111 kV. Chapter 16, example 3: 52.00 kV.
  it('of ten and of twelve stages is that of the examples', () => {
    expectNear(columnRipple(1e-3, 150, equal(10, 0.06e-6)), 6.111e3, 1e-3);
    expectNear(columnRipple(5e-3, 50, equal(12, 0.15e-6)), 52.0e3, 1e-3);
  });
  // Nuclear-physics textbook, example 11.1, 2011 (companion code): 10 stages, 0.02 uF, 200 Hz, 4 mA, amplitude 27.50 kV.
  it('is twice the amplitude that some books print', () => {
    expectNear(columnRipple(4e-3, 200, equal(10, 0.02e-6))! / 2, 27.5e3, 1e-3);
  });
  // Simulation with ideal diodes and a reservoir of 100 C: 1.485 and 1.989 times I/(f Cout) for two and three stages.
  it('with a reservoir is (n+1)/2 in the slow limit', () => {
    const unit = 1e-3 / (1e4 * 1e-4);
    expectNear(reservoirRipple('slow', 2, 1e-3, 1e4, 1e-4)! / unit, 1.485, 0.0102);
    expectNear(reservoirRipple('slow', 3, 1e-3, 1e4, 1e-4)! / unit, 1.989, 0.0102);
    expectNear(reservoirRipple('fast', 2, 1e-3, 1e4, 1e-4)! / unit, 1, 1e-9);
  });
  it('has no answer without capacitors', () => {
    expect(columnRipple(1e-3, 50, [])).toBeUndefined();
    expect(reservoirRipple('slow', 1, 1e-3, 0, 1e-6)).toBeUndefined();
  });
});

describe('best number of stages', () => {
  // Naidu and Kamaraju 6.1: 13.69; Wadhwa 2.1: 30.00; chapter 16, example 3: 20.60; nuclear-physics textbook 11.1: 10.00.
  it.each([
    [125e3, 150, 0.05e-6, 5e-3, 13.69],
    [100e3, 150, 0.06e-6, 1e-3, 30],
    [Math.SQRT2 * 200e3, 50, 0.15e-6, 5e-3, 20.6],
    [100e3, 200, 0.02e-6, 4e-3, 10],
  ])('%d V, %d Hz, %d F, %d A: %d', (peakV, hertz, farads, amps, stages) => {
    expectNear(textbookOptimumStages(peakV, hertz, farads, amps), stages, 1e-3);
  });
  // Every number of stages tried by hand: 3.7, 7.05, 9.8, 11.7, 12.5, 11.95 V.
  it('on a board is the one with the most output', () => {
    expect(optimumStages(3.8, 1e4, 1e-6, 1e-3)).toBe(5);
    expect(optimumStages(3.8, 1e4, 1e-6, 0.1)).toBe(1);
  });
  it('has no answer without load', () => {
    expect(textbookOptimumStages(1, 1, 1, 0)).toBeUndefined();
    expect(optimumStages(1, 1, 1, 0)).toBeUndefined();
  });
});

describe('capacitance of the diodes', () => {
  // Simulation with ideal diodes, 5 V on 5 V, 5 %.
  it.each([
    [1, 9.545],
    [2, 13.7],
    [3, 17.86],
    [4, 22.03],
  ])('leaves %d stages with %d V', (stages, volts) => {
    expectNear(5 + swingWithJunctions(stages, 5, 1e-6, 0.05e-6)!, volts, 5e-4);
  });
  it('takes nothing when there is none, and has no answer without a flying capacitor', () => {
    expectNear(swingWithJunctions(3, 5, 1e-6, 0), 15, 1e-12);
    expect(swingWithJunctions(3, 5, 0, 1e-9)).toBeUndefined();
  });
});
