/** One alkaline cell of size AA; the smaller AAA has about half the capacity and a little more resistance. */
import { band, dataSheet, memory, milliampereHours, openCurve, practice, resistanceCurve } from '../figures';
import type { BatteryData } from '../part';

export const alkaline: BatteryData = {
  key: 'alkaline',
  title: 'Alkaline cell',
  source: 'Class values of size AA, to be confirmed',
  voltage: band(0.9, 1.5, 1.6, 'V', memory('empty, nominal and fresh without load')),
  resistance: band(
    0.1,
    0.2,
    0.9,
    'ohm',
    dataSheet('0.1 ohm at 40 degC and 0.9 ohm at -40 degC of one make; near the end it doubles or triples'),
  ),
  capacity: milliampereHours(1500, 2500, 2850, memory('at 500 mA, and the range at 25 mA')),
  usable: band(0.7, 0.8, 0.9, '1', practice('0.7 to 0.9 of the nameplate for age, cold and load')),
  selfDischarge: band(0.02, 0.025, 0.03, '1', memory('2 to 3 % a year')),
  openVoltage: openCurve(
    [1.6, 1.52, 1.47, 1.43, 1.4, 1.37, 1.34, 1.3, 1.25, 1.17, 0.9],
    memory('plausible class curve, zinc and manganese dioxide: it slopes all the way'),
  ),
  agedResistance: resistanceCurve(
    [
      [1, 0.15, 0.2, 0.3],
      [0.5, 0.2, 0.26, 0.4],
      [0.2, 0.25, 0.35, 0.6],
      [0, 0.4, 0.55, 0.9],
    ],
    memory('0.15 to 0.3 ohm fresh at 20 degC; two to three times as much near the end'),
  ),
  caution:
    'An alkaline cell must not be charged: it vents and leaks. Several amperes flow into a short circuit, and a spent cell leaks in the end: take it out.',
};
