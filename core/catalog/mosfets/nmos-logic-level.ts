/** Logic-level n-channel MOSFET, 20 V, several ampere. */
import { band, exact, memory } from '../figures';
import type { MosfetData } from '../part';
import { source } from './mosfet-class';

export const nmosLogicLevel: MosfetData = {
  key: 'nmos-logic-level',
  title: 'Logic-level n-channel MOSFET, 20 V, several ampere',
  source,
  channel: 'n',
  threshold: band(0.45, 0.75, 1.1, 'V', memory('250 uA drain current')),
  onResistance: band(0.02, 0.03, 0.05, 'ohm', memory('at 4.5 V of gate voltage', 'VGS = 4.5 V, 25 degC')),
  gateCharge: band(3e-9, 5e-9, 8e-9, 'C', memory('at 4.5 V of gate voltage')),
  gateVoltage: exact(4.5, 'V', memory('where resistance and charge hold')),
  current: exact(3, 'A', memory('class value')),
};
