/** nRF52840: weak pins, with a stronger setting that has to be asked for. */
import { band, dataSheet, exact, memory, pointFromDrops } from '../figures';
import type { ChipData, PinData } from '../part';
import { pinRange } from './pins';

const table = dataSheet('GPIO table of the nRF52 series: least, typical and most current at a drop of 0.4 V');

// The table prints the band of currents at one drop; at the typical current the drop moves the other way.
const standardDrive: PinData = {
  high: [pointFromDrops(2e-3, 3.3, { min: 0.2, typical: 0.4, max: 0.8 }, 'high', table)],
  low: [pointFromDrops(2e-3, 3.3, { min: 0.2, typical: 0.4, max: 0.8 }, 'low', table)],
  recommended: exact(0.5e-3, 'A', dataSheet('test current of the standard drive')),
};

const highDrive: PinData = {
  high: [pointFromDrops(9e-3, 3.3, { min: 0.257, typical: 0.4, max: 0.6 }, 'high', table)],
  low: [pointFromDrops(10e-3, 3.3, { min: 0.267, typical: 0.4, max: 0.667 }, 'low', table)],
  recommended: exact(5e-3, 'A', dataSheet('test current of the high drive, VDD of 2.7 V and more')),
};

const sum = exact(15e-3, 'A', memory('about 15 mA for all pins; printed so for a sister part'));

export const nrf52840: ChipData = {
  key: 'nrf52840',
  title: 'nRF52840 radio microcontroller',
  source: 'GPIO table of the nRF52 series data sheets',
  supply: band(1.7, 3, 3.6, 'V', memory('normal-voltage mode; the high-voltage input takes 2.5 to 5.5 V')),
  pins: { ...standardDrive, strengths: { standard: standardDrive, high: highDrive } },
  pin: {},
  names: [...pinRange('P0.', 0, 31), ...pinRange('P1.', 0, 15)],
  groups: [],
  total: { source: sum, sink: sum },
  draws: band(
    3.3e-3,
    5e-3,
    6.4e-3,
    'A',
    memory('core at 64 MHz from the internal converter, and radio at 0 dBm'),
  ),
};
