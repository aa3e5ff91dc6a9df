/** Pumps of every topology on the pins of a chip, for the comparison with the independent reference. */
import type { PumpValues } from '../../core/pump/values';
import { fromGround } from './circuits';
import {
  all,
  amps,
  chain,
  down,
  hot,
  ladder,
  ohms,
  pin,
  rail,
  schottky,
  silicon,
  twoPhase,
  uf,
  watts,
  without,
} from './reference-parts';

export const pinCircuits: Record<string, PumpValues> = {
  'doubler, slow edges, resistor': chain(1, { rise: 1e-6, fall: 0.5e-6, loads: [ohms(4.7e3)] }),
  'doubler, input and pin on different soft rails': chain(1, {
    rails: [rail(3.3, 2), rail(5, 15)],
    input: 1,
    loads: [amps(4e-3)],
  }),
  'doubler, one soft rail for both': chain(1, { rails: [rail(5, 25)], diodes: all(2, silicon) }),
  'doubler, series resistor, resistor and current': chain(1, {
    series: 47,
    loads: [amps(2e-3), ohms(10e3)],
  }),
  'doubler, constant power': chain(1, { loads: [watts(12e-3)] }),
  'doubler, one megohm': chain(1, { loads: [ohms(1e6)] }),
  'doubler, slow, all kinds of load': chain(1, {
    frequency: 3e3,
    diodes: all(2, silicon),
    loads: [watts(1e-3), amps(0.2e-3), ohms(22e3)],
  }),
  'doubler, unlike diodes, duty 30 %': chain(1, { duty: 0.3, diodes: [silicon, hot] }),
  'inverter, constant power': down(chain(1, { loads: [watts(3e-3, 0.5)] })),
  'inverter, slow edges on a soft rail': down(
    chain(1, { rails: [rail(5, 10)], rise: 2e-6, fall: 2e-6, loads: [amps(3e-3)] }),
  ),
  'inverter, resistor and current, duty 65 %': down(chain(1, { duty: 0.65, loads: [ohms(3e3), amps(1e-3)] })),
  'multiplier of 2': chain(2),
  'multiplier of 3, every capacitor different': chain(3, { flying: [uf(2.2), uf(1, 0.5), uf(0.47)] }),
  'multiplier of 4, every diode different': chain(4, {
    diodes: [silicon, schottky, hot, schottky, silicon],
    loads: [amps(0.5e-3)],
  }),
  'multiplier of 6, resistor': chain(6, { loads: [ohms(68e3)] }),
  'multiplier of 3, unlike pins, duty 40 %': chain(3, {
    duty: 0.4,
    drives: twoPhase(pin(60, 30), pin(20, 35)),
  }),
  'multiplier of 4 on a soft rail, constant power': chain(4, {
    rails: [rail(3.3, 12)],
    loads: [watts(8e-3, 2)],
  }),
  'multiplier of 2, slow edges, series resistor': chain(2, { rise: 1e-6, fall: 2e-6, series: 22 }),
  'negative multiplier of 2': down(chain(2)),
  'negative multiplier of 3, slow edges, mixed load': down(
    chain(3, { rise: 0.5e-6, fall: 1e-6, loads: [ohms(20e3), amps(0.2e-3)] }),
  ),
  'ladder of 1': ladder(1, { loads: [amps(1e-3)] }),
  'ladder of 2 without reservoir, resistor': without(ladder(2, { loads: [ohms(20e3)] })),
  'ladder of 3 on ground': fromGround(ladder(3)),
  'ladder of 4, resistor': ladder(4, { loads: [ohms(82e3)] }),
  'ladder of 6 on ground, negative': down(ladder(6, { rails: [rail(5)], loads: [amps(0.1e-3)] })),
  'ladder of 2, negative, every diode different': down(
    ladder(2, { diodes: [silicon, schottky, hot, schottky] }),
  ),
  'ladder of 3, tapered, series resistor': ladder(3, {
    series: 33,
    flying: [uf(3.3), uf(2.2), uf(1)],
    smoothing: [uf(2.2), uf(1.5), uf(1)],
  }),
  'ladder of 2, slow edges, constant power': ladder(2, { rise: 1e-6, fall: 1e-6, loads: [watts(4e-3)] }),
  'ladder of 4 on a soft rail, negative, without reservoir': without(
    down(ladder(4, { rails: [rail(5, 18)], loads: [ohms(100e3)] })),
  ),
};
