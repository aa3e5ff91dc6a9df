/** One lithium coin cell of 20 mm: high resistance, and pulses are what it dislikes. */
import { band, dataSheet, exact } from '../figures';
import type { SupplyData } from '../part';

export const lithiumCoin: SupplyData = {
  key: 'lithium-coin',
  title: 'Lithium coin cell, 20 mm',
  source: "A maker's form and articles that measured such cells",
  voltage: band(
    2,
    3,
    3.3,
    'V',
    dataSheet('3.0 V nominal, 2.0 V empty; 3.3 V fresh without load is from memory'),
  ),
  current: exact(
    10e-3,
    'A',
    dataSheet('pulses of 10 to 15 mA at most; steady current should stay near 0.2 mA'),
  ),
  resistance: band(
    10,
    15,
    50,
    'ohm',
    dataSheet('about 10 ohm fresh, 15 to 30 ohm aged, 30 to 50 ohm at the end'),
  ),
};
