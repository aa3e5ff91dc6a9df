/** Pumps on timers and on stages of two transistors, for the comparison with the independent reference. */
import type { PumpValues } from '../../core/pump/values';
import {
  all,
  amps,
  chain,
  down,
  follower,
  ladder,
  ohms,
  on,
  pin,
  pushPull,
  rail,
  timer,
  twoPhase,
  uf,
  watts,
} from './reference-parts';

const five = { rails: [rail(5)], frequency: 5e3, flying: [uf(10, 0.3)], reservoir: uf(47, 0.3) };

export const driverCircuits: Record<string, PumpValues> = {
  'doubler on a timer, slow edges': chain(1, { ...five, drives: on(timer), rise: 1e-6, fall: 1e-6 }),
  'inverter on a timer, duty 60 %': down(chain(1, { ...five, duty: 0.6, drives: on(timer) })),
  'ladder of 2 on a timer': ladder(2, { rails: [rail(5)], frequency: 20e3, drives: on(timer) }),
  'push-pull, doubler': chain(1, {
    ...five,
    drives: on(pin(30, 30), pushPull({ npn: 2.2e3, pnp: 2.2e3 })),
    loads: [amps(5e-3)],
  }),
  'push-pull behind a timer whose high level leaves the upper transistor on': chain(1, {
    ...five,
    drives: on(timer, pushPull({ npn: 15e3, pnp: 15e3 })),
    loads: [ohms(4.7e3)],
  }),
  'push-pull with a shared base resistor': chain(1, {
    ...five,
    drives: on(pin(30, 30), pushPull({ shared: 1e3 })),
  }),
  'push-pull that starves': chain(1, {
    ...five,
    drives: on(pin(30, 30), pushPull({ npn: 100e3, pnp: 100e3 })),
    loads: [amps(6e-3)],
  }),
  'push-pull, slow edges, soft rail, series resistor': chain(1, {
    ...five,
    rails: [rail(5, 5)],
    drives: on(pin(30, 30), pushPull({ npn: 3.3e3, pnp: 4.7e3 })),
    rise: 2e-6,
    fall: 2e-6,
    series: 10,
  }),
  'push-pull, inverter': down(
    chain(1, {
      ...five,
      drives: on(pin(40, 45), pushPull({ npn: 4.7e3, pnp: 4.7e3 })),
      loads: [watts(6e-3)],
    }),
  ),
  'push-pull on two phases, multiplier of 3': chain(3, {
    rails: [rail(5)],
    frequency: 10e3,
    drives: twoPhase(pin(40, 45), pin(40, 45), pushPull({ npn: 4.7e3, pnp: 4.7e3 })),
    flying: all(3, uf(4.7, 0.1)),
    loads: [amps(2e-3)],
  }),
  'push-pull on a higher rail than its clock, ladder of 2, negative': down(
    ladder(2, {
      rails: [rail(5), rail(5.6)],
      frequency: 20e3,
      drives: on(pin(40, 45), { ...pushPull({ npn: 4.7e3, pnp: 4.7e3 }), rail: 1 }),
    }),
  ),
  'follower, doubler': chain(1, { ...five, drives: on(pin(40, 45), follower), loads: [amps(4e-3)] }),
  'follower, inverter, slow edges': down(
    chain(1, { ...five, drives: on(timer, follower), rise: 3e-6, fall: 3e-6 }),
  ),
  'follower with one base resistor, negative ladder of 3': down(
    ladder(3, {
      rails: [rail(5)],
      frequency: 20e3,
      drives: on(pin(40, 45), { ...follower, base: { shared: 220 } }),
    }),
  ),
  'followers on two phases, multiplier of 2, resistor': chain(2, {
    ...five,
    drives: twoPhase(pin(40, 45), pin(40, 45), follower),
    flying: all(2, uf(10, 0.3)),
    loads: [ohms(3.3e3)],
  }),
};
