/** PIC18 microcontroller of the K and Q generations. */
import { band, dataSheet, exact, highPoint, lowPoint, memory } from '../figures';
import type { ChipData } from '../part';
import { sums, tableQ } from './pic-family';

export const pic18f47k42: ChipData = {
  key: 'pic18f47k42',
  title: 'PIC18 microcontroller of the K and Q generations',
  source: "The maker's standard I/O table; ratings read second-hand",
  supply: band(1.8, 3.3, 5.5, 'V', dataSheet('read second-hand')),
  pins: {
    high: [highPoint(6e-3, 2.3, 3, tableQ)],
    low: [lowPoint(10e-3, 0.6, 3, tableQ)],
    recommended: exact(6e-3, 'A', dataSheet('source test current at 3 V; 10 mA when sinking')),
    absolute: exact(50e-3, 'A', dataSheet('absolute maximum per pin, read second-hand')),
  },
  pin: {},
  groups: [],
  total: sums(0.35, 0.25, dataSheet('absolute maximum of VSS and VDD, read second-hand')),
  draws: band(6e-3, 10e-3, 14e-3, 'A', memory('active at 64 MHz, 3 V')),
};
