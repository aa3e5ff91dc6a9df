/**
 * RP2040. Its drive setting says at which current the levels are guaranteed; it is no current limit, and the data
 * sheet states no absolute maximum for a pin, only sums for all of them.
 */
import { band, dataSheet, exact, highPoint, limitOf, lowPoint, memory } from '../figures';
import type { ChipData, PinData } from '../part';
import { pinRange } from './pins';

const levels = (milliampere: number) =>
  limitOf(dataSheet(`RP2040 data sheet, levels at the ${milliampere} mA drive setting`));

const setting = (milliampere: number): PinData => {
  const current = milliampere * 1e-3;
  const origin = levels(milliampere);
  return {
    high: [highPoint(current, 2.62, 3.3, origin), highPoint(current, 1.24, 1.8, origin)],
    low: [lowPoint(current, 0.5, 3.3, origin), lowPoint(current, 0.3, 1.8, origin)],
    recommended: exact(current, 'A', dataSheet('current of the drive setting: the levels hold up to it')),
  };
};

export const rp2040: ChipData = {
  key: 'rp2040',
  title: 'RP2040 microcontroller',
  source: 'RP2040 data sheet, electrical specifications',
  supply: band(1.62, 3.3, 3.63, 'V', dataSheet('RP2040 data sheet, IOVDD')),
  // The setting after reset is 4 mA (from memory: confirm).
  pins: {
    ...setting(4),
    strengths: { '2 mA': setting(2), '4 mA': setting(4), '8 mA': setting(8), '12 mA': setting(12) },
  },
  pin: {},
  names: pinRange('GP', 0, 29),
  groups: [],
  total: {
    source: exact(50e-3, 'A', dataSheet('RP2040 data sheet: sum over all GPIO and QSPI pins')),
    sink: exact(50e-3, 'A', dataSheet('RP2040 data sheet: sum over all GPIO and QSPI pins')),
  },
  draws: band(
    9e-3,
    11e-3,
    42e-3,
    'A',
    memory("core 9 to 11 mA, 17 mA most, and up to 25 mA of the pins' supply, by use"),
  ),
};
