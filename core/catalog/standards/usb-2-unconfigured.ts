/** USB 2.0 before configuration, one unit load. */
import { band, exact, standard } from '../figures';
import type { SupplyData } from '../part';
import { bulk, cable, usb2 } from './usb-port';

export const usb2Unconfigured: SupplyData = {
  key: 'usb-2-unconfigured',
  title: 'USB 2.0 before configuration, one unit load',
  source: usb2,
  voltage: band(4.4, 5, 5.25, 'V', standard(`${usb2}: a bus-powered hub may give as little as 4.40 V`)),
  current: exact(0.1, 'A', standard(`${usb2}: one unit load`)),
  resistance: cable,
  bulk,
};
