/**
 * `npm run bench`: prints every table; `RANDOM_CIRCUITS` sets how many random circuits are tried.
 */
import type { SimplePump } from '../support/simple-pump';
import { benchBoardGrowth } from './board-growth';
import { benchEngine, benchGrowth, benchRandom } from './engine';
import { benchDerivatives, benchRivals, benchScaling } from './rivals';
import { benchSizing } from './sizing';

const count = Number(process.env['RANDOM_CIRCUITS'] ?? 5000);

/** Schottky doubler on a 3.3 V pin: class values, from memory. */
const doubler: SimplePump = {
  topology: 'doubler',
  inputV: 3.3,
  highV: 3.3,
  lowV: 0,
  frequencyHz: 100e3,
  highShare: 0.5,
  highOhm: 28,
  lowOhm: 21,
  flyingF: 1e-6,
  flyingOhm: 10e-3,
  reservoirF: 10e-6,
  reservoirOhm: 10e-3,
  saturationA: 2.2e-8,
  slopeV: 1.03 * 0.0257,
  diodeOhm: 1.15,
  loadA: 1.2e-3,
};

console.log(
  [
    benchEngine(),
    benchGrowth(),
    benchRivals({
      'doubler, fast limit': doubler,
      'doubler, slow limit': { ...doubler, frequencyHz: 1e3, loadA: 0.5e-3 },
      inverter: { ...doubler, topology: 'inverter', inputV: 0 },
    }),
    benchDerivatives(),
    benchScaling(),
    benchBoardGrowth(),
    benchSizing(),
    benchRandom(count),
  ].join('\n\n'),
);
