/** Ceramic capacitors by dielectric code: one stable kind and three that lose value with voltage and temperature. */
import { band, exact, memory, practice, standard } from '../figures';

export const code = (letters: string) =>
  standard(`EIA-198 code ${letters}, change over its temperature range (to be confirmed)`);

export const ceramicEsr = band(
  5e-3,
  10e-3,
  20e-3,
  'ohm',
  memory('multilayer ceramic of 1 to 10 uF, 10 kHz to 1 MHz'),
);

export const ceramicHeat = exact(0.1, 'W', practice('case size 0805, some 20 K above its surroundings'));
