/** Bipolar pair of the 500 to 800 mA class: for pumps that ask more than a small-signal pair saturates for. */
import { band, memory } from '../figures';

export const model = memory(
  'class values for a transport model, scaled from the small-signal pair',
  '25 degC',
);

export const gain = band(100, 160, 250, '1', memory('gain class at 100 mA'));

// Makes 0.7 V of saturation voltage at 500 mA with 50 mA of base current the worst case.
export const collector = band(
  0.3,
  0.6,
  1.1,
  'ohm',
  memory('from at most 0.7 V at 500 mA with 50 mA of base current'),
);
