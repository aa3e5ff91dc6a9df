/**
 * Schmitt inverters, as oscillators of one resistor and one capacitor. Their thresholds spread so far that the
 * frequency of two parts may differ by a factor of five: the bands are printed limits, never to be narrowed.
 */
import { dataSheet, exact } from '../figures';

export const single = dataSheet('data sheet of an HC single Schmitt inverter', 'VCC = 4.5 V, -40 to 85 degC');

export const six = dataSheet(
  'data sheet of a sixfold HC Schmitt inverter, limits; typical as in the single part',
  'VCC = 4.5 V, -40 to 85 degC',
);

export const at4V5 = exact(4.5, 'V', dataSheet('supply of the threshold limits'));
