/** USB 2.0 after configuration, five unit loads. */
import { exact, standard } from '../figures';
import type { SupplyData } from '../part';
import { bulk, cable, highPower, usb2 } from './usb-port';

export const usb2Configured: SupplyData = {
  key: 'usb-2-configured',
  title: 'USB 2.0 after configuration, five unit loads',
  source: usb2,
  voltage: highPower,
  current: exact(0.5, 'A', standard(`${usb2}: five unit loads`)),
  resistance: cable,
  bulk,
};
