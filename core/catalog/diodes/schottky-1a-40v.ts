/** Power Schottky diode, 1 A and 40 V: lowest drop, but a leakage that a small pump feels when hot. */
import { band, exact, memory } from '../figures';
import type { DiodeData } from '../part';

const curve = memory(
  'class values; typical 0.30, 0.47, 0.70 V and limit 0.34, 0.60, 0.90 V at 0.1, 1, 3 A',
  '25 degC',
);

export const schottky1A40V: DiodeData = {
  key: 'schottky-1a-40v',
  title: 'Power Schottky diode, 40 V, 1 A',
  source: 'Class values of several makers, to be confirmed',
  kind: 'schottky',
  // 35 mV above typical follows the limit at 0.1 A, the resistance lies between the limits at 1 A and 3 A.
  saturation: band(1.44e-5, 3.72e-5, 7.44e-5, 'A', curve),
  ideality: exact(1.432, '1', curve),
  resistance: band(0.07, 0.0948, 0.155, 'ohm', curve),
  junction: band(90e-12, 110e-12, 150e-12, 'F', memory('class value at a few volts reverse')),
  reverse: exact(40, 'V', memory('rating')),
  average: exact(1, 'A', memory('rating')),
  peak: exact(25, 'A', memory('single surge of half a mains period, not repetitive')),
  leakage: band(
    2e-5,
    1e-4,
    1e-3,
    'A',
    memory('limit at the rated voltage; ten times more at 100 degC', '25 degC'),
  ),
};
