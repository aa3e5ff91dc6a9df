/** ATmega640, 1280 and 2560: the big eight-bit part, with sums for five groups of ports. */
import { band, dataSheet, exact, highPoint, limitOf, lowPoint, memory } from '../figures';
import type { ChipData, PinGroup } from '../part';
import { pinRange } from './pins';

const family = 'ATmega640 to ATmega2560 data sheet';
const levels = limitOf(memory(`${family}: levels as in the smaller parts`, '-40 to 85 degC'));
const rail = exact(0.2, 'A', memory('absolute maximum of VCC and GND'));

const group = (name: string, sumA: number, pins: readonly string[]): PinGroup => {
  const sum = exact(sumA, 'A', dataSheet(`${family}, notes to the DC characteristics; sourcing alike`));
  return { name, pins, source: sum, sink: sum };
};
const port = (letter: string) => pinRange(`P${letter}`, 0, 7);

export const atmega2560: ChipData = {
  key: 'atmega2560',
  title: 'ATmega2560 microcontroller (also 640, 1280)',
  source: family,
  supply: band(1.8, 5, 5.5, 'V', memory('1.8 V or 2.7 V to 5.5 V by grade')),
  pins: {
    high: [highPoint(20e-3, 4.2, 5, levels), highPoint(10e-3, 2.3, 3, levels)],
    low: [lowPoint(20e-3, 0.9, 5, levels), lowPoint(10e-3, 0.6, 3, levels)],
    recommended: exact(20e-3, 'A', dataSheet(`${family}: test current at 5 V; 10 mA at 3 V`)),
    absolute: exact(40e-3, 'A', dataSheet(`${family}, absolute maximum per pin`)),
  },
  pin: {},
  names: [
    ...['A', 'B', 'C', 'D', 'E', 'F'].flatMap(port),
    ...pinRange('PG', 0, 5),
    ...['H', 'J', 'K', 'L'].flatMap(port),
  ],
  groups: [
    group('J, A, G2', 0.2, [...port('J'), ...port('A'), 'PG2']),
    group('C, G0-G1, D, L', 0.2, [...port('C'), 'PG0', 'PG1', ...port('D'), ...port('L')]),
    group('G3-G4, B, H', 0.2, ['PG3', 'PG4', ...port('B'), ...port('H')]),
    group('E, G5', 0.1, [...port('E'), 'PG5']),
    group('F, K', 0.1, [...port('F'), ...port('K')]),
  ],
  total: { source: rail, sink: rail },
  draws: band(8e-3, 20e-3, 28e-3, 'A', memory('active at 16 MHz, 5 V; 10 mA typical at 8 MHz')),
};
