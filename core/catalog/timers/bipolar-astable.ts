/** Bipolar astable timer. */
import { band, exact, memory } from '../figures';
import type { TimerData } from '../part';
import { bipolarSheet } from './timer-class';

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
