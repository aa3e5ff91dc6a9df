/** ATmega4809 microcontroller (megaAVR 0). */
import { band, memory } from '../figures';
import type { ChipData } from '../part';
import { family, groupSum, pinPair, rail, supply } from './avr0-family';
import { pinRange } from './pins';

/** Ports and their last pin in the 48-pin package; that each is one group is from memory: confirm. */
const ports: readonly (readonly [string, number])[] = [
  ['A', 7],
  ['B', 5],
  ['C', 7],
  ['D', 7],
  ['E', 3],
  ['F', 6],
];

export const atmega4809: ChipData = {
  key: 'atmega4809',
  title: 'ATmega4809 microcontroller (megaAVR 0)',
  source: family,
  supply,
  pins: pinPair,
  pin: {},
  names: ports.flatMap(([port, last]) => pinRange(`P${port}`, 0, last)),
  groups: ports.map(([port, last]) => ({
    name: port,
    pins: pinRange(`P${port}`, 0, last),
    source: groupSum,
    sink: groupSum,
  })),
  total: { source: rail, sink: rail },
  draws: band(6e-3, 9e-3, 13e-3, 'A', memory('active at 20 MHz, 5 V')),
};
