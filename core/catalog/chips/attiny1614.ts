/** ATtiny1614 microcontroller (tinyAVR 0 and 1). */
import { band, memory } from '../figures';
import type { ChipData } from '../part';
import { family, groupSum, pinPair, rail, supply } from './avr0-family';
import { pinRange } from './pins';

export const attiny1614: ChipData = {
  key: 'attiny1614',
  title: 'ATtiny1614 microcontroller (tinyAVR 0 and 1)',
  source: family,
  supply,
  pins: pinPair,
  pin: {},
  names: [...pinRange('PA', 0, 7), ...pinRange('PB', 0, 3)],
  groups: [
    { name: 'A', pins: pinRange('PA', 0, 7), source: groupSum, sink: groupSum },
    { name: 'B', pins: pinRange('PB', 0, 3), source: groupSum, sink: groupSum },
  ],
  total: { source: rail, sink: rail },
  draws: band(6e-3, 9e-3, 12e-3, 'A', memory('active at 20 MHz, 5 V')),
};
