/** Ceramic, class 2, X7R. */
import { band, practice } from '../figures';
import type { CapacitorKind } from '../part';
import { genericBias } from './bias';
import { ceramicEsr, ceramicHeat, code } from './ceramic-family';

export const x7r: CapacitorKind = {
  key: 'x7r',
  title: 'Ceramic, class 2, X7R',
  source: 'EIA-198 class 2 code; generic voltage dependence',
  tolerance: band(-0.1, 0, 0.1, '1', practice('10 % parts are the stocked ones')),
  temperature: band(-0.15, 0, 0.15, '1', code('X7R, -55 to 125 degC')),
  bias: genericBias({ weakest: 0.63, usual: 0.9, best: 1.5 }),
  esr: ceramicEsr,
  heat: ceramicHeat,
  polarised: false,
};
