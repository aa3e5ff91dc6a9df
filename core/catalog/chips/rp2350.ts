/** RP2350: drive settings as in its predecessor, twice the sum over all pins. */
import { band, dataSheet, exact, highPoint, limitOf, lowPoint, memory } from '../figures';
import type { ChipData, PinData } from '../part';
import { pinRange } from './pins';

const setting = (milliampere: number): PinData => {
  const current = milliampere * 1e-3;
  const origin = limitOf(dataSheet(`RP2350 data sheet, levels at the ${milliampere} mA drive setting`));
  return {
    high: [highPoint(current, 2.62, 3.3, origin), highPoint(current, 1.24, 1.8, origin)],
    low: [lowPoint(current, 0.5, 3.3, origin), lowPoint(current, 0.3, 1.8, origin)],
    recommended: exact(current, 'A', dataSheet('current of the drive setting: the levels hold up to it')),
  };
};

const sum = exact(100e-3, 'A', dataSheet('RP2350 data sheet: sum over all GPIO pins'));

export const rp2350: ChipData = {
  key: 'rp2350',
  title: 'RP2350 microcontroller',
  source: 'RP2350 data sheet, electrical specifications',
  supply: band(1.62, 3.3, 3.63, 'V', memory('IOVDD')),
  // The setting after reset is 4 mA (from memory: confirm).
  pins: {
    ...setting(4),
    strengths: { '2 mA': setting(2), '4 mA': setting(4), '8 mA': setting(8), '12 mA': setting(12) },
  },
  pin: {},
  names: pinRange('GP', 0, 47),
  groups: [],
  total: { source: sum, sink: sum },
  draws: band(
    10e-3,
    15e-3,
    25e-3,
    'A',
    memory('about 15 mA at 150 MHz in a design note that quotes the data sheet; the edges are guesses'),
  ),
};
