/** Ceramic, class 1, C0G. */
import { band, memory, practice } from '../figures';
import type { CapacitorKind } from '../part';
import { ceramicHeat, code } from './ceramic-family';

export const c0g: CapacitorKind = {
  key: 'c0g',
  title: 'Ceramic, class 1, C0G',
  source: 'EIA-198 class 1 code, 30 ppm/K; tolerance as usually stocked',
  tolerance: band(-0.05, 0, 0.05, '1', practice('5 % parts are the stocked ones')),
  temperature: band(-0.003, 0, 0.003, '1', code('C0G')),
  esr: band(5e-3, 20e-3, 100e-3, 'ohm', memory('multilayer ceramic of 1 to 100 nF')),
  heat: ceramicHeat,
  polarised: false,
};
