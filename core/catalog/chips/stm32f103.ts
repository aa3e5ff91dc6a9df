/** STM32F103: 8 mA at good levels, 20 mA at poor ones, and three pins that can hardly drive anything. */
import { band, dataSheet, exact, highPoint, limitOf, lowPoint, memory } from '../figures';
import type { ChipData } from '../part';
import { pinRange } from './pins';

const levels = limitOf(dataSheet('STM32F103 data sheet, output voltage characteristics'));
const supplyWire = exact(0.15, 'A', dataSheet('STM32F103 data sheet, absolute maximum of VDD and of VSS'));
const weak = memory('switched by a small transistor: 3 mA in all, sinking only');

export const stm32f103: ChipData = {
  key: 'stm32f103',
  title: 'STM32F103 microcontroller',
  source: 'STM32F103 data sheet, absolute maximum ratings and I/O characteristics',
  supply: band(2, 3.3, 3.6, 'V', dataSheet('STM32F103 data sheet')),
  pins: {
    high: [highPoint(8e-3, 2.9, 3.3, levels), highPoint(6e-3, 2.0, 2.4, levels)],
    low: [lowPoint(8e-3, 0.4, 3.3, levels), lowPoint(6e-3, 0.4, 2.4, levels)],
    recommended: exact(8e-3, 'A', dataSheet('test current; at 20 mA the levels may be off by 1.3 V')),
    absolute: exact(25e-3, 'A', dataSheet('STM32F103 data sheet, absolute maximum per pin')),
  },
  pin: {},
  names: [
    ...pinRange('PA', 0, 15),
    ...pinRange('PB', 0, 15),
    ...pinRange('PC', 0, 15),
    ...pinRange('PD', 0, 15),
    ...pinRange('PE', 0, 15),
  ],
  groups: [
    {
      name: 'PC13-PC15',
      pins: pinRange('PC', 13, 15),
      source: exact(0, 'A', weak),
      sink: exact(3e-3, 'A', weak),
    },
  ],
  total: { source: supplyWire, sink: supplyWire },
  draws: band(30e-3, 40e-3, 50e-3, 'A', memory('active at 72 MHz, all peripherals on')),
};
