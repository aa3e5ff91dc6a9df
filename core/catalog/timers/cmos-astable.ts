/** CMOS astable timer. */
import { band, exact, memory } from '../figures';
import type { TimerData } from '../part';
import { cmosSheet } from './timer-class';

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
