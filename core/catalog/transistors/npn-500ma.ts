/** NPN transistor, 500 to 800 mA. */
import { band, exact, memory } from '../figures';
import type { TransistorData } from '../part';
import { collector, gain, model } from './medium-power-class';

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
