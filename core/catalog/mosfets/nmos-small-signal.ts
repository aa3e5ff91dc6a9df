/** Small-signal n-channel MOSFET, 60 V. */
import { band, exact, memory } from '../figures';
import type { MosfetData } from '../part';
import { source } from './mosfet-class';

export const nmosSmallSignal: MosfetData = {
  key: 'nmos-small-signal',
  title: 'Small-signal n-channel MOSFET, 60 V',
  source,
  channel: 'n',
  threshold: band(1, 1.7, 2.5, 'V', memory('250 uA drain current')),
  onResistance: band(1, 2, 5, 'ohm', memory('at 5 V of gate voltage', 'VGS = 5 V, 25 degC')),
  gateCharge: band(0.4e-9, 0.7e-9, 1e-9, 'C', memory('at 5 V of gate voltage')),
  gateVoltage: exact(5, 'V', memory('where resistance and charge hold')),
  current: exact(0.2, 'A', memory('the lower of the usual ratings')),
};
