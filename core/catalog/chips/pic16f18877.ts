/** PIC16F18xxx microcontroller. */
import { band, exact, memory } from '../figures';
import type { ChipData } from '../part';
import { older, sums } from './pic-family';

export const pic16f18877: ChipData = {
  key: 'pic16f18877',
  title: 'PIC16F18xxx microcontroller',
  source: 'I/O table of the PIC16(L)F193x errata, the rest to be confirmed',
  supply: band(2.3, 5, 5.5, 'V', memory('supply range')),
  pins: { ...older, absolute: exact(50e-3, 'A', memory('absolute maximum per pin')) },
  pin: {},
  groups: [],
  total: sums(0.35, 0.25),
  draws: band(2e-3, 3e-3, 4e-3, 'A', memory('active at 32 MHz, 3 V')),
};
