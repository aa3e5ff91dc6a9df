/**
 * ATmega48 to ATmega328, with and without P. Ports share supply wires on the chip, hence the sums, which are cut
 * differently for sinking and for sourcing.
 */
import { band, dataSheet, exact, highPoint, limitOf, lowPoint, memory } from '../figures';
import type { ChipData } from '../part';
import { pinRange } from './pins';

const levels = limitOf(dataSheet('ATmega48 to ATmega328P data sheet, DC characteristics', '-40 to 85 degC'));
const sums = dataSheet('ATmega48 to ATmega328P data sheet, notes to the DC characteristics');
const sinkSum = exact(0.1, 'A', sums);
const sourceSum = exact(0.15, 'A', sums);
const rail = exact(0.2, 'A', dataSheet('ATmega48 to ATmega328P data sheet, absolute maximum of VCC and GND'));

export const atmega328p: ChipData = {
  key: 'atmega328p',
  title: 'ATmega328P microcontroller (also 48, 88, 168)',
  source: 'ATmega48 to ATmega328P data sheet',
  supply: band(
    1.8,
    5,
    5.5,
    'V',
    dataSheet('ATmega48 to ATmega328P data sheet; 16 MHz needs more than 3.8 V'),
  ),
  pins: {
    high: [highPoint(20e-3, 4.2, 5, levels), highPoint(10e-3, 2.3, 3, levels)],
    low: [lowPoint(20e-3, 0.9, 5, levels), lowPoint(10e-3, 0.6, 3, levels)],
    recommended: exact(20e-3, 'A', dataSheet('test current of the levels at 5 V; 10 mA at 3 V')),
    absolute: exact(40e-3, 'A', dataSheet('ATmega48 to ATmega328P data sheet, absolute maximum per pin')),
  },
  pin: {},
  names: [...pinRange('PB', 0, 7), ...pinRange('PC', 0, 6), ...pinRange('PD', 0, 7)],
  groups: [
    { name: 'sink C0-C5', pins: pinRange('PC', 0, 5), sink: sinkSum },
    { name: 'sink B0-B7, D5-D7', pins: [...pinRange('PB', 0, 7), ...pinRange('PD', 5, 7)], sink: sinkSum },
    { name: 'sink D0-D4, C6', pins: [...pinRange('PD', 0, 4), 'PC6'], sink: sinkSum },
    {
      name: 'source C0-C6, D0-D4',
      pins: [...pinRange('PC', 0, 6), ...pinRange('PD', 0, 4)],
      source: sourceSum,
    },
    {
      name: 'source B0-B7, D5-D7',
      pins: [...pinRange('PB', 0, 7), ...pinRange('PD', 5, 7)],
      source: sourceSum,
    },
  ],
  total: { source: rail, sink: rail },
  draws: band(5e-3, 10e-3, 14e-3, 'A', memory('active at 16 MHz, 5 V')),
};
