/** Small-signal Schottky diode, 30 V, 200 mA: the usual choice for a pump on a microcontroller's pin. */
import { band, dataSheet, exact, memory } from '../figures';
import type { DiodeData } from '../part';

const curve = dataSheet(
  'data sheets of several makers for the 200 mA class: typical 0.22, 0.29, 0.35, 0.41, 0.52 V and limit 0.24, 0.32, 0.40, 0.50, 0.80 V at 0.1, 1, 10, 30, 100 mA; fitted within 10 mV typical and 13 mV at the limit',
  '25 degC',
);

export const schottkySignal: DiodeData = {
  key: 'schottky-signal',
  title: 'Small-signal Schottky diode, 30 V, 200 mA',
  source: 'Data sheets of the 200 mA, 30 V Schottky class, several makers',
  kind: 'schottky',
  // 23 mV above typical follows the limits at small current, the resistance follows the one at 100 mA.
  saturation: band(9.0e-9, 2.2e-8, 4.4e-8, 'A', curve),
  ideality: exact(1.03, '1', curve),
  resistance: band(0.8, 1.15, 3.7, 'ohm', curve),
  junction: band(8e-12, 10e-12, 12e-12, 'F', dataSheet('10 pF limit at 1 V reverse; more at zero bias')),
  reverse: exact(30, 'V', dataSheet('rating')),
  average: exact(0.2, 'A', dataSheet('rating')),
  peak: exact(0.3, 'A', dataSheet('repetitive peak; a single surge may reach 600 mA')),
  leakage: band(
    0.1e-6,
    0.5e-6,
    2e-6,
    'A',
    memory('typical and limit at 25 V as printed; the least is a guess', '25 V, 25 degC'),
  ),
};
