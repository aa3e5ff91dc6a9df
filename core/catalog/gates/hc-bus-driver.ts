/** HC bus driver. */
import { band, memory } from '../figures';
import type { GateData } from '../part';
import { bus, output, pair, quiet, rated, wires } from './gate-family';

export const hcBusDriver: GateData = {
  key: 'hc-bus-driver',
  title: 'HC bus driver',
  source: 'JEDEC JESD7-A, from memory: confirm',
  supply: band(2, 5, 6, 'V', memory('supply range')),
  output: output(6e-3, pair(6e-3, 4.5, 3.84, 0.33, bus), pair(7.8e-3, 6, 5.34, 0.33, bus)),
  absolute: rated(35e-3),
  total: wires(70e-3),
  draws: quiet,
};
