/** Solid tantalum with manganese dioxide. */
import { band, exact, memory } from '../figures';
import type { CapacitorKind } from '../part';
import { twentyPercent } from './electrolytic-family';

export const tantalum: CapacitorKind = {
  key: 'tantalum',
  title: 'Solid tantalum with manganese dioxide',
  source: 'Class values, to be confirmed',
  tolerance: band(-0.2, 0, 0.2, '1', twentyPercent),
  temperature: band(-0.1, 0, 0.1, '1', memory('over -55 to 85 degC')),
  esr: band(0.1, 1, 4, 'ohm', memory('1 to 100 uF in the usual cases', '100 kHz')),
  leakageRate: band(0.0002, 0.001, 0.01, '1', memory('limit of 0.01 uA per uF and V, 25 degC')),
  heat: exact(0.075, 'W', memory('heat that the smallest moulded case bears')),
  polarised: true,
};
