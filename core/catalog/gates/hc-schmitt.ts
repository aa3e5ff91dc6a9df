/** HC Schmitt inverter, six in a package. */
import { band } from '../figures';
import type { GateData } from '../part';
import { hc } from './hc';
import { at4V5, six } from './schmitt-family';

export const hcSchmitt: GateData = {
  ...hc,
  key: 'hc-schmitt',
  title: 'HC Schmitt inverter, six in a package',
  source: 'HC Schmitt inverter data sheet',
  rising: band(2.3, 2.36, 3.15, 'V', six),
  falling: band(0.9, 1.53, 2.0, 'V', six),
  thresholdSupply: at4V5,
};
