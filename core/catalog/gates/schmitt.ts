/**
 * Schmitt inverters, as oscillators of one resistor and one capacitor. Their thresholds spread so far that the
 * frequency of two parts may differ by a factor of five: the bands are printed limits, never to be narrowed.
 */
import { band, dataSheet, exact } from '../figures';
import type { GateData } from '../part';
import { hc, hcSingle } from './plain';

const single = dataSheet('data sheet of an HC single Schmitt inverter', 'VCC = 4.5 V, -40 to 85 degC');
const six = dataSheet(
  'data sheet of a sixfold HC Schmitt inverter, limits; typical as in the single part',
  'VCC = 4.5 V, -40 to 85 degC',
);
const at4V5 = exact(4.5, 'V', dataSheet('supply of the threshold limits'));

export const hcSchmitt: GateData = {
  ...hc,
  key: 'hc-schmitt',
  title: 'HC Schmitt inverter, six in a package',
  source: 'HC Schmitt inverter data sheet',
  rising: band(2.3, 2.36, 3.15, 'V', six),
  falling: band(0.9, 1.53, 2.0, 'V', six),
  thresholdSupply: at4V5,
};

export const hcSchmittSingle: GateData = {
  ...hcSingle,
  key: 'hc-schmitt-single',
  title: 'HC Schmitt inverter, single',
  source: 'HC single Schmitt inverter data sheet',
  rising: band(1.7, 2.36, 3.15, 'V', single),
  falling: band(0.9, 1.53, 2.0, 'V', single),
  thresholdSupply: at4V5,
};
