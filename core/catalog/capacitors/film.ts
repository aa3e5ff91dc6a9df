/** Plastic film capacitors: stable, without polarity, large for their value. */
import { band, exact, memory, practice } from '../figures';
import type { CapacitorKind } from '../part';

export const film: CapacitorKind = {
  key: 'film',
  title: 'Plastic film',
  source: 'Class values for polyester film, to be confirmed',
  tolerance: band(-0.1, 0, 0.1, '1', practice('5 % and 10 % parts are both stocked; the wider is taken')),
  temperature: band(-0.05, 0, 0.05, '1', memory('polyester over -55 to 100 degC')),
  esr: band(5e-3, 20e-3, 100e-3, 'ohm', memory('0.1 to 10 uF at 10 to 100 kHz')),
  heat: exact(0.1, 'W', practice('small box, some 20 K above its surroundings')),
  polarised: false,
};
