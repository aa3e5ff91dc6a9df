/** USB 3 after configuration, six unit loads. */
import { band, exact, standard } from '../figures';
import type { SupplyData } from '../part';
import { bulk, cable } from './usb-port';

export const usb3: SupplyData = {
  key: 'usb-3',
  title: 'USB 3 after configuration, six unit loads',
  source: 'USB 3 specification, unit load of 150 mA',
  voltage: band(4.45, 5, 5.25, 'V', standard('USB 3: lower edge at the port of a low-powered hub')),
  current: exact(0.9, 'A', standard('USB 3: six unit loads of 150 mA')),
  resistance: cable,
  bulk,
};
