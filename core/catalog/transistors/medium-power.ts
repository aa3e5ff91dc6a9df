/** Bipolar pair of the 500 to 800 mA class: for pumps that ask more than a small-signal pair saturates for. */
import { band, exact, memory } from '../figures';
import type { TransistorData } from '../part';

const model = memory('class values for a transport model, scaled from the small-signal pair', '25 degC');
const gain = band(100, 160, 250, '1', memory('gain class at 100 mA'));
// Makes 0.7 V of saturation voltage at 500 mA with 50 mA of base current the worst case.
const collector = band(
  0.3,
  0.6,
  1.1,
  'ohm',
  memory('from at most 0.7 V at 500 mA with 50 mA of base current'),
);

export const npn500mA: TransistorData = {
  key: 'npn-500ma',
  title: 'NPN transistor, 500 to 800 mA',
  source: 'Class values of several makers, to be confirmed',
  polarity: 'npn',
  saturation: band(3e-14, 6e-14, 1.2e-13, 'A', model),
  gain,
  reverseGain: band(2, 5, 10, '1', model),
  baseResistance: band(1, 3, 6, 'ohm', model),
  collectorResistance: collector,
  emitterResistance: exact(0.05, 'ohm', model),
  storage: band(100e-9, 300e-9, 600e-9, 's', memory('class value')),
  current: exact(0.5, 'A', memory('the lower of the usual ratings 500 and 800 mA')),
};

export const pnp500mA: TransistorData = {
  ...npn500mA,
  key: 'pnp-500ma',
  title: 'PNP transistor, 500 to 800 mA',
  polarity: 'pnp',
};
