/** USB Type-C advertising default power. */
import { exact, standard } from '../figures';
import type { SupplyData } from '../part';
import { bulk, cable, typeC } from './usb-port';

export const usbCDefault: SupplyData = {
  key: 'usb-c-default',
  title: 'USB Type-C advertising default power',
  source: 'USB Type-C specification, 56 kohm or 80 uA advertisement',
  voltage: typeC,
  current: exact(0.5, 'A', standard('default USB power of a USB 2.0 port; a USB 3 port gives 900 mA')),
  resistance: cable,
  bulk,
};
