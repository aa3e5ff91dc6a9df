/** ATtiny25, 45 and 85: all pins together may carry 60 mA each way, and PB5 is a reset pin that drives almost nothing. */
import { band, dataSheet, exact, highPoint, limitOf, lowPoint, memory } from '../figures';
import type { ChipData } from '../part';
import { pinRange } from './pins';

const family = 'ATtiny25 to ATtiny85 data sheet';
const low = limitOf(dataSheet(`${family}, DC characteristics`));
const high = limitOf(dataSheet('data sheet of a sister part: VOH of 4.3 V and 2.5 V'));
const sum = exact(60e-3, 'A', dataSheet(`${family}, notes to the DC characteristics`));
const rail = exact(0.2, 'A', dataSheet(`${family}, absolute maximum of VCC and GND`));
const resetPin = limitOf(memory('reset pin used as output: about a twentieth of the strength'));

export const attiny85: ChipData = {
  key: 'attiny85',
  title: 'ATtiny85 microcontroller (also 25, 45)',
  source: family,
  supply: band(1.8, 5, 5.5, 'V', dataSheet(family)),
  pins: {
    high: [highPoint(10e-3, 4.3, 5, high), highPoint(5e-3, 2.5, 3, high)],
    low: [lowPoint(10e-3, 0.6, 5, low), lowPoint(5e-3, 0.5, 3, low)],
    recommended: exact(10e-3, 'A', dataSheet(`${family}: test current at 5 V; 5 mA at 3 V`)),
    absolute: exact(40e-3, 'A', dataSheet(`${family}, absolute maximum per pin`)),
  },
  pin: {
    PB5: {
      high: [highPoint(0.5e-3, 4.3, 5, resetPin)],
      low: [lowPoint(0.5e-3, 0.6, 5, resetPin)],
      recommended: exact(0.5e-3, 'A', resetPin),
    },
  },
  names: pinRange('PB', 0, 5),
  groups: [{ name: 'all ports', pins: pinRange('PB', 0, 5), source: sum, sink: sum }],
  total: { source: rail, sink: rail },
  draws: band(
    3e-3,
    5e-3,
    10e-3,
    'A',
    dataSheet('automotive ATtiny25 to 85: typical and limit at 8 MHz, 5 V; the least is a guess'),
  ),
};
