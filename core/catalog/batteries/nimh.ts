/** One nickel-metal-hydride cell of size AA. */
import { band, memory, milliampereHours, openCurve, practice, resistanceCurve } from '../figures';
import type { BatteryData } from '../part';

export const nimh: BatteryData = {
  key: 'nimh',
  title: 'Nickel-metal-hydride cell',
  source: 'Class values of size AA, to be confirmed',
  voltage: band(1, 1.2, 1.4, 'V', memory('empty, nominal and fresh off the charger')),
  resistance: band(0.02, 0.03, 0.05, 'ohm', memory('size AA, 20 to 50 mohm')),
  capacity: milliampereHours(1900, 2000, 2500, memory('size AA')),
  usable: band(0.7, 0.8, 0.9, '1', practice('0.7 to 0.9 of the nameplate for age, cold and load')),
  selfDischarge: band(
    1.8,
    2.4,
    3.6,
    '1',
    memory('15 to 30 % a month of a plain cell; cells made to keep their charge lose far less'),
  ),
  openVoltage: openCurve(
    [1.4, 1.34, 1.31, 1.295, 1.285, 1.275, 1.265, 1.25, 1.235, 1.2, 1],
    memory('plausible class curve: flat, then a knee'),
  ),
  agedResistance: resistanceCurve(
    [
      [1, 0.02, 0.03, 0.05],
      [0.5, 0.021, 0.032, 0.053],
      [0.2, 0.025, 0.038, 0.065],
      [0, 0.045, 0.07, 0.12],
    ],
    memory('20 to 50 mohm; two to three times as much near the end'),
  ),
  caution:
    'A nickel-metal-hydride cell drives tens of amperes into a short circuit, enough to burn wires and skin: fit a fuse, and charge it only with a charger made for it.',
};
