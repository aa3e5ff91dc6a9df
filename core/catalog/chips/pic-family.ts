/** Three generations of eight-bit PIC parts. They sink far better than they source. */
import { dataSheet, exact, highPoint, limitOf, lowPoint, memory } from '../figures';
import type { PinData } from '../part';

const table = limitOf(dataSheet("maker's errata with the corrected I/O table of the PIC16(L)F193x"));

export const tableQ = limitOf(dataSheet("the maker's standard I/O table for this generation"));

export const older: PinData = {
  high: [
    highPoint(3.5e-3, 4.3, 5, table),
    highPoint(3e-3, 2.6, 3.3, table),
    highPoint(1e-3, 1.1, 1.8, table),
  ],
  low: [lowPoint(8e-3, 0.6, 5, table), lowPoint(6e-3, 0.6, 3.3, table), lowPoint(1.8e-3, 0.6, 1.8, table)],
  recommended: exact(3.5e-3, 'A', dataSheet('source test current at 5 V; 8 mA when sinking')),
};

export const sums = (vss: number, vdd: number, origin = memory('absolute maximum of VSS and VDD')) => ({
  source: exact(vdd, 'A', origin),
  sink: exact(vss, 'A', origin),
});
