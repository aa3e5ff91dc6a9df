/** STM32G0x1: the weakest pins of the family. */
import { band, exact, highPoint, limitOf, lowPoint, memory } from '../figures';
import type { ChipData } from '../part';
import { pinRange } from './pins';

const levels = limitOf(memory('STM32G0x1 data sheet, output voltage characteristics'));
const sum = exact(80e-3, 'A', memory('STM32G0x1 data sheet: sum over all I/O pins'));
const wire = exact(0.1, 'A', memory('STM32G0x1 data sheet: VDD and VSS'));
const names = ['PA', 'PB', 'PC', 'PD'].flatMap((port) => pinRange(port, 0, 15)).concat(pinRange('PF', 0, 4));

export const stm32g071: ChipData = {
  key: 'stm32g071',
  title: 'STM32G071 microcontroller (also G031, G041, G081)',
  source: 'STM32G0x1 data sheet, from memory: confirm',
  supply: band(1.7, 3.3, 3.6, 'V', memory('supply range')),
  pins: {
    high: [highPoint(6e-3, 2.9, 3.3, levels)],
    low: [lowPoint(6e-3, 0.4, 3.3, levels)],
    recommended: exact(6e-3, 'A', memory('test current; up to 15 mA with levels off by 1.3 V')),
    absolute: exact(15e-3, 'A', memory('absolute maximum per pin, 20 mA for pins with a strong fast mode')),
  },
  pin: {},
  names,
  groups: [{ name: 'all I/O', pins: names, source: sum, sink: sum }],
  total: { source: wire, sink: wire },
  draws: band(5e-3, 6.5e-3, 8e-3, 'A', memory('active at 64 MHz')),
};
