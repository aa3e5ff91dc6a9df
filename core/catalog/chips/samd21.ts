/** SAM D20 and D21: levels are promised as shares of the supply, at two drive strengths. */
import { band, dataSheet, exact, highPoint, limitOf, lowPoint, memory } from '../figures';
import type { ChipData, PinData } from '../part';
import { pinRange } from './pins';

const family = 'SAM D20 data sheet rev. D, I/O pin characteristics, taken for D21 as well';
const levels = limitOf(dataSheet(family, 'VDD = 3.0 to 3.63 V'));

const strength = (sinkA: number, sourceA: number): PinData => ({
  high: [highPoint(sourceA, 0.8 * 3.3, 3.3, levels)],
  low: [lowPoint(sinkA, 0.2 * 3.3, 3.3, levels)],
  recommended: exact(sourceA, 'A', dataSheet(`${family}: the smaller of sink and source test current`)),
});

export const samd21: ChipData = {
  key: 'samd21',
  title: 'SAM D21 microcontroller (also D20)',
  source: family,
  supply: band(1.62, 3.3, 3.63, 'V', dataSheet(family)),
  // Reset leaves the weaker of the two drive strengths.
  pins: {
    ...strength(2.5e-3, 2e-3),
    strengths: { normal: strength(2.5e-3, 2e-3), strong: strength(10e-3, 7e-3) },
  },
  pin: {},
  names: [...pinRange('PA', 0, 31), ...pinRange('PB', 0, 31)],
  groups: [],
  total: {
    source: exact(92e-3, 'A', memory('absolute maximum of a VDD pin')),
    sink: exact(130e-3, 'A', memory('absolute maximum of a GND pin')),
  },
  draws: band(3e-3, 5.5e-3, 7e-3, 'A', memory('active at 48 MHz')),
};
