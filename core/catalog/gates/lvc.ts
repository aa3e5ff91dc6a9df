/** LVC gate. */
import { band, memory } from '../figures';
import type { GateData } from '../part';
import { lvcLimits, output, pair, quiet, rated, wires } from './gate-family';

export const lvc: GateData = {
  key: 'lvc',
  title: 'LVC gate',
  source: 'JEDEC JESD36 class, from memory: confirm',
  supply: band(1.65, 3.3, 3.6, 'V', memory('supply range')),
  output: output(24e-3, pair(24e-3, 3, 2.2, 0.55, lvcLimits)),
  absolute: rated(50e-3),
  total: wires(100e-3),
  draws: quiet,
};
