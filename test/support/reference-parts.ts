/** Building blocks of the pumps that are compared with the independent reference: parts, drives, loads, topologies. */
import type {
  CapacitorValues,
  DiodeValues,
  DriverValues,
  DriveValues,
  LoadValues,
  OutputValues,
  PumpValues,
  TransistorValues,
} from '../../core/pump/values';
import { capacitor, fromGround, pump } from './circuits';

const thermal = 0.02569;
/** Class values, from memory: confirm. */
export const silicon: DiodeValues = { saturation: 2.5e-9, slope: 1.75 * thermal, ohms: 0.6 };
export const schottky: DiodeValues = { saturation: 2.2e-8, slope: 1.03 * thermal, ohms: 1.15 };
export const hot: DiodeValues = { saturation: 8e-7, slope: 1.03 * 1.2 * thermal, ohms: 1.2 };
const transistor: TransistorValues = {
  saturation: 1e-14,
  slope: thermal,
  gain: 200,
  reverseGain: 5,
  baseOhms: 10,
  collectorOhms: 2,
  emitterOhms: 0.1,
};
const pnp: TransistorValues = { ...transistor, gain: 180, collectorOhms: 3 };

export const pin = (highOhms: number, lowOhms: number): OutputValues => ({
  rail: 0,
  highDrop: 0,
  highOhms,
  lowVolts: 0,
  lowOhms,
});
/** Bipolar astable timer: high level well below its supply. */
export const timer: OutputValues = { rail: 0, highDrop: 1.3, highOhms: 4, lowVolts: 0.2, lowOhms: 10 };
export const on = (clock: OutputValues, driver?: DriverValues): DriveValues[] => [
  { clock, opposite: false, ...(driver ? { driver } : {}) },
];
export const twoPhase = (first: OutputValues, second = first, driver?: DriverValues): DriveValues[] => [
  ...on(first, driver),
  ...on(second, driver).map((drive) => ({ ...drive, opposite: true })),
];
export const pushPull = (base: DriverValues['base']): DriverValues => ({
  kind: 'push-pull',
  rail: 0,
  npn: transistor,
  pnp,
  base,
});
export const follower: DriverValues = {
  kind: 'follower',
  rail: 0,
  npn: transistor,
  pnp,
  base: { npn: 0, pnp: 0 },
};

export const ohms = (value: number): LoadValues => ({ name: 'resistor', kind: 'resistance', ohms: value });
export const amps = (value: number): LoadValues => ({ name: 'current', kind: 'current', amps: value });
export const watts = (value: number, knee = 1): LoadValues => ({
  name: 'power',
  kind: 'power',
  watts: value,
  knee,
});

export const all = <T>(count: number, value: T): T[] => Array.from({ length: count }, () => value);
export const uf = (microfarads: number, esr = 0.02): CapacitorValues => capacitor(1e-6 * microfarads, esr);
export const rail = (volts: number, source = 0) => ({ name: `rail ${volts}`, volts, ohms: source });

/** 3.3 V, 50 kHz. */
const base = (change: Partial<PumpValues>): PumpValues => {
  const stages = change.stages ?? 1;
  const ladder = change.topology === 'ladder';
  return pump({
    rails: [rail(3.3)],
    frequency: 50e3,
    drives: on(pin(28, 21)),
    flying: all(stages, uf(1)),
    smoothing: ladder ? all(stages, uf(1)) : [],
    reservoir: uf(4.7),
    diodes: all(ladder ? 2 * stages : stages + 1, schottky),
    loads: [amps(1e-3)],
    ...change,
  });
};
export const chain = (stages: number, change: Partial<PumpValues> = {}) =>
  base({ stages, drives: stages > 1 ? twoPhase(pin(28, 21)) : on(pin(28, 21)), ...change });
export const ladder = (stages: number, change: Partial<PumpValues> = {}) =>
  base({ topology: 'ladder', stages, loads: [amps(0.3e-3)], ...change });
export const down = (values: PumpValues) => fromGround({ ...values, negative: true });
export const without = ({ reservoir: _reservoir, ...values }: PumpValues): PumpValues => values;
