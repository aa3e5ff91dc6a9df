/**
 * `npm run bench`: prints every table; `RANDOM_CIRCUITS` sets how many random circuits are tried.
 */
import { benchEngine, benchGrowth, benchRandom } from './engine';

const count = Number(process.env['RANDOM_CIRCUITS'] ?? 5000);

console.log(`${benchEngine()}\n\n${benchGrowth()}\n\n${benchRandom(count)}`);
