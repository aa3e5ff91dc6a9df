/** Small-signal PNP transistor, 200 mA. */
import { band, exact, memory } from '../figures';
import type { TransistorData } from '../part';
import { limits, model, source } from './small-signal-class';

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
