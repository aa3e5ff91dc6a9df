/** Logic-level p-channel MOSFET, 20 V, several ampere. */
import { band, exact, memory } from '../figures';
import type { MosfetData } from '../part';
import { source } from './mosfet-class';

export const pmosLogicLevel: MosfetData = {
  key: 'pmos-logic-level',
  title: 'Logic-level p-channel MOSFET, 20 V, several ampere',
  source,
  channel: 'p',
  threshold: band(0.45, 0.75, 1.1, 'V', memory('250 uA drain current')),
  onResistance: band(0.05, 0.08, 0.13, 'ohm', memory('at 4.5 V of gate voltage', 'VGS = -4.5 V, 25 degC')),
  gateCharge: band(4e-9, 7e-9, 11e-9, 'C', memory('at 4.5 V of gate voltage')),
  gateVoltage: exact(4.5, 'V', memory('where resistance and charge hold')),
  current: exact(2, 'A', memory('class value')),
};
