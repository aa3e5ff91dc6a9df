/** Logic outputs by family, as drivers of a pump. Limits over -40 to 85 degC; a single gate has tables of its own. */
import type { Band, Origin } from '../../quantity/figure';
import { dataSheet, exact, highPoint, limitOf, lowPoint, memory } from '../figures';
import type { TestPoint } from '../part';

export const rated = (ampere: number) => exact(ampere, 'A', memory('absolute maximum of one output'));

export const wires = (ampere: number) =>
  exact(ampere, 'A', memory('absolute maximum of the VCC and GND pins'));

export const quiet = exact(2e-6, 'A', memory('quiescent current of a small package; switching comes on top'));

export const pair = (
  ampere: number,
  supply: number,
  high: number,
  low: number,
  origin: Origin,
): [TestPoint, TestPoint] => [
  highPoint(ampere, high, supply, limitOf(origin)),
  lowPoint(ampere, low, supply, limitOf(origin)),
];

export const output = (ampere: number, ...pairs: readonly [TestPoint, TestPoint][]) => ({
  high: pairs.map((points) => points[0]),
  low: pairs.map((points) => points[1]),
  recommended: exact(ampere, 'A', memory('test current at 4.5 V, or at 3 V for the low-voltage family')),
});

export const hcSheet = dataSheet(
  'data sheet of an HC Schmitt inverter; JEDEC JESD7-A sets these limits',
  '-40 to 85 degC',
);

export const bus = memory('JEDEC JESD7-A, bus driver outputs');

export const oneGate = dataSheet('data sheet of an HC single gate, typical and limit', 'VCC = 4.5 V, 2 mA');

export const highDrop: Band = { min: 0.12, typical: 0.18, max: 0.37 };

export const lowDrop: Band = { min: 0.1, typical: 0.15, max: 0.33 };

export const ahcAt5 = dataSheet('AHC data sheet', '-40 to 85 degC');

export const ahcAt3 = memory('AHC data sheet', '-40 to 85 degC');

export const acLimits = memory('JEDEC JESD20', '-40 to 85 degC');

export const lvcLimits = memory('JEDEC JESD36 and JESD8 class', '-40 to 85 degC');
