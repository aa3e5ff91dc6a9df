/** One lithium coin cell of 20 mm: high resistance, and pulses are what it dislikes. */
import {
  band,
  dataSheet,
  exact,
  memory,
  milliampereHours,
  openCurve,
  practice,
  resistanceCurve,
} from '../figures';
import type { BatteryData } from '../part';

export const lithiumCoin: BatteryData = {
  key: 'lithium-coin',
  title: 'Lithium coin cell, 20 mm',
  source: "A maker's form and articles that measured such cells",
  voltage: band(
    2,
    3,
    3.3,
    'V',
    dataSheet('3.0 V nominal, 2.0 V empty; 3.3 V fresh without load is from memory'),
  ),
  current: exact(
    10e-3,
    'A',
    dataSheet('pulses of 10 to 15 mA at most; steady current should stay near 0.2 mA'),
  ),
  resistance: band(
    10,
    15,
    50,
    'ohm',
    dataSheet('about 10 ohm fresh, 15 to 30 ohm aged, 30 to 50 ohm at the end'),
  ),
  capacity: milliampereHours(
    200,
    220,
    235,
    dataSheet('into 15 kohm at 21 degC down to 2.0 V; 220 is its label'),
  ),
  usable: band(0.7, 0.85, 0.9, '1', practice('0.7 to 0.9 of the nameplate for age, cold and pulses')),
  selfDischarge: band(0.008, 0.01, 0.015, '1', memory('about 1 % a year')),
  openVoltage: openCurve(
    [3.3, 3.05, 3.02, 3, 2.98, 2.96, 2.93, 2.89, 2.82, 2.65, 2],
    memory('plausible class curve, lithium and manganese dioxide: flat, then a knee'),
  ),
  agedResistance: resistanceCurve(
    [
      [1, 8, 10, 15],
      [0.5, 12, 15, 22],
      [0.2, 15, 22, 30],
      [0, 30, 40, 50],
    ],
    dataSheet(
      'about 10 ohm fresh, 15 to 30 ohm aged, 30 to 50 ohm at the end; the course between is from memory',
    ),
  ),
  caution:
    'A lithium coin cell must never be charged, not even by the leakage of a diode or the output of a pump. Keep it from children: swallowed, it burns within hours.',
};
