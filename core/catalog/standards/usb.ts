/**
 * What a USB port promises: voltage at its connector, current, resistance of the cable behind it, and the bulk
 * capacitance that may be connected at once.
 */
import { band, derived, exact, memory, standard } from '../figures';
import type { SupplyData } from '../part';

const usb2 = 'USB 2.0, section 7.2';
// 125 mV in the supply wire and 125 mV in ground at 500 mA is the most a cable may lose.
const cable = band(
  0.1,
  0.25,
  0.5,
  'ohm',
  derived('cable budget of 250 mV at 500 mA, both wires (to be confirmed)'),
);
const cableC = band(0.08, 0.15, 0.25, 'ohm', memory('cable budget of 750 mV at 3 A, both wires'));
const bulk = exact(10e-6, 'F', standard('USB 2.0, section 7.2.4.1: at most 10 uF beside one unit load'));
const highPower = band(4.75, 5, 5.25, 'V', standard(`${usb2}: port that gives five unit loads`));
const typeC = band(4.75, 5, 5.5, 'V', memory('USB Type-C source at its connector'));

export const usb2Unconfigured: SupplyData = {
  key: 'usb-2-unconfigured',
  title: 'USB 2.0 before configuration, one unit load',
  source: usb2,
  voltage: band(4.4, 5, 5.25, 'V', standard(`${usb2}: a bus-powered hub may give as little as 4.40 V`)),
  current: exact(0.1, 'A', standard(`${usb2}: one unit load`)),
  resistance: cable,
  bulk,
};

export const usb2Configured: SupplyData = {
  key: 'usb-2-configured',
  title: 'USB 2.0 after configuration, five unit loads',
  source: usb2,
  voltage: highPower,
  current: exact(0.5, 'A', standard(`${usb2}: five unit loads`)),
  resistance: cable,
  bulk,
};

export const usb3: SupplyData = {
  key: 'usb-3',
  title: 'USB 3 after configuration, six unit loads',
  source: 'USB 3 specification, unit load of 150 mA',
  voltage: band(4.45, 5, 5.25, 'V', standard('USB 3: lower edge at the port of a low-powered hub')),
  current: exact(0.9, 'A', standard('USB 3: six unit loads of 150 mA')),
  resistance: cable,
  bulk,
};

export const usbCDefault: SupplyData = {
  key: 'usb-c-default',
  title: 'USB Type-C advertising default power',
  source: 'USB Type-C specification, 56 kohm or 80 uA advertisement',
  voltage: typeC,
  current: exact(0.5, 'A', standard('default USB power of a USB 2.0 port; a USB 3 port gives 900 mA')),
  resistance: cable,
  bulk,
};

export const usbC1500mA: SupplyData = {
  key: 'usb-c-1.5a',
  title: 'USB Type-C advertising 1.5 A',
  source: 'USB Type-C specification, 22 kohm or 180 uA advertisement',
  voltage: typeC,
  current: exact(1.5, 'A', standard('USB Type-C current advertisement')),
  resistance: cableC,
  bulk,
};

export const usbC3A: SupplyData = {
  key: 'usb-c-3a',
  title: 'USB Type-C advertising 3 A',
  source: 'USB Type-C specification, 10 kohm or 330 uA advertisement',
  voltage: typeC,
  current: exact(3, 'A', standard('USB Type-C current advertisement')),
  resistance: cableC,
  bulk,
};
