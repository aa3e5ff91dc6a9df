/** Pumps built from their values against published and derived closed forms, with diodes that lose next to nothing. */
import { describe, expect, it } from 'vitest';
import type { CapacitorValues, PumpValues } from '../../../core/pump/values';
import { solveValues } from '../../support/check-pump';
import { capacitor, fromGround, pinDrive, pump } from '../../support/circuits';
import { expectNear } from '../../support/near';

/** 0.14 mV at 1 mA. */
const diode = { saturation: 1e-9, slope: 1e-5, ohms: 0.01 };
const current = (amps: number): PumpValues['loads'] => [{ name: 'load', kind: 'current', amps }];

/** 10 kHz, 1 uF, 1 mA: `I/(f C)` is 0.1 V. Resistance sits in the capacitors, so that no diode turns off early. */
function ideal(
  topology: PumpValues['topology'],
  stages: number,
  change: Partial<PumpValues> = {},
): PumpValues {
  const column = Array.from({ length: stages }, () => capacitor(1e-6, 1));
  const pin = pinDrive(0.01);
  return pump({
    topology,
    stages,
    drives: topology === 'chain' && stages > 1 ? [pin, pinDrive(0.01, 0.01, true)] : [pin],
    flying: column,
    smoothing: topology === 'ladder' ? column : [],
    reservoir: capacitor(1e-3, 1e-3),
    diodes: Array.from({ length: topology === 'ladder' ? 2 * stages : stages + 1 }, () => diode),
    ...change,
  });
}
const down = (values: PumpValues) => fromGround({ ...values, negative: true });
const without = ({ reservoir: _reservoir, ...values }: PumpValues): PumpValues => values;

/** Loss of the mean output between two loads, in units of `I/(f C)` with the 1 uF of `ideal`; positive. */
function drop(values: PumpValues): number {
  const unit = loadFor(values, 0.1);
  const at = (loads: PumpValues['loads']) => Math.abs(solveValues({ ...values, loads }).average);
  return (at(unit) - at(loadFor(values, 0.2))) / 0.1;
}

/** The load whose `I/(f C)` is so many volts with 1 uF. */
function loadFor({ frequency }: PumpValues, volts: number): PumpValues['loads'] {
  return current(volts * frequency * 1e-6);
}

describe('slow limit', () => {
  // One charge per period through one capacitor: 1/(f C), whatever the direction (J. F. Dickson, 1976, for N = 1).
  it('of an inverter is 1/(f C), and it reaches the full swing below ground', () => {
    const inverter = down(ideal('chain', 1));
    expectNear(drop(inverter), 1, 1e-3);
    expectNear(solveValues({ ...inverter, loads: current(1e-6) }).average, -5, 1e-3);
  });
  // J. F. Dickson, IEEE JSSC SC-11(3), 1976: N/(f C); mirrored it is the same.
  it.each([2, 3, 4])('of a negative multiplier of %d stages is N/(f C)', (stages) => {
    expectNear(drop(down(ideal('chain', stages))), stages, 1e-3);
  });
  // Charge balance for a square wave and a large reservoir: n(n+1)(5n+1)/12, less than the textbooks' sine.
  it.each([
    [1, 1],
    [2, 5.5],
    [3, 16],
    [4, 35],
  ])('of a negative ladder of %d stages is %d/(f C)', (stages, factor) => {
    expectNear(drop(down(ideal('ladder', stages))), factor, 1e-3);
  });
  // M. D. Seeman, S. R. Sanders, 2008: the sum of 1/(f C) over capacitors of any size.
  it('of a multiplier with unequal capacitors is the sum over them', () => {
    const flying = [2e-6, 1e-6, 0.5e-6].map((farads) => capacitor(farads, 1));
    expectNear(drop(ideal('chain', 3, { flying })), 0.5 + 1 + 2, 1e-3);
  });
  // Kuffel, Zaengl, Kuffel 2000 (from memory: confirm): doubling the first coupling capacitor saves n^2/2.
  it('of a ladder falls by n^2/2 when its first coupling capacitor is doubled', () => {
    const flying = [capacitor(2e-6, 0.5), capacitor(1e-6, 1)];
    expectNear(drop(ideal('ladder', 2, { flying })), 5.5 - 2, 2e-3);
  });
  // Charge balance, minimum of the sum over both columns: 7.09 instead of 16.
  it('of a ladder of three stages with capacitors as 3 : 2 : 1 is 7.09/(f C)', () => {
    const column: CapacitorValues[] = [3, 2, 1].map((share) => capacitor(share * 1e-6, 1 / share));
    expectNear(drop(ideal('ladder', 3, { flying: column, smoothing: column })), 7.09, 2e-3);
  });
});

describe('a ladder without reservoir on a square wave', () => {
  // Charge balance with the load spread evenly over the period, half duty: mean 2n^3/3 + n^2/4 + 7n/48, peak to peak
  // n^2/2 + n/4; also simulated with ideal diodes.
  it.each([
    [1, 1.0625, 0.75],
    [2, 6.625, 2.5],
    [3, 20.6875, 5.25],
    [4, 47.25, 9],
  ])('of %d stages loses %d and ripples by %d', (stages, mean, peakToPeak) => {
    const values = without(ideal('ladder', stages, { frequency: 500 }));
    expectNear(drop(values), mean, 1e-3);
    const { ripple } = solveValues({ ...values, loads: loadFor(values, 0.1) });
    expectNear(ripple / 0.1, peakToPeak, 1e-2);
  });
  // The same for a high share D: mean (2n^3+n)/3 - n D^2/4 + (1-D)(n(n-1)/2 + n(1-D)/2), peak to peak n(n-1)/2 + n(1-D/2).
  it.each([0.3, 0.7])('at duty %d loses and ripples as charge balance says', (duty) => {
    const n = 2;
    const values = without(ideal('ladder', n, { frequency: 500, duty }));
    const mean =
      (2 * n ** 3 + n) / 3 - (n * duty ** 2) / 4 + (1 - duty) * ((n * (n - 1)) / 2 + (n * (1 - duty)) / 2);
    expectNear(drop(values), mean, 1e-3);
    const { ripple } = solveValues({ ...values, loads: loadFor(values, 0.1) });
    expectNear(ripple / 0.1, (n * (n - 1)) / 2 + n * (1 - duty / 2), 1e-2);
  });
});

describe('ripple of a ladder with a large reservoir', () => {
  // Charge balance: (n+1)/2 I/(f Cout) when all settles beside a reservoir of 1000 C, n/2 when resistance rules.
  it.each([
    [2, 1.5],
    [3, 2],
  ])('of %d stages that settle is %d I/(f Cout)', (stages, factor) => {
    const values = ideal('ladder', stages, {
      frequency: 500,
      reservoir: capacitor(1e-3, 1e-3),
      loads: current(0.05e-3),
    });
    expectNear(solveValues(values, { tolerance: 1e-5 }).ripple, factor * 0.1e-3, 3e-3);
  });
  it.each([
    [2, 1],
    [3, 1.5],
  ])('of %d stages behind resistance is %d I/(f Cout)', (stages, factor) => {
    const column = Array.from({ length: stages }, () => capacitor(1e-3, 20));
    const values = ideal('ladder', stages, {
      frequency: 50e3,
      flying: column,
      smoothing: column,
      reservoir: capacitor(10e-6, 1e-3),
      loads: current(1e-3),
    });
    expectNear(solveValues(values).ripple, factor * 2e-3, 2e-2);
  });
});

describe('a worked ladder', () => {
  // 15 V less six drops of 0.6 V less 16 I/(f C) of 0.1 V: 9.800 V; a textbook's sine would leave 8.9 V.
  it('of three stages with 0.6 V in each diode stands at 9.8 V', () => {
    // Drops 0.6 V at the 20 uA to which its current has fallen when half a period is over: slope C / (2 50 us).
    const sharp = { saturation: 20e-6 * Math.exp(-300), slope: 2e-3, ohms: 0.01 };
    const values = fromGround(ideal('ladder', 3, { diodes: Array.from({ length: 6 }, () => sharp) }));
    expectNear(solveValues(values).average, 9.8, 2e-3);
  });
});

describe('symmetry', () => {
  const circuits: Readonly<Record<string, PumpValues>> = {
    'chain of 1': ideal('chain', 1),
    'chain of 3': ideal('chain', 3),
    'ladder of 2': ideal('ladder', 2),
    'ladder of 3 without reservoir': without(ideal('ladder', 3)),
  };
  // Mirror the voltages and let high and low change places: the equations are the same.
  it.each(Object.entries(circuits))('the negative twin mirrors the positive one: %s', (_, values) => {
    const drives = (high: number, low: number) =>
      values.drives.map(({ opposite }) => pinDrive(high, low, opposite));
    const positive = fromGround({ ...values, duty: 0.3, drives: drives(20, 35), reservoir: capacitor(4e-6) });
    const negative = { ...positive, negative: true, duty: 0.7, drives: drives(35, 20) };
    const up = solveValues(positive, { tolerance: 1e-6 });
    const below = solveValues(negative, { tolerance: 1e-6 });
    expectNear(-below.average, up.average, 1e-6);
    expectNear(below.ripple, up.ripple, 1e-3);
    expectNear(below.pinRms[0]!, up.pinRms[0]!, 1e-4);
  });
  // At half duty an exchange of the phases is a shift by half a period.
  it.each([2, 3, 4])('a multiplier of %d stages does not mind which phase is which', (stages) => {
    const pins = [pinDrive(20, 35), pinDrive(50, 15, true)];
    const values = ideal('chain', stages, { drives: pins });
    const exchanged = { ...values, drives: pins.map((d) => ({ ...d, opposite: !d.opposite })) };
    const [one, other] = [values, exchanged].map((v) => solveValues(v, { tolerance: 1e-6 }));
    expectNear(other!.average, one!.average, 1e-6);
    expectNear(other!.ripple, one!.ripple, 1e-3);
    expect(one!.average).toBeGreaterThan(5 * stages);
  });
});
