/**
 * Clocks that are circuits of their own: the astable timer, the Schmitt-inverter oscillator, an external generator.
 */
import type { GateData, TimerData } from '../catalog/part';
import { astableTiming, type SquareTiming } from '../compute/astable-timing';
import { schmittTiming } from '../compute/schmitt-timing';
import type { Clock } from '../model/board';
import { type Band, exactly } from '../quantity/figure';
import type { ClockOutput, ClockTiming } from './clock-source';
import { type Gap, isGap } from './gap';
import { pinResistance } from './pin-resistance';
import type { RailVoltage } from './pump-solution';

export interface Oscillator {
  readonly timing: ClockTiming;
  readonly output: ClockOutput;
  readonly ownCurrent: Band | null;
}

export function oscillator(clock: Clock, voltage: RailVoltage): Oscillator | Gap {
  if (clock.astable) return astable(clock, clock.astable, voltage);
  if (clock.schmitt) return schmitt(clock, clock.schmitt, voltage);
  if (clock.external) return external(clock, clock.external);
  return { because: `the clock ${clock.name} has no source` };
}

function railOf(clock: Clock, voltage: RailVoltage): { name: string; band: Band } | Gap {
  if (!clock.rail) return { because: `the clock ${clock.name} has no rail` };
  const band = voltage(clock.rail.name);
  return isGap(band) ? band : { name: clock.rail.name, band };
}

function astable(
  clock: Clock,
  { charge, discharge, timing, part }: NonNullable<Clock['astable']>,
  voltage: RailVoltage,
): Oscillator | Gap {
  const rail = railOf(clock, voltage);
  if (isGap(rail)) return rail;
  const data: TimerData | undefined = part?.data;
  if (!data) return { because: `the timer of ${clock.name} is not known` };
  if (!charge || !discharge || !timing) return { because: `a timing part of ${clock.name} is not known` };
  // Larger parts make it slower; the duty grows with the charge resistor and falls with the other one.
  const ends = {
    slow: astableTiming(charge.max, discharge.max, timing.max),
    typical: astableTiming(charge.typical, discharge.typical, timing.typical),
    fast: astableTiming(charge.min, discharge.min, timing.min),
    long: astableTiming(charge.max, discharge.min, timing.typical),
    short: astableTiming(charge.min, discharge.max, timing.typical),
  };
  const bands = timingBands(ends.slow, ends.typical, ends.fast, ends.short, ends.long);
  if (!bands) return { because: `the timing parts of ${clock.name} make no oscillation` };
  return {
    timing: bands,
    ownCurrent: data.draws ?? null,
    output: {
      label: `${clock.name} timer`,
      path: `${clock.path}.astable.part`,
      railName: rail.name,
      highVolts: undefined,
      highDrop: data.highDrop ?? exactly(0),
      highOhms: data.highResistance ?? exactly(1),
      lowVolts: data.lowVoltage ?? exactly(0),
      lowOhms: data.lowResistance ?? exactly(1),
    },
  };
}

function schmitt(
  clock: Clock,
  { resistor, capacitor, part }: NonNullable<Clock['schmitt']>,
  voltage: RailVoltage,
): Oscillator | Gap {
  const rail = railOf(clock, voltage);
  if (isGap(rail)) return rail;
  const data: GateData | undefined = part?.data;
  const { rising, falling, thresholdSupply } = data ?? {};
  if (!data || !rising || !falling) return { because: `the thresholds of ${clock.name} are not known` };
  if (!resistor || !capacitor) return { because: `a timing part of ${clock.name} is not known` };
  const highOhms = pinResistance(data.output, 'high', rail.band.typical);
  const lowOhms = pinResistance(data.output, 'low', rail.band.typical);
  if (!highOhms || !lowOhms) return { because: `the output resistance of ${clock.name} is not known` };
  const supply = rail.band.typical;
  // Thresholds of a CMOS input follow its supply (common practice, no source).
  const scale = thresholdSupply ? supply / thresholdSupply.typical : 1;
  const at = (up: number, down: number, ohm: number, farads: number) =>
    schmittTiming({
      ohm,
      farads,
      highV: supply,
      lowV: 0,
      risingV: Math.min(scale * up, 0.999 * supply),
      fallingV: scale * down,
    });
  const bands = timingBands(
    at(rising.max, falling.min, resistor.max, capacitor.max),
    at(rising.typical, falling.typical, resistor.typical, capacitor.typical),
    at(Math.max(rising.min, 1.01 * falling.max), falling.max, resistor.min, capacitor.min),
    at(Math.max(rising.min, 1.01 * falling.min), falling.min, resistor.typical, capacitor.typical),
    at(rising.max, falling.max, resistor.typical, capacitor.typical),
  );
  if (!bands) return { because: `the timing parts of ${clock.name} make no oscillation` };
  return {
    timing: bands,
    ownCurrent: data.draws ?? null,
    output: {
      label: `${clock.name} gate`,
      path: `${clock.path}.schmitt.part`,
      railName: rail.name,
      highVolts: undefined,
      highDrop: exactly(0),
      highOhms,
      lowVolts: exactly(0),
      lowOhms,
    },
  };
}

function external(
  clock: Clock,
  { frequency, duty, high, low, resistance }: NonNullable<Clock['external']>,
): Oscillator | Gap {
  if (!frequency || !high) return { because: `the generator of ${clock.name} needs frequency and high` };
  const ohms = resistance && resistance.min > 0 ? resistance : exactly(1e-3);
  return {
    timing: { frequency, duty: duty ?? exactly(0.5) },
    ownCurrent: null,
    output: {
      label: `${clock.name} generator`,
      path: `${clock.path}.external`,
      railName: undefined,
      highVolts: high,
      highDrop: exactly(0),
      highOhms: ohms,
      lowVolts: low ?? exactly(0),
      lowOhms: ohms,
    },
  };
}

/** Bands from timings at the ends: of the frequency, and of the duty. */
function timingBands(
  slow: SquareTiming | undefined,
  typical: SquareTiming | undefined,
  fast: SquareTiming | undefined,
  short: SquareTiming | undefined,
  long: SquareTiming | undefined,
): ClockTiming | undefined {
  if (!slow || !typical || !fast || !short || !long) return undefined;
  const duties = [typical.duty, short.duty, long.duty];
  return {
    frequency: { min: slow.frequencyHz, typical: typical.frequencyHz, max: fast.frequencyHz },
    duty: { min: Math.min(...duties), typical: typical.duty, max: Math.max(...duties) },
  };
}
