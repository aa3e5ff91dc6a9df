/** MSP430 of the 11x1 and G2x53 kind. */
import { band, dataSheet, exact, highPoint, limitOf, lowPoint, memory } from '../figures';
import type { ChipData } from '../part';
import { pinRange } from './pins';

const levels = limitOf(dataSheet('MSP430x11x1 data sheet, outputs; taken for G2x53 as well'));
const sum = exact(
  48e-3,
  'A',
  dataSheet('MSP430: sum over all outputs for a drop of 0.6 V; 12 mA for 0.25 V'),
);

export const msp430g2553: ChipData = {
  key: 'msp430g2553',
  title: 'MSP430G2553 microcontroller (also 11x1)',
  source: 'MSP430x11x1 data sheet; G2553 sum quoted second-hand',
  supply: band(1.8, 3, 3.6, 'V', memory('supply range')),
  pins: {
    high: [highPoint(6e-3, 2.4, 3, levels)],
    low: [lowPoint(6e-3, 0.6, 3, levels)],
    recommended: exact(6e-3, 'A', dataSheet('test current for a drop of 0.6 V; 1.5 mA for 0.25 V')),
  },
  pin: {},
  names: [...pinRange('P1.', 0, 7), ...pinRange('P2.', 0, 7), ...pinRange('P3.', 0, 7)],
  groups: [],
  total: { source: sum, sink: sum },
  draws: band(0.23e-3, 2e-3, 4.5e-3, 'A', memory('1 MHz at 2.2 V up to 16 MHz at 3 V')),
};
