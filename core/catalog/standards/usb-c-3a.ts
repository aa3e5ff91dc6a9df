/** USB Type-C advertising 3 A. */
import { exact, standard } from '../figures';
import type { SupplyData } from '../part';
import { bulk, cableC, typeC } from './usb-port';

export const usbC3A: SupplyData = {
  key: 'usb-c-3a',
  title: 'USB Type-C advertising 3 A',
  source: 'USB Type-C specification, 10 kohm or 330 uA advertisement',
  voltage: typeC,
  current: exact(3, 'A', standard('USB Type-C current advertisement')),
  resistance: cableC,
  bulk,
};
