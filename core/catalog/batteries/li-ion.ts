/** One lithium-ion or lithium-polymer cell. */
import { band, memory } from '../figures';
import type { SupplyData } from '../part';

export const liIon: SupplyData = {
  key: 'li-ion',
  title: 'Lithium-ion cell',
  source: 'Class values, to be confirmed',
  voltage: band(3, 3.7, 4.2, 'V', memory('cut-off, nominal and full')),
  resistance: band(
    0.02,
    0.1,
    0.5,
    'ohm',
    memory('large round cell when warm, small pouch, small pouch at 0 degC'),
  ),
};
