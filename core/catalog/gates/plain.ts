/** Logic outputs by family, as drivers of a pump. Limits over -40 to 85 degC; a single gate has tables of its own. */
import type { Band, Origin } from '../../quantity/figure';
import { band, dataSheet, exact, highPoint, limitOf, lowPoint, memory, pointFromDrops } from '../figures';
import type { GateData, TestPoint } from '../part';

const rated = (ampere: number) => exact(ampere, 'A', memory('absolute maximum of one output'));
const wires = (ampere: number) => exact(ampere, 'A', memory('absolute maximum of the VCC and GND pins'));
const quiet = exact(2e-6, 'A', memory('quiescent current of a small package; switching comes on top'));
const pair = (
  ampere: number,
  supply: number,
  high: number,
  low: number,
  origin: Origin,
): [TestPoint, TestPoint] => [
  highPoint(ampere, high, supply, limitOf(origin)),
  lowPoint(ampere, low, supply, limitOf(origin)),
];
const output = (ampere: number, ...pairs: readonly [TestPoint, TestPoint][]) => ({
  high: pairs.map((points) => points[0]),
  low: pairs.map((points) => points[1]),
  recommended: exact(ampere, 'A', memory('test current at 4.5 V, or at 3 V for the low-voltage family')),
});

const hcSheet = dataSheet(
  'data sheet of an HC Schmitt inverter; JEDEC JESD7-A sets these limits',
  '-40 to 85 degC',
);

export const hc: GateData = {
  key: 'hc',
  title: 'HC gate',
  source: 'HC data sheet, JEDEC JESD7-A',
  supply: band(2, 5, 6, 'V', memory('supply range')),
  output: output(4e-3, pair(4e-3, 4.5, 3.84, 0.33, hcSheet), pair(5.2e-3, 6, 5.34, 0.33, hcSheet)),
  absolute: rated(25e-3),
  total: wires(50e-3),
  draws: quiet,
};

const bus = memory('JEDEC JESD7-A, bus driver outputs');

export const hcBusDriver: GateData = {
  key: 'hc-bus-driver',
  title: 'HC bus driver',
  source: 'JEDEC JESD7-A, from memory: confirm',
  supply: band(2, 5, 6, 'V', memory('supply range')),
  output: output(6e-3, pair(6e-3, 4.5, 3.84, 0.33, bus), pair(7.8e-3, 6, 5.34, 0.33, bus)),
  absolute: rated(35e-3),
  total: wires(70e-3),
  draws: quiet,
};

const oneGate = dataSheet('data sheet of an HC single gate, typical and limit', 'VCC = 4.5 V, 2 mA');
const highDrop: Band = { min: 0.12, typical: 0.18, max: 0.37 };
const lowDrop: Band = { min: 0.1, typical: 0.15, max: 0.33 };

export const hcSingle: GateData = {
  key: 'hc-single',
  title: 'HC single gate',
  source: 'HC single gate data sheet; the best part is a guess',
  supply: band(2, 5, 6, 'V', memory('supply range')),
  output: output(2e-3, [
    pointFromDrops(2e-3, 4.5, highDrop, 'high', oneGate),
    pointFromDrops(2e-3, 4.5, lowDrop, 'low', oneGate),
  ]),
  absolute: exact(12.5e-3, 'A', memory('half of the HC output rating for the single gate')),
  total: wires(25e-3),
  draws: quiet,
};

const ahcAt5 = dataSheet('AHC data sheet', '-40 to 85 degC');
const ahcAt3 = memory('AHC data sheet', '-40 to 85 degC');

export const ahc: GateData = {
  key: 'ahc',
  title: 'AHC gate',
  source: 'AHC data sheet',
  supply: band(2, 5, 5.5, 'V', memory('supply range')),
  output: output(8e-3, pair(8e-3, 4.5, 3.8, 0.44, ahcAt5), pair(4e-3, 3, 2.48, 0.44, ahcAt3)),
  absolute: rated(25e-3),
  total: wires(50e-3),
  draws: quiet,
};

const acLimits = memory('JEDEC JESD20', '-40 to 85 degC');

export const ac: GateData = {
  key: 'ac',
  title: 'AC gate',
  source: 'JEDEC JESD20, from memory: confirm',
  supply: band(2, 5, 6, 'V', memory('supply range')),
  output: output(24e-3, pair(24e-3, 4.5, 3.76, 0.44, acLimits)),
  absolute: rated(50e-3),
  total: wires(100e-3),
  draws: quiet,
};

const lvcLimits = memory('JEDEC JESD36 and JESD8 class', '-40 to 85 degC');

export const lvc: GateData = {
  key: 'lvc',
  title: 'LVC gate',
  source: 'JEDEC JESD36 class, from memory: confirm',
  supply: band(1.65, 3.3, 3.6, 'V', memory('supply range')),
  output: output(24e-3, pair(24e-3, 3, 2.2, 0.55, lvcLimits)),
  absolute: rated(50e-3),
  total: wires(100e-3),
  draws: quiet,
};

export const lvcSingle: GateData = {
  key: 'lvc-single',
  title: 'LVC single gate',
  source: 'JEDEC JESD36 class, from memory: confirm',
  supply: band(1.65, 3.3, 5.5, 'V', memory('supply range')),
  output: output(24e-3, pair(32e-3, 4.5, 3.8, 0.55, lvcLimits), pair(24e-3, 3, 2.2, 0.55, lvcLimits)),
  absolute: rated(50e-3),
  total: wires(100e-3),
  draws: quiet,
};
