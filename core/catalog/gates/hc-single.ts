/** HC single gate. */
import { band, exact, memory, pointFromDrops } from '../figures';
import type { GateData } from '../part';
import { highDrop, lowDrop, oneGate, output, quiet, wires } from './gate-family';

export const hcSingle: GateData = {
  key: 'hc-single',
  title: 'HC single gate',
  source: 'HC single gate data sheet; the best part is a guess',
  supply: band(2, 5, 6, 'V', memory('supply range')),
  output: output(2e-3, [
    pointFromDrops(2e-3, 4.5, highDrop, 'high', oneGate),
    pointFromDrops(2e-3, 4.5, lowDrop, 'low', oneGate),
  ]),
  absolute: exact(12.5e-3, 'A', memory('half of the HC output rating for the single gate')),
  total: wires(25e-3),
  draws: quiet,
};
