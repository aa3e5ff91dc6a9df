/**
 * ESP32, ESP32-S3 and ESP32-C3. The maker prints only a typical drive at the strongest setting, no worst case, so the
 * bands here are wider than those of other chips; reset leaves a weaker setting than the one printed.
 */
import { band, dataSheet, derived, exact, memory, pointFromDrops } from '../figures';
import type { ChipData, PinData } from '../part';
import { pinRange } from './pins';

const printed = derived(
  'typical 40 mA at 0.8 VDD and 28 mA at 0.1 VDD from the data sheet, strongest setting; best and worst by +-40 % (common practice)',
);
const reset = derived(
  'half the strength of the printed setting: from memory of the four steps 5, 10, 20, 40 mA, confirm',
);

const strongest: PinData = {
  high: [pointFromDrops(40e-3, 3.3, { min: 0.4, typical: 0.66, max: 0.92 }, 'high', printed)],
  low: [pointFromDrops(28e-3, 3.3, { min: 0.2, typical: 0.33, max: 0.46 }, 'low', printed)],
  recommended: exact(
    28e-3,
    'A',
    dataSheet('the smaller of the printed drives; falls to about 29 mA source as more pins drive'),
  ),
  absolute: exact(40e-3, 'A', memory('treated as the most that one pin may carry')),
};

const afterReset: PinData = {
  high: [pointFromDrops(20e-3, 3.3, { min: 0.33, typical: 0.66, max: 0.92 }, 'high', reset)],
  low: [pointFromDrops(14e-3, 3.3, { min: 0.16, typical: 0.33, max: 0.46 }, 'low', reset)],
  recommended: exact(14e-3, 'A', reset),
  absolute: exact(40e-3, 'A', memory('treated as the most that one pin may carry')),
};

const pins: PinData = { ...afterReset, strengths: { '20 mA': afterReset, '40 mA': strongest } };

const sum = (sheet: string, ampere: number) =>
  exact(ampere, 'A', dataSheet(`${sheet}: cumulative I/O current, a survival limit and no design value`));

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
