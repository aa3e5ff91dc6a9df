/** HC gate. */
import { band, memory } from '../figures';
import type { GateData } from '../part';
import { hcSheet, output, pair, quiet, rated, wires } from './gate-family';

export const hc: GateData = {
  key: 'hc',
  title: 'HC gate',
  source: 'HC data sheet, JEDEC JESD7-A',
  supply: band(2, 5, 6, 'V', memory('supply range')),
  output: output(4e-3, pair(4e-3, 4.5, 3.84, 0.33, hcSheet), pair(5.2e-3, 6, 5.34, 0.33, hcSheet)),
  absolute: rated(25e-3),
  total: wires(50e-3),
  draws: quiet,
};
