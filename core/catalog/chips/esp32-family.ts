/**
 * ESP32, ESP32-S3 and ESP32-C3. The maker prints only a typical drive at the strongest setting, no worst case, so the
 * bands here are wider than those of other chips; reset leaves a weaker setting than the one printed.
 */
import { dataSheet, derived, exact, memory, pointFromDrops } from '../figures';
import type { PinData } from '../part';

const printed = derived(
  'typical 40 mA at 0.8 VDD and 28 mA at 0.1 VDD from the data sheet, strongest setting; best and worst by +-40 % (common practice)',
);

const reset = derived(
  'half the strength of the printed setting: from memory of the four steps 5, 10, 20, 40 mA, confirm',
);

const strongest: PinData = {
  high: [pointFromDrops(40e-3, 3.3, { min: 0.4, typical: 0.66, max: 0.92 }, 'high', printed)],
  low: [pointFromDrops(28e-3, 3.3, { min: 0.2, typical: 0.33, max: 0.46 }, 'low', printed)],
  recommended: exact(
    28e-3,
    'A',
    dataSheet('the smaller of the printed drives; falls to about 29 mA source as more pins drive'),
  ),
  absolute: exact(40e-3, 'A', memory('treated as the most that one pin may carry')),
};

const afterReset: PinData = {
  high: [pointFromDrops(20e-3, 3.3, { min: 0.33, typical: 0.66, max: 0.92 }, 'high', reset)],
  low: [pointFromDrops(14e-3, 3.3, { min: 0.16, typical: 0.33, max: 0.46 }, 'low', reset)],
  recommended: exact(14e-3, 'A', reset),
  absolute: exact(40e-3, 'A', memory('treated as the most that one pin may carry')),
};

export const pins: PinData = { ...afterReset, strengths: { '20 mA': afterReset, '40 mA': strongest } };

export const sum = (sheet: string, ampere: number) =>
  exact(ampere, 'A', dataSheet(`${sheet}: cumulative I/O current, a survival limit and no design value`));
