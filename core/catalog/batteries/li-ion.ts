/** One lithium-ion or lithium-polymer cell. */
import { band, memory, milliampereHours, openCurve, practice, resistanceCurve } from '../figures';
import type { BatteryData } from '../part';

export const liIon: BatteryData = {
  key: 'li-ion',
  title: 'Lithium-ion cell',
  source: 'Class values, to be confirmed',
  voltage: band(3, 3.7, 4.2, 'V', memory('cut-off, nominal and full')),
  resistance: band(
    0.02,
    0.1,
    0.5,
    'ohm',
    memory('large round cell when warm, small pouch, small pouch at 0 degC'),
  ),
  capacity: milliampereHours(500, 1000, 3000, memory('small pouch, medium pouch, large round cell')),
  usable: band(
    0.7,
    0.8,
    0.9,
    '1',
    practice('0.7 to 0.9 of the nameplate for age, cold and load; 0.8 is the usual end of its cycle life'),
  ),
  selfDischarge: band(0.24, 0.3, 0.36, '1', memory('2 to 3 % a month, with a protection circuit')),
  openVoltage: openCurve(
    [4.2, 4.06, 3.98, 3.92, 3.87, 3.82, 3.79, 3.77, 3.74, 3.68, 3],
    memory('class curve in steps of 10 % of the charge'),
  ),
  agedResistance: resistanceCurve(
    [
      [1, 0.02, 0.1, 0.2],
      [0.5, 0.02, 0.1, 0.2],
      [0.2, 0.025, 0.13, 0.26],
      [0, 0.05, 0.25, 0.5],
    ],
    memory('20 to 200 mohm by size at 20 degC; two to three times as much near the end'),
  ),
  caution:
    'A lithium-ion cell drives tens of amperes into a short circuit and can catch fire: fit a fuse or a cell with its own protection, and charge it only with a charger made for it.',
};
