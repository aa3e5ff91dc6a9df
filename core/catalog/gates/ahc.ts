/** AHC gate. */
import { band, memory } from '../figures';
import type { GateData } from '../part';
import { ahcAt3, ahcAt5, output, pair, quiet, rated, wires } from './gate-family';

export const ahc: GateData = {
  key: 'ahc',
  title: 'AHC gate',
  source: 'AHC data sheet',
  supply: band(2, 5, 5.5, 'V', memory('supply range')),
  output: output(8e-3, pair(8e-3, 4.5, 3.8, 0.44, ahcAt5), pair(4e-3, 3, 2.48, 0.44, ahcAt3)),
  absolute: rated(25e-3),
  total: wires(50e-3),
  draws: quiet,
};
