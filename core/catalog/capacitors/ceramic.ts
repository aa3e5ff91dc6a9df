/** Ceramic capacitors by dielectric code: one stable kind and three that lose value with voltage and temperature. */
import { band, exact, memory, practice, standard } from '../figures';
import type { CapacitorKind } from '../part';
import { genericBias } from './bias';

const code = (letters: string) =>
  standard(`EIA-198 code ${letters}, change over its temperature range (to be confirmed)`);
const ceramicEsr = band(
  5e-3,
  10e-3,
  20e-3,
  'ohm',
  memory('multilayer ceramic of 1 to 10 uF, 10 kHz to 1 MHz'),
);

const ceramicHeat = exact(0.1, 'W', practice('case size 0805, some 20 K above its surroundings'));

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
