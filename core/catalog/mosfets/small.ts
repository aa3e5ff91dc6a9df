/** Small MOSFETs for a push-pull stage. Threshold and resistance are magnitudes; a p-channel part mirrors the signs. */
import { band, exact, memory } from '../figures';
import type { MosfetData } from '../part';

const source = 'Class values of several makers, to be confirmed';

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
