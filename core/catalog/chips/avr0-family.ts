/** Eight-bit parts of the tinyAVR 0 and 1 and megaAVR 0 series, of which ATtiny1614 and ATmega4809 are the best known. */
import { band, dataSheet, exact, highPoint, limitOf, lowPoint, memory } from '../figures';

export const family = 'tinyAVR 0/1 and megaAVR 0 data sheets, I/O pin characteristics';

const levels = limitOf(dataSheet(family, '-40 to 85 degC'));

export const pinPair = {
  high: [
    highPoint(15e-3, 4.0, 5, levels),
    highPoint(7.5e-3, 2.4, 3, levels),
    highPoint(1.5e-3, 1.44, 1.8, levels),
  ],
  low: [
    lowPoint(15e-3, 1.0, 5, levels),
    lowPoint(7.5e-3, 0.6, 3, levels),
    lowPoint(1.5e-3, 0.36, 1.8, levels),
  ],
  recommended: exact(15e-3, 'A', dataSheet('test current at 5 V; 7.5 mA at 3 V, 1.5 mA at 1.8 V')),
  absolute: exact(40e-3, 'A', memory('absolute maximum per pin')),
};

export const supply = band(1.8, 5, 5.5, 'V', dataSheet(family));

export const rail = exact(0.2, 'A', memory('absolute maximum of VDD and GND at 85 degC'));

export const groupSum = exact(
  0.1,
  'A',
  dataSheet('100 mA for each pin group; an older text says 200 mA at 25 degC'),
);
