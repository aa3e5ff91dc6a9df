/** Polarised capacitors: wet aluminium, solid tantalum and conductive polymer. */
import { band, dataSheet, exact, memory, practice } from '../figures';
import type { CapacitorKind } from '../part';

const twentyPercent = practice('20 % parts are the stocked ones');

export const aluminium: CapacitorKind = {
  key: 'aluminium',
  title: 'Aluminium electrolytic, wet',
  source: 'General-purpose class values, to be confirmed',
  tolerance: band(-0.2, 0, 0.2, '1', twentyPercent),
  temperature: band(-0.2, 0, 0.1, '1', memory('value at -25 degC and at 85 degC against 25 degC')),
  // The limit falls with the rated voltage: about 0.28 at 6.3 V, 0.16 at 25 V, 0.08 at 100 V.
  loss: band(
    0.08,
    0.16,
    0.28,
    '1',
    memory('loss factor limits by rated voltage, 6.3 to 100 V', '120 Hz, 20 degC'),
  ),
  leakageRate: band(
    0.0002,
    0.001,
    0.01,
    '1',
    dataSheet('limit of 0.01 uA per uF and V in public part lists; usual parts stay a tenth of it or less'),
  ),
  heat: exact(0.05, 'W', practice('ripple ratings of small radial parts times their ESR: 30 to 130 mW')),
  polarised: true,
};

export const polymer: CapacitorKind = {
  key: 'polymer',
  title: 'Aluminium with conductive polymer',
  source: 'Class values, to be confirmed',
  tolerance: band(-0.2, 0, 0.2, '1', twentyPercent),
  temperature: band(-0.1, 0, 0.1, '1', memory('over -55 to 105 degC')),
  esr: band(5e-3, 20e-3, 60e-3, 'ohm', memory('100 kHz')),
  leakageRate: band(0.002, 0.02, 0.2, '1', memory('limit of 0.2 uA per uF and V of many series')),
  heat: exact(0.1, 'W', practice('ripple ratings of small parts times their ESR')),
  polarised: true,
};

export const tantalum: CapacitorKind = {
  key: 'tantalum',
  title: 'Solid tantalum with manganese dioxide',
  source: 'Class values, to be confirmed',
  tolerance: band(-0.2, 0, 0.2, '1', twentyPercent),
  temperature: band(-0.1, 0, 0.1, '1', memory('over -55 to 85 degC')),
  esr: band(0.1, 1, 4, 'ohm', memory('1 to 100 uF in the usual cases', '100 kHz')),
  leakageRate: band(0.0002, 0.001, 0.01, '1', memory('limit of 0.01 uA per uF and V, 25 degC')),
  heat: exact(0.075, 'W', memory('heat that the smallest moulded case bears')),
  polarised: true,
};
