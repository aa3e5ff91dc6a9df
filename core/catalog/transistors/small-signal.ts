/**
 * Bipolar complementary pairs: the small-signal class that most push-pull stages use, and a 500 mA class.
 * Figures of the transport form of the Ebers-Moll model; `gain` is the forward current gain, lowest at high current.
 */
import { band, exact, memory } from '../figures';
import type { TransistorData } from '../part';

const model = memory('class values for a transport model', '25 degC');
const limits = 'gain at least 100 at 10 mA, 60 at 50 mA, 30 at 100 mA';
const source = 'Class values of several makers, to be confirmed';

export const npnSmallSignal: TransistorData = {
  key: 'npn-small-signal',
  title: 'Small-signal NPN transistor, 200 mA',
  source,
  polarity: 'npn',
  saturation: band(5e-15, 1e-14, 2e-14, 'A', model),
  gain: band(60, 200, 300, '1', memory(limits)),
  reverseGain: band(2, 5, 10, '1', model),
  baseResistance: band(5, 10, 20, 'ohm', model),
  collectorResistance: band(1, 2, 3, 'ohm', model),
  emitterResistance: exact(0.1, 'ohm', model),
  storage: band(100e-9, 150e-9, 200e-9, 's', memory('limit at 10 mA with 1 mA into and out of the base')),
  current: exact(0.2, 'A', memory('rating')),
};

export const pnpSmallSignal: TransistorData = {
  key: 'pnp-small-signal',
  title: 'Small-signal PNP transistor, 200 mA',
  source,
  polarity: 'pnp',
  saturation: band(5e-15, 1e-14, 2e-14, 'A', model),
  gain: band(60, 180, 300, '1', memory(limits)),
  reverseGain: band(2, 5, 10, '1', model),
  baseResistance: band(5, 10, 20, 'ohm', model),
  collectorResistance: band(1, 3, 4, 'ohm', model),
  emitterResistance: exact(0.1, 'ohm', model),
  storage: band(100e-9, 170e-9, 225e-9, 's', memory('limit at 10 mA with 1 mA into and out of the base')),
  current: exact(0.2, 'A', memory('rating')),
};
