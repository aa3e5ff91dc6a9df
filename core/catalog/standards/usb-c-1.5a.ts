/** USB Type-C advertising 1.5 A. */
import { exact, standard } from '../figures';
import type { SupplyData } from '../part';
import { bulk, cableC, typeC } from './usb-port';

export const usbC1500mA: SupplyData = {
  key: 'usb-c-1.5a',
  title: 'USB Type-C advertising 1.5 A',
  source: 'USB Type-C specification, 22 kohm or 180 uA advertisement',
  voltage: typeC,
  current: exact(1.5, 'A', standard('USB Type-C current advertisement')),
  resistance: cableC,
  bulk,
};
