/** ESP32-C3 radio microcontroller. */
import { band, dataSheet } from '../figures';
import type { ChipData } from '../part';
import { pins, sum } from './esp32-family';
import { pinRange } from './pins';

export const esp32c3: ChipData = {
  key: 'esp32-c3',
  title: 'ESP32-C3 radio microcontroller',
  source: 'ESP32-C3 data sheet v2.4',
  supply: band(3, 3.3, 3.6, 'V', dataSheet('ESP32-C3 data sheet v2.4')),
  pins,
  pin: {},
  names: pinRange('GPIO', 0, 21),
  groups: [],
  total: { source: sum('ESP32-C3 data sheet v2.4', 1), sink: sum('ESP32-C3 data sheet v2.4', 1) },
  draws: band(
    23e-3,
    28e-3,
    335e-3,
    'A',
    dataSheet('ESP32-C3 data sheet v2.4: core at 160 MHz idle to busy, peak when sending'),
  ),
};
