/** ATmega16U4 and ATmega32U4: half the test current of the other eight-bit parts of the family. */
import { band, dataSheet, exact, highPoint, limitOf, lowPoint, memory } from '../figures';
import type { ChipData, PinGroup } from '../part';
import { pinRange } from './pins';

const family = 'ATmega16U4 and ATmega32U4 data sheet';
const levels = limitOf(dataSheet(`${family}, DC characteristics`, '-40 to 85 degC'));
const rail = exact(0.2, 'A', dataSheet(`${family}, absolute maximum of VCC and GND`));

const group = (name: string, pins: readonly string[]): PinGroup => {
  const sum = exact(
    0.1,
    'A',
    memory('100 mA for each group is printed; which pins belong to it needs a look'),
  );
  return { name, pins, source: sum, sink: sum };
};

export const atmega32u4: ChipData = {
  key: 'atmega32u4',
  title: 'ATmega32U4 microcontroller (also 16U4)',
  source: family,
  supply: band(2.7, 5, 5.5, 'V', memory('supply range')),
  pins: {
    high: [highPoint(10e-3, 4.2, 5, levels), highPoint(5e-3, 2.3, 3, levels)],
    low: [lowPoint(10e-3, 0.7, 5, levels), lowPoint(5e-3, 0.5, 3, levels)],
    recommended: exact(10e-3, 'A', dataSheet(`${family}: test current at 5 V; 5 mA at 3 V`)),
    absolute: exact(40e-3, 'A', dataSheet(`${family}, absolute maximum per pin`)),
  },
  pin: {},
  names: [
    ...pinRange('PB', 0, 7),
    'PC6',
    'PC7',
    ...pinRange('PD', 0, 7),
    'PE2',
    'PE6',
    'PF0',
    'PF1',
    ...pinRange('PF', 4, 7),
  ],
  groups: [
    group('C6-C7', ['PC6', 'PC7']),
    group('D', pinRange('PD', 0, 7)),
    group('B, E', [...pinRange('PB', 0, 7), 'PE2', 'PE6']),
    group('F', ['PF0', 'PF1', ...pinRange('PF', 4, 7)]),
  ],
  total: { source: rail, sink: rail },
  draws: band(8e-3, 15e-3, 27e-3, 'A', memory('active at 16 MHz, 5 V; 10 mA typical at 8 MHz')),
};
