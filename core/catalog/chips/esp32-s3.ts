/** ESP32-S3 radio microcontroller. */
import { band, dataSheet } from '../figures';
import type { ChipData } from '../part';
import { pins, sum } from './esp32-family';
import { pinRange } from './pins';

export const esp32s3: ChipData = {
  key: 'esp32-s3',
  title: 'ESP32-S3 radio microcontroller',
  source: 'ESP32-S3 data sheet v2.2',
  supply: band(3, 3.3, 3.6, 'V', dataSheet('ESP32-S3 data sheet v2.2')),
  pins,
  pin: {},
  names: [...pinRange('GPIO', 0, 21), ...pinRange('GPIO', 26, 48)],
  groups: [],
  total: { source: sum('ESP32-S3 data sheet v2.2', 1.5), sink: sum('ESP32-S3 data sheet v2.2', 1.5) },
  draws: band(
    66e-3,
    108e-3,
    340e-3,
    'A',
    dataSheet('ESP32-S3 data sheet v2.2: both cores at 240 MHz idle to busy, peak when sending'),
  ),
};
