/** Ordinary 1 A silicon rectifier: slow to turn off, so good for low clock frequencies only. */
import { band, exact, memory } from '../figures';
import type { DiodeData } from '../part';

const curve = memory(
  'class values; typical 0.76 V at 0.1 A and 0.92 V at 1 A, limit 1.1 V at 1 A',
  '25 degC',
);

export const siliconRectifier1A: DiodeData = {
  key: 'silicon-rectifier-1a',
  title: 'Silicon rectifier, 1 A',
  source: 'Class values of several makers, to be confirmed',
  kind: 'silicon',
  // 100 mV of the limit at 1 A are put on the curve as a whole, 77 mV on the resistance (see silicon-switching for the rule).
  saturation: band(4.06e-9, 3e-8, 6e-8, 'A', curve),
  ideality: exact(1.95, '1', curve),
  resistance: band(0.04, 0.055, 0.132, 'ohm', curve),
  junction: band(15e-12, 20e-12, 30e-12, 'F', memory('zero-bias capacitance, class value')),
  reverse: exact(50, 'V', memory('the lowest rating of a family that reaches 1000 V')),
  average: exact(1, 'A', memory('rating')),
  peak: exact(30, 'A', memory('single surge of half a mains period, not repetitive')),
  leakage: band(0.05e-6, 0.1e-6, 5e-6, 'A', memory('limit at the rated voltage, 25 degC')),
};
