/** Power Schottky diode, 1 A and 20 V: lowest drop, but a leakage that a small pump feels when hot. */
import { band, exact, memory } from '../figures';
import type { DiodeData } from '../part';

const curve = memory(
  'class values; typical 0.27, 0.40, 0.58 V and limit 0.32, 0.45, 0.75 V at 0.1, 1, 3 A',
  '25 degC',
);

export const schottky1A20V: DiodeData = {
  key: 'schottky-1a-20v',
  title: 'Power Schottky diode, 20 V, 1 A',
  source: 'Class values of several makers, to be confirmed',
  kind: 'schottky',
  // 45 mV above typical follows the limit at 0.1 A; at 3 A the band stays 65 mV below it, far from what pumps carry.
  saturation: band(1.18e-6, 6.2e-6, 1.24e-5, 'A', curve),
  ideality: exact(1.055, '1', curve),
  resistance: band(0.055, 0.075, 0.095, 'ohm', curve),
  junction: band(110e-12, 150e-12, 200e-12, 'F', memory('class value at a few volts reverse')),
  reverse: exact(20, 'V', memory('rating')),
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
