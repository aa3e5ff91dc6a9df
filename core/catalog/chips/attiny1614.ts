/** Eight-bit parts of the tinyAVR 0 and 1 and megaAVR 0 series, of which ATtiny1614 and ATmega4809 are the best known. */
import { band, dataSheet, exact, highPoint, limitOf, lowPoint, memory } from '../figures';
import type { ChipData } from '../part';
import { pinRange } from './pins';

const family = 'tinyAVR 0/1 and megaAVR 0 data sheets, I/O pin characteristics';
const levels = limitOf(dataSheet(family, '-40 to 85 degC'));
const pinPair = {
  high: [
    highPoint(15e-3, 4.0, 5, levels),
    highPoint(7.5e-3, 2.4, 3, levels),
    highPoint(1.5e-3, 1.44, 1.8, levels),
  ],
  low: [
    lowPoint(15e-3, 1.0, 5, levels),
    lowPoint(7.5e-3, 0.6, 3, levels),
    lowPoint(1.5e-3, 0.36, 1.8, levels),
  ],
  recommended: exact(15e-3, 'A', dataSheet('test current at 5 V; 7.5 mA at 3 V, 1.5 mA at 1.8 V')),
  absolute: exact(40e-3, 'A', memory('absolute maximum per pin')),
};
const supply = band(1.8, 5, 5.5, 'V', dataSheet(family));
const rail = exact(0.2, 'A', memory('absolute maximum of VDD and GND at 85 degC'));
const groupSum = exact(
  0.1,
  'A',
  dataSheet('100 mA for each pin group; an older text says 200 mA at 25 degC'),
);

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

export const atmega4809: ChipData = {
  key: 'atmega4809',
  title: 'ATmega4809 microcontroller (megaAVR 0)',
  source: family,
  supply,
  pins: pinPair,
  pin: {},
  // The grouping of its ports for the 100 mA sums is not known here, so only the chip's own sum is checked.
  groups: [],
  total: { source: rail, sink: rail },
  draws: band(6e-3, 9e-3, 13e-3, 'A', memory('active at 20 MHz, 5 V')),
};
