/** AC gate. */
import { band, memory } from '../figures';
import type { GateData } from '../part';
import { acLimits, output, pair, quiet, rated, wires } from './gate-family';

export const ac: GateData = {
  key: 'ac',
  title: 'AC gate',
  source: 'JEDEC JESD20, from memory: confirm',
  supply: band(2, 5, 6, 'V', memory('supply range')),
  output: output(24e-3, pair(24e-3, 4.5, 3.76, 0.44, acLimits)),
  absolute: rated(50e-3),
  total: wires(100e-3),
  draws: quiet,
};
