/**
 * Fast silicon switching diode, 75 to 100 V, 150 to 200 mA.
 *
 * How the band is made, here and in the other diodes: fits to typical and to limit curves give different pairs of
 * saturation current and ideality, and mixing the extremes of such pairs would invent diodes that nobody makes.
 * So ideality is kept exact, saturation current moves the whole curve (smallest current, highest voltage) and
 * resistance opens it towards high current. All bands at their high-voltage end give the data sheet's limit curve.
 */
import { band, exact, memory } from '../figures';
import type { DiodeData } from '../part';

const curve = memory('class values; typical 0.58 V at 1 mA and 0.69 V at 10 mA', '25 degC');

export const siliconSwitching: DiodeData = {
  key: 'silicon-switching',
  title: 'Silicon switching diode, 100 V, 200 mA',
  source:
    'Class values of several makers, limit 0.715 V at 1 mA read in design notes, the rest to be confirmed',
  kind: 'silicon',
  // 134 mV above typical at 1 mA is the limit of 0.715 V; 31 mV below it is practice, since makers print no least voltage.
  saturation: band(1.27e-10, 2.5e-9, 5e-9, 'A', curve),
  ideality: exact(1.75, '1', curve),
  resistance: band(0.4, 0.6, 1.9, 'ohm', curve),
  junction: band(1.5e-12, 3e-12, 4e-12, 'F', memory('zero-bias capacitance, class value')),
  reverse: exact(75, 'V', memory('the lower of the usual ratings 75 and 100 V')),
  average: exact(0.15, 'A', memory('the lower of the usual ratings 150 and 200 mA')),
  peak: exact(0.45, 'A', memory('repetitive peak')),
  leakage: band(1e-9, 5e-9, 25e-9, 'A', memory('a few nanoampere typical, limit at 20 V and 25 degC')),
};
