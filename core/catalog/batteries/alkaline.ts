/** One alkaline cell of size AA; the smaller AAA has about half the capacity and a little more resistance. */
import { band, dataSheet, memory } from '../figures';
import type { SupplyData } from '../part';

export const alkaline: SupplyData = {
  key: 'alkaline',
  title: 'Alkaline cell',
  source: 'Class values of size AA, to be confirmed',
  voltage: band(0.9, 1.5, 1.6, 'V', memory('empty, nominal and fresh without load')),
  resistance: band(
    0.1,
    0.2,
    0.9,
    'ohm',
    dataSheet('0.1 ohm at 40 degC and 0.9 ohm at -40 degC of one make; near the end it doubles or triples'),
  ),
};
