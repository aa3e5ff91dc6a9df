/** ESP32 radio microcontroller. */
import { band, dataSheet } from '../figures';
import type { ChipData } from '../part';
import { pins, sum } from './esp32-family';

export const esp32: ChipData = {
  key: 'esp32',
  title: 'ESP32 radio microcontroller',
  source: 'ESP32 data sheet v4.9',
  supply: band(2.3, 3.3, 3.6, 'V', dataSheet('ESP32 data sheet v4.9; 3.0 V when the flash needs it')),
  pins,
  pin: {},
  names: [
    '0',
    '1',
    '2',
    '3',
    '4',
    '5',
    '12',
    '13',
    '14',
    '15',
    '16',
    '17',
    '18',
    '19',
    '21',
    '22',
    '23',
    '25',
    '26',
    '27',
    '32',
    '33',
  ].map((n) => `GPIO${n}`),
  groups: [],
  total: { source: sum('ESP32 data sheet v4.9', 1.2), sink: sum('ESP32 data sheet v4.9', 1.2) },
  draws: band(
    95e-3,
    180e-3,
    240e-3,
    'A',
    dataSheet('ESP32 data sheet v4.9: receiving, sending, sending at full power; short peaks reach 0.5 A'),
  ),
};
