/** STM32L4x6. */
import { band, exact, highPoint, limitOf, lowPoint, memory } from '../figures';
import type { ChipData } from '../part';
import { pinRange } from './pins';

const levels = limitOf(memory('STM32L4x6 data sheet, output voltage characteristics'));
const sum = exact(0.1, 'A', memory('STM32L4x6 data sheet: sum over all I/O pins'));
const wire = exact(0.15, 'A', memory('STM32L4x6 data sheet: all VDD or VSS pins, 100 mA through one'));
const names = ['PA', 'PB', 'PC', 'PD', 'PE', 'PF', 'PG']
  .flatMap((port) => pinRange(port, 0, 15))
  .concat(['PH0', 'PH1']);

export const stm32l476: ChipData = {
  key: 'stm32l476',
  title: 'STM32L476 microcontroller (also L486, L496)',
  source: 'STM32L4x6 data sheet, from memory: confirm',
  supply: band(1.71, 3.3, 3.6, 'V', memory('supply range')),
  pins: {
    high: [highPoint(8e-3, 2.9, 3.3, levels)],
    low: [lowPoint(8e-3, 0.4, 3.3, levels)],
    recommended: exact(8e-3, 'A', memory('test current; up to 20 mA with levels off by 1.3 V')),
    absolute: exact(20e-3, 'A', memory('absolute maximum per pin')),
  },
  pin: {},
  names,
  groups: [{ name: 'all I/O', pins: names, source: sum, sink: sum }],
  total: { source: wire, sink: wire },
  draws: band(7e-3, 9e-3, 11e-3, 'A', memory('active at 80 MHz')),
};
