/** Aluminium with conductive polymer. */
import { band, exact, memory, practice } from '../figures';
import type { CapacitorKind } from '../part';
import { twentyPercent } from './electrolytic-family';

export const polymer: CapacitorKind = {
  key: 'polymer',
  title: 'Aluminium with conductive polymer',
  source: 'Class values, to be confirmed',
  tolerance: band(-0.2, 0, 0.2, '1', twentyPercent),
  temperature: band(-0.1, 0, 0.1, '1', memory('over -55 to 105 degC')),
  esr: band(5e-3, 20e-3, 60e-3, 'ohm', memory('100 kHz')),
  leakageRate: band(0.002, 0.02, 0.2, '1', memory('limit of 0.2 uA per uF and V of many series')),
  heat: exact(0.1, 'W', practice('ripple ratings of small parts times their ESR')),
  polarised: true,
};
