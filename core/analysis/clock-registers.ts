/**
 * Frequency and duty that a counter really makes from its registers.
 */
import { upCounter } from '../compute/timer-registers';
import type { Clock, TimerRegisters } from '../model/board';
import { type Band, exactly } from '../quantity/figure';
import type { ClockTiming } from './clock-source';
import type { Gap } from './gap';

/** A counter that runs from 0 to `top`; without `compare` the pin toggles, which makes half the time high. */
export function registerWave(clock: Clock, registers: TimerRegisters): ClockTiming | Gap {
  const { input, prescaler, top, compare } = registers;
  if (!input || !top) return { because: `the timer of ${clock.name} needs input and top` };
  const steps = Math.round(top.typical);
  const ticks = compare ? Math.round(compare.typical) : (steps + 1) / 2;
  const divide = prescaler?.typical ?? 1;
  const wave = (hertz: number) => upCounter(hertz, divide, steps, Math.floor(ticks));
  const [min, typical, max] = [wave(input.min), wave(input.typical), wave(input.max)];
  if (!min || !typical || !max) return impossible(clock, registers);
  const frequency: Band = {
    min: min.frequencyHz,
    typical: typical.frequencyHz,
    max: max.frequencyHz,
  };
  const duty = compare ? typical.duty : 0.5;
  return duty > 0 && duty < 1 ? { frequency, duty: exactly(duty) } : impossible(clock, registers);
}

function impossible(clock: Clock, registers: TimerRegisters): Gap {
  const top = registers.top?.typical;
  return {
    because: `the registers of ${clock.name} make no square wave`,
    finding: {
      code: 'clock-unreachable',
      severity: 'error',
      at: `${clock.path}.timer`,
      span: registers.compare?.span ?? registers.span,
      message:
        `With these registers the pin of ${clock.name} never changes: compare must be whole, above 0 and at most ` +
        `top${top === undefined ? '' : ` (${top})`}, and the prescaler 1 or more.`,
    },
  };
}
