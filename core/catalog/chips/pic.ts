/** Three generations of eight-bit PIC parts. They sink far better than they source. */
import { band, dataSheet, exact, highPoint, limitOf, lowPoint, memory } from '../figures';
import type { ChipData, PinData } from '../part';

const table = limitOf(dataSheet("maker's errata with the corrected I/O table of the PIC16(L)F193x"));
const tableQ = limitOf(dataSheet("the maker's standard I/O table for this generation"));

const older: PinData = {
  high: [
    highPoint(3.5e-3, 4.3, 5, table),
    highPoint(3e-3, 2.6, 3.3, table),
    highPoint(1e-3, 1.1, 1.8, table),
  ],
  low: [lowPoint(8e-3, 0.6, 5, table), lowPoint(6e-3, 0.6, 3.3, table), lowPoint(1.8e-3, 0.6, 1.8, table)],
  recommended: exact(3.5e-3, 'A', dataSheet('source test current at 5 V; 8 mA when sinking')),
};

const sums = (vss: number, vdd: number, origin = memory('absolute maximum of VSS and VDD')) => ({
  source: exact(vdd, 'A', origin),
  sink: exact(vss, 'A', origin),
});

export const pic16f1939: ChipData = {
  key: 'pic16f1939',
  title: 'PIC16F193x microcontroller',
  source: 'PIC16(L)F193x errata, the rest to be confirmed',
  supply: band(1.8, 5, 5.5, 'V', memory('supply range')),
  pins: { ...older, absolute: exact(25e-3, 'A', memory('absolute maximum per pin')) },
  pin: {},
  groups: [],
  total: sums(0.34, 0.25),
  draws: band(2e-3, 3e-3, 4e-3, 'A', memory('active at 32 MHz, 3 V')),
};

export const pic16f18877: ChipData = {
  key: 'pic16f18877',
  title: 'PIC16F18xxx microcontroller',
  source: 'I/O table of the PIC16(L)F193x errata, the rest to be confirmed',
  supply: band(2.3, 5, 5.5, 'V', memory('supply range')),
  pins: { ...older, absolute: exact(50e-3, 'A', memory('absolute maximum per pin')) },
  pin: {},
  groups: [],
  total: sums(0.35, 0.25),
  draws: band(2e-3, 3e-3, 4e-3, 'A', memory('active at 32 MHz, 3 V')),
};

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
