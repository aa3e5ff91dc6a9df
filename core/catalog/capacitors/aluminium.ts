/** Aluminium electrolytic, wet. */
import { band, dataSheet, exact, memory, practice } from '../figures';
import type { CapacitorKind } from '../part';
import { twentyPercent } from './electrolytic-family';

export const aluminium: CapacitorKind = {
  key: 'aluminium',
  title: 'Aluminium electrolytic, wet',
  source: 'General-purpose class values, to be confirmed',
  tolerance: band(-0.2, 0, 0.2, '1', twentyPercent),
  temperature: band(-0.2, 0, 0.1, '1', memory('value at -25 degC and at 85 degC against 25 degC')),
  // The limit falls with the rated voltage: about 0.28 at 6.3 V, 0.16 at 25 V, 0.08 at 100 V.
  loss: band(
    0.08,
    0.16,
    0.28,
    '1',
    memory('loss factor limits by rated voltage, 6.3 to 100 V', '120 Hz, 20 degC'),
  ),
  leakageRate: band(
    0.0002,
    0.001,
    0.01,
    '1',
    dataSheet('limit of 0.01 uA per uF and V in public part lists; usual parts stay a tenth of it or less'),
  ),
  heat: exact(0.05, 'W', practice('ripple ratings of small radial parts times their ESR: 30 to 130 mW')),
  polarised: true,
};
