/** PNP transistor, 500 to 800 mA. */
import type { TransistorData } from '../part';
import { npn500mA } from './npn-500ma';

export const pnp500mA: TransistorData = {
  ...npn500mA,
  key: 'pnp-500ma',
  title: 'PNP transistor, 500 to 800 mA',
  polarity: 'pnp',
};
