/** STM32F303: as the F103 per pin, with a sum over all pins besides. */
import { band, dataSheet, exact, highPoint, limitOf, lowPoint, memory } from '../figures';
import type { ChipData } from '../part';
import { pinRange } from './pins';

const family = 'STM32F303 data sheet';
const levels = limitOf(memory('levels as in the F103'));
const sum = exact(80e-3, 'A', dataSheet(`${family}: sum over all I/O pins`));
const names = ['PA', 'PB', 'PC', 'PD', 'PE', 'PF'].flatMap((port) => pinRange(port, 0, 15));
const weak = memory('3 mA in all, sinking only');

export const stm32f303: ChipData = {
  key: 'stm32f303',
  title: 'STM32F303 microcontroller',
  source: family,
  supply: band(2, 3.3, 3.6, 'V', memory('supply range')),
  pins: {
    high: [highPoint(8e-3, 2.9, 3.3, levels)],
    low: [lowPoint(8e-3, 0.4, 3.3, levels)],
    recommended: exact(8e-3, 'A', memory('test current; up to 20 mA with levels off by 1.3 V')),
    absolute: exact(25e-3, 'A', dataSheet(`${family}, absolute maximum per pin`)),
  },
  pin: {},
  names,
  groups: [
    { name: 'all I/O', pins: names, source: sum, sink: sum },
    {
      name: 'PC13-PC15',
      pins: pinRange('PC', 13, 15),
      source: exact(0, 'A', weak),
      sink: exact(3e-3, 'A', weak),
    },
  ],
  total: {
    source: exact(0.16, 'A', dataSheet(`${family}: all VDD pins, 100 mA through one`)),
    sink: exact(0.16, 'A', dataSheet(`${family}: all VSS pins, 100 mA through one`)),
  },
  draws: band(25e-3, 40e-3, 65e-3, 'A', memory('active at 72 MHz')),
};
