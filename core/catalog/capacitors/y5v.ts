/** Ceramic, class 2, Y5V. */
import { band, practice } from '../figures';
import type { CapacitorKind } from '../part';
import { genericBias } from './bias';
import { ceramicEsr, ceramicHeat, code } from './ceramic-family';

export const y5v: CapacitorKind = {
  key: 'y5v',
  title: 'Ceramic, class 2, Y5V',
  source: 'EIA-198 class 2 code; generic voltage dependence',
  tolerance: band(-0.2, 0, 0.8, '1', practice('sold as -20 % +80 %')),
  temperature: band(-0.82, 0, 0.22, '1', code('Y5V, -30 to 85 degC')),
  bias: genericBias({ weakest: 0.21, usual: 0.3, best: 0.45 }),
  esr: ceramicEsr,
  heat: ceramicHeat,
  polarised: false,
};
