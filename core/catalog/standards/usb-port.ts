/**
 * What a USB port promises: voltage at its connector, current, resistance of the cable behind it, and the bulk
 * capacitance that may be connected at once.
 */
import { band, derived, exact, memory, standard } from '../figures';

export const usb2 = 'USB 2.0, section 7.2';

// 125 mV in the supply wire and 125 mV in ground at 500 mA is the most a cable may lose.
export const cable = band(
  0.1,
  0.25,
  0.5,
  'ohm',
  derived('cable budget of 250 mV at 500 mA, both wires (to be confirmed)'),
);

export const cableC = band(0.08, 0.15, 0.25, 'ohm', memory('cable budget of 750 mV at 3 A, both wires'));

export const bulk = exact(
  10e-6,
  'F',
  standard('USB 2.0, section 7.2.4.1: at most 10 uF beside one unit load'),
);

export const highPower = band(4.75, 5, 5.25, 'V', standard(`${usb2}: port that gives five unit loads`));

export const typeC = band(4.75, 5, 5.5, 'V', memory('USB Type-C source at its connector'));
