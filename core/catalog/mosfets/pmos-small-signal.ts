/** Small-signal p-channel MOSFET, 50 V. */
import { band, exact, memory } from '../figures';
import type { MosfetData } from '../part';
import { source } from './mosfet-class';

export const pmosSmallSignal: MosfetData = {
  key: 'pmos-small-signal',
  title: 'Small-signal p-channel MOSFET, 50 V',
  source,
  channel: 'p',
  threshold: band(0.8, 1.5, 2, 'V', memory('250 uA drain current')),
  onResistance: band(3, 6, 10, 'ohm', memory('at 5 V of gate voltage', 'VGS = -5 V, 25 degC')),
  gateCharge: band(0.5e-9, 0.9e-9, 1.3e-9, 'C', memory('at 5 V of gate voltage')),
  gateVoltage: exact(5, 'V', memory('where resistance and charge hold')),
  current: exact(0.13, 'A', memory('rating')),
};
