/** Power Schottky diode, 1 A and 30 V: lowest drop, but a leakage that a small pump feels when hot. */
import { band, exact, memory } from '../figures';
import type { DiodeData } from '../part';

const curve = memory(
  'class values; typical 0.285, 0.43, 0.63 V and limit 0.33, 0.55, 0.875 V at 0.1, 1, 3 A',
  '25 degC',
);

export const schottky1A30V: DiodeData = {
  key: 'schottky-1a-30v',
  title: 'Power Schottky diode, 30 V, 1 A',
  source: 'Class values of several makers, to be confirmed',
  kind: 'schottky',
  // 40 mV above typical follows the limit at 0.1 A, the resistance follows the one at 1 A.
  saturation: band(3.0e-6, 1.12e-5, 2.24e-5, 'A', curve),
  ideality: exact(1.184, '1', curve),
  resistance: band(0.06, 0.0833, 0.155, 'ohm', curve),
  junction: band(90e-12, 110e-12, 150e-12, 'F', memory('class value at a few volts reverse')),
  reverse: exact(30, 'V', memory('rating')),
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
