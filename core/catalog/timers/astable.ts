/**
 * The two classes of timer chip that run as an astable: bipolar, strong but more than a volt short of its supply
 * when high, and CMOS, which reaches both rails but drives little.
 */
import { band, dataSheet, exact, memory } from '../figures';
import type { TimerData } from '../part';

const bipolarSheet = (note: string) => dataSheet(`bipolar timer data sheets of two makers: ${note}`);
const cmosSheet = (note: string) => dataSheet(`CMOS timer data sheet: ${note}`);

export const bipolarAstable: TimerData = {
  key: 'bipolar-astable',
  title: 'Bipolar astable timer',
  source: 'Data sheets of two makers',
  supply: band(4.5, 5, 16, 'V', bipolarSheet('supply range')),
  highDrop: band(1.1, 1.3, 1.4, 'V', memory('below the supply at light load')),
  // With the drop above this gives the printed 3.3 V typical and 2.75 V least at 100 mA and 5 V.
  highResistance: band(3, 4, 8.5, 'ohm', bipolarSheet('3.3 V typical, 2.75 V least at 100 mA, 5 V')),
  // With the resistance below: 0.25 V typical and 0.35 V most at 5 mA and 5 V.
  lowVoltage: band(0.02, 0.2, 0.3, 'V', bipolarSheet('0.25 V typical, 0.35 V most at 5 mA, 5 V')),
  lowResistance: band(7.5, 10, 10, 'ohm', bipolarSheet('0.1 V at 10 mA and 0.4 V at 50 mA, 15 V')),
  draws: band(2e-3, 3e-3, 6e-3, 'A', bipolarSheet('5 V, no load, output low; about 1 mA less when high')),
  fastest: exact(500e3, 'Hz', memory('usable limit of the class')),
};

export const cmosAstable: TimerData = {
  key: 'cmos-astable',
  title: 'CMOS astable timer',
  source: 'CMOS timer data sheet',
  supply: band(2, 5, 15, 'V', memory('depends on the maker')),
  highDrop: exact(0, 'V', cmosSheet('the high output reaches the supply without load')),
  highResistance: band(
    80,
    200,
    900,
    'ohm',
    cmosSheet('4.8 V typical, 4.1 V least at 1 mA, 5 V; 14.2 V at 10 mA, 15 V'),
  ),
  lowVoltage: exact(0, 'V', cmosSheet('the low output reaches ground without load')),
  lowResistance: band(20, 26, 94, 'ohm', cmosSheet('0.13 V typical at 5 mA, 0.3 V most at 3.2 mA, 5 V')),
  draws: band(100e-6, 170e-6, 350e-6, 'A', cmosSheet('typical and most at 5 V; the least is a guess')),
  fastest: band(1.2e6, 2.1e6, 2.1e6, 'Hz', cmosSheet('least and typical')),
};
