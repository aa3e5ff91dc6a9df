/** STM32F405 and STM32F407. */
import { band, dataSheet, exact, highPoint, limitOf, lowPoint, memory } from '../figures';
import type { ChipData } from '../part';
import { pinRange } from './pins';

const family = 'STM32F405 and F407 data sheet';
const levels = limitOf(
  dataSheet(`${family}, output voltage characteristics; 8 mA low level read, high level alike`),
);
// One revision prints 150 mA, a later one 240 mA: the smaller is safe for both.
const supplyWire = exact(0.15, 'A', dataSheet(`${family} rev. 4; a later revision allows 240 mA`));
const weak = dataSheet(`${family}: 3 mA in all, and no lamp may be fed from them`);

export const stm32f407: ChipData = {
  key: 'stm32f407',
  title: 'STM32F407 microcontroller (also F405)',
  source: family,
  supply: band(1.8, 3.3, 3.6, 'V', dataSheet(family)),
  pins: {
    high: [highPoint(8e-3, 2.9, 3.3, levels)],
    low: [lowPoint(8e-3, 0.4, 3.3, levels)],
    recommended: exact(8e-3, 'A', dataSheet(`${family}: test current; up to 20 mA with levels off by 1.3 V`)),
    absolute: exact(25e-3, 'A', dataSheet(`${family}, absolute maximum per pin`)),
  },
  pin: {},
  names: ['PA', 'PB', 'PC', 'PD', 'PE', 'PF', 'PG', 'PH']
    .flatMap((port) => pinRange(port, 0, 15))
    .concat(pinRange('PI', 0, 11)),
  groups: [
    {
      name: 'PC13-PC15, PI8',
      pins: [...pinRange('PC', 13, 15), 'PI8'],
      source: exact(0, 'A', weak),
      sink: exact(3e-3, 'A', weak),
    },
  ],
  total: { source: supplyWire, sink: supplyWire },
  draws: band(40e-3, 60e-3, 90e-3, 'A', memory('active at 168 MHz')),
};
