/** Pumps drawn by lot within the range of sound designs, for the comparison with the independent reference. */
import type { LoadValues, PumpValues } from '../../core/pump/values';
import { capacitor } from './circuits';
import { randomNumbers } from './random-circuits';
import { amps, follower, ohms, pushPull, rail, watts } from './reference-parts';

/** Every topology of 1 to 4 stages, every kind of drive and load; the load asks for up to a third of what there is. */
export function drawnCircuits(count: number, seed: number): PumpValues[] {
  const random = randomNumbers(seed);
  return Array.from({ length: count }, () => drawn(random));
}

function drawn(random: () => number): PumpValues {
  const between = (low: number, high: number) => low + (high - low) * random();
  const decades = (low: number, high: number) => low * (high / low) ** random();
  const chance = (share: number) => random() < share;
  const topology = chance(0.5) ? 'ladder' : 'chain';
  const stages = 1 + Math.floor(4 * random());
  const negative = chance(0.4);
  const volts = between(3, 6);
  const farads = decades(0.1e-6, 10e-6);
  const frequency = decades(1, 20) / (farads * 1e3);
  const capacitorAbout = (scale: number) => capacitor(scale * farads * between(0.7, 1.4), decades(0.02, 1));
  const column = () => Array.from({ length: stages }, () => capacitorAbout(1));
  const diode = () => ({
    saturation: decades(1e-9, 1e-6),
    slope: between(0.026, 0.045),
    ohms: decades(0.3, 3),
  });
  const driver = chance(0.5) ? undefined : chance(0.5) ? follower : pushPull({ npn: 2.2e3, pnp: 3.3e3 });
  const clock = {
    rail: 0,
    highDrop: chance(0.3) ? between(0.1, 0.6) : 0,
    highOhms: decades(10, 60),
    lowVolts: chance(0.3) ? between(0.05, 0.2) : 0,
    lowOhms: decades(10, 60),
  };
  const drive = { clock, opposite: false, ...(driver ? { driver } : {}) };
  const edge = () => (chance(0.3) ? between(0.005, 0.05) / frequency : 0);
  // What a stage of a few tens of ohm can carry, shared by the stages.
  const most = (volts * farads * frequency) / (3 * stages ** (topology === 'ladder' ? 3 : 1));
  const asked = decades(0.02, 0.3) * most;
  const out = volts * stages;
  const loads: LoadValues[] = [
    [amps(asked)],
    [ohms(out / asked)],
    [watts(0.5 * out * asked)],
    [amps(asked / 2), ohms((2 * out) / asked)],
  ][Math.floor(4 * random())]!;
  return {
    topology,
    stages,
    negative,
    rails: [rail(volts, chance(0.5) ? decades(0.5, 10) : 0)],
    ...(negative || chance(0.3) ? {} : { input: 0 }),
    frequency,
    duty: between(0.3, 0.7),
    rise: edge(),
    fall: edge(),
    drives: topology === 'chain' && stages > 1 ? [drive, { ...drive, opposite: true }] : [drive],
    series: chance(0.3) ? decades(5, 50) : 0,
    flying: column(),
    smoothing: topology === 'ladder' ? column() : [],
    ...(topology === 'ladder' && chance(0.5) ? {} : { reservoir: capacitorAbout(decades(1, 10)) }),
    diodes: Array.from({ length: topology === 'ladder' ? 2 * stages : stages + 1 }, diode),
    loads,
  };
}
