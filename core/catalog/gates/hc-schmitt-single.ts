/** HC Schmitt inverter, single. */
import { band } from '../figures';
import type { GateData } from '../part';
import { hcSingle } from './hc-single';
import { at4V5, single } from './schmitt-family';

export const hcSchmittSingle: GateData = {
  ...hcSingle,
  key: 'hc-schmitt-single',
  title: 'HC Schmitt inverter, single',
  source: 'HC single Schmitt inverter data sheet',
  rising: band(1.7, 2.36, 3.15, 'V', single),
  falling: band(0.9, 1.53, 2.0, 'V', single),
  thresholdSupply: at4V5,
};
