/** PIC16F193x microcontroller. */
import { band, exact, memory } from '../figures';
import type { ChipData } from '../part';
import { older, sums } from './pic-family';

export const pic16f1939: ChipData = {
  key: 'pic16f1939',
  title: 'PIC16F193x microcontroller',
  source: 'PIC16(L)F193x errata, the rest to be confirmed',
  supply: band(1.8, 5, 5.5, 'V', memory('supply range')),
  pins: { ...older, absolute: exact(25e-3, 'A', memory('absolute maximum per pin')) },
  pin: {},
  groups: [],
  total: sums(0.34, 0.25),
  draws: band(2e-3, 3e-3, 4e-3, 'A', memory('active at 32 MHz, 3 V')),
};
