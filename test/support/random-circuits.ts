/**
 * Random pumps over the ranges that the engine must stand: fixed seed, so that a failure can be had again.
 */
import type { PumpValues } from '../../core/pump/values';
import { pinDrive } from './circuits';

/** Numbers from 0 to 1 by a 32-bit mixing generator (xorshift and multiply; from memory). */
export function randomNumbers(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = state;
    mixed = Math.imul(mixed ^ (mixed >>> 15), mixed | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}

/** The same behind a push-pull stage (with separate or joined bases) or a follower, its clock on a level of its own. */
export function randomDriven(random: () => number): PumpValues {
  const values = randomPump(random);
  const within = (low: number, high: number) => low * (high / low) ** random();
  const transistor = () => ({
    saturation: within(1e-15, 1e-13),
    slope: 0.0258,
    gain: within(30, 400),
    reverseGain: within(1, 20),
    baseOhms: within(1, 30),
    collectorOhms: within(0.3, 5),
    emitterOhms: within(0.02, 0.5),
  });
  const kind = random();
  const npn = transistor();
  const pnp = transistor();
  const base = within(300, 100e3);
  const highDrop = random() < 0.4 ? Math.min(1.4, 0.4 * values.rails[0]!.volts) : 0;
  return {
    ...values,
    drives: values.drives.map(({ clock, opposite }) => ({
      clock: { ...clock, highDrop },
      opposite,
      driver: {
        kind: kind < 0.8 ? 'push-pull' : 'follower',
        rail: 0,
        npn,
        pnp,
        base:
          kind < 0.6
            ? { npn: base, pnp: base * (0.5 + random()) }
            : kind < 0.8
              ? { shared: base }
              : { npn: 0, pnp: 0 },
      },
    })),
  };
}

/**
 * 10 Hz to 1 MHz, 1 nF to 1 mF, no load to near short and currents up to what cannot be carried,
 * saturation currents 1e-14 to 1e-5 A, drives of 5 to 500 ohm, 1 to 6 stages.
 */
export function randomPump(random: () => number): PumpValues {
  const within = (low: number, high: number) => low * (high / low) ** random();
  const chance = (share: number) => random() < share;
  const ladder = chance(0.5);
  const stages = 1 + Math.floor(6 * random());
  const negative = chance(0.4);
  const volts = 2 + 13 * random();
  const ohms = within(5, 500);
  const highOhms = ohms * (0.7 + 0.6 * random());
  const drive = pinDrive(highOhms, ohms);
  const diode = {
    saturation: within(1e-14, 1e-5),
    slope: (1 + random()) * 0.0258,
    ohms: within(0.01, 10),
  };
  const capacitor = () => ({ farads: within(1e-9, 1e-3), ohms: within(1e-3, 3) });
  const one = capacitor();
  const alike = chance(0.5);
  const column = Array.from({ length: stages }, () => (alike ? one : capacitor()));
  const kind = random();
  return {
    topology: ladder ? 'ladder' : 'chain',
    stages,
    negative,
    rails: [{ name: 'supply', volts, ohms: 0 }],
    ...(negative || chance(0.3) ? {} : { input: 0 }),
    frequency: within(10, 1e6),
    duty: 0.1 + 0.8 * random(),
    rise: 0,
    fall: 0,
    drives: !ladder && stages > 1 ? [drive, pinDrive(highOhms, ohms, true)] : [drive],
    series: chance(0.2) ? within(1, 1000) : 0,
    flying: column,
    smoothing: ladder ? column : [],
    ...(ladder && chance(0.5) ? {} : { reservoir: capacitor() }),
    diodes: Array.from({ length: ladder ? 2 * stages : stages + 1 }, () => diode),
    loads:
      kind < 0.4
        ? [{ name: 'resistor', kind: 'resistance', ohms: within(1, 1e9) }]
        : kind < 0.75
          ? [{ name: 'current', kind: 'current', amps: within(1e-7, 1) }]
          : kind < 0.92
            ? [{ name: 'power', kind: 'power', watts: within(1e-6, 1), knee: 0.5 + random() }]
            : [],
  };
}
