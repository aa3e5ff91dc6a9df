/** Ceramic, class 2, X5R. */
import { band, practice } from '../figures';
import type { CapacitorKind } from '../part';
import { genericBias } from './bias';
import { ceramicEsr, ceramicHeat, code } from './ceramic-family';

export const x5r: CapacitorKind = {
  key: 'x5r',
  title: 'Ceramic, class 2, X5R',
  source: 'EIA-198 class 2 code; generic voltage dependence',
  tolerance: band(-0.2, 0, 0.2, '1', practice('10 % and 20 % parts are both stocked; the wider is taken')),
  temperature: band(-0.15, 0, 0.15, '1', code('X5R, -55 to 85 degC')),
  bias: genericBias({ weakest: 0.42, usual: 0.6, best: 0.9 }),
  esr: ceramicEsr,
  heat: ceramicHeat,
  polarised: false,
};
