import { describe, expect, it } from 'vitest';
import { astableTiming } from '../../../core/compute/astable-timing';
import { schmittTiming } from '../../../core/compute/schmitt-timing';
import { chooseRegisters, upCounter, upDownCounter } from '../../../core/compute/timer-registers';
import { expectNear } from '../../support/near';

describe('timer chip as an astable', () => {
  // Timer data sheets print 1.44/((RA + 2 RB) C): 6857 Hz for 1 kohm, 10 kohm, 10 nF.
  it('agrees with the printed formula within its rounding', () => {
    const timing = astableTiming(1e3, 10e3, 10e-9)!;
    expectNear(timing.frequencyHz, 1.44 / (21e3 * 10e-9), 2e-3);
    expectNear(timing.highS, 76.25e-6, 1e-4);
    expectNear(timing.lowS, 69.31e-6, 1e-4);
    expectNear(timing.duty, 11 / 21, 1e-12);
  });
  it('has no answer without a resistor', () => {
    expect(astableTiming(0, 10e3, 10e-9)).toBeUndefined();
  });
});

describe('Schmitt inverter as an oscillator', () => {
  const oscillator = { ohm: 10e3, farads: 10e-9, highV: 4.5, lowV: 0, risingV: 2.36, fallingV: 1.53 };
  // Typical thresholds of an HC single Schmitt inverter data sheet at 4.5 V, put into the two exponentials by hand.
  it('runs at 13.14 kHz with typical thresholds', () => {
    const timing = schmittTiming(oscillator)!;
    expectNear(timing.frequencyHz, 13.14e3, 5e-4);
    expectNear(timing.duty, 0.4306, 5e-4);
  });
  // The thresholds are reached: the capacitor's exponential from one to the other, evaluated at the times found.
  it('crosses its thresholds at the times it says', () => {
    const { highS, lowS } = schmittTiming(oscillator)!;
    expectNear(4.5 + (1.53 - 4.5) * Math.exp(-highS / 1e-4), 2.36, 1e-12);
    expectNear(2.36 * Math.exp(-lowS / 1e-4), 1.53, 1e-12);
  });
  // Data sheet limits: 3.15 V over 0.9 V against 1.7 V over 1.3 V differ by a factor of 5.6 in frequency.
  it('shows how far parts may differ', () => {
    const slow = schmittTiming({ ...oscillator, risingV: 3.15, fallingV: 0.9 })!;
    const fast = schmittTiming({ ...oscillator, risingV: 1.7, fallingV: 1.3 })!;
    expectNear(fast.frequencyHz / slow.frequencyHz, 5.6, 0.01);
  });
  it('has no answer when a threshold lies outside the levels', () => {
    expect(schmittTiming({ ...oscillator, highV: 2 })).toBeUndefined();
    expect(schmittTiming({ ...oscillator, fallingV: 0 })).toBeUndefined();
  });
});

describe('counter of a microcontroller', () => {
  // AVR data sheets, fast PWM: clock/(N 256); 16 MHz gives 62.5 kHz. Phase-correct: clock/(N 510), 31.373 kHz.
  it('makes the frequencies of the data sheets', () => {
    expectNear(upCounter(16e6, 1, 255, 128)?.frequencyHz, 62500, 1e-12);
    expectNear(upCounter(16e6, 1, 255, 128)?.duty, 0.5, 1e-12);
    expectNear(upDownCounter(16e6, 1, 255, 51)?.frequencyHz, 31372.549, 1e-6);
    expectNear(upDownCounter(16e6, 1, 255, 51)?.duty, 0.2, 1e-12);
  });
  // RP2040 data sheet, PWM divider: 125 MHz / 10 / 125 = 100 kHz.
  it('takes a fractional divider', () => {
    expectNear(upCounter(125e6, 10, 124, 60)?.frequencyHz, 100e3, 1e-12);
    expectNear(upCounter(125e6, 12.5, 99, 50)?.frequencyHz, 100e3, 1e-12);
  });
  // Worked by hand: 16 MHz/363 = 44 077 Hz; 16 MHz/(8 45) = 44 444 Hz.
  it('finds registers for a wanted frequency', () => {
    const wide = chooseRegisters(16e6, 44100, [64, 1, 8], 65535)!;
    expect(wide).toMatchObject({ prescaler: 1, top: 362 });
    expectNear(wide.error, -0.0005185, 1e-3);
    const narrow = chooseRegisters(16e6, 44100, [1, 8, 64], 255)!;
    expect(narrow).toMatchObject({ prescaler: 8, top: 44 });
    expectNear(narrow.error, 0.007811, 1e-3);
  });
  it('has no answer out of reach', () => {
    expect(chooseRegisters(16e6, 20e6, [1, 8], 255)).toBeUndefined();
    expect(chooseRegisters(16e6, 1, [1, 8], 255)).toBeUndefined();
    expect(upCounter(16e6, 1, 255, 257)).toBeUndefined();
    expect(upDownCounter(16e6, 1, 0, 0)).toBeUndefined();
  });
});
