/**
 * A rail that is stronger than its loads bear: at typical values an error, at a corner only a warning that names it.
 */
import { type Miss, missOf } from '../analysis/window';
import { cornerWords, inMode, volts } from '../analysis/words';
import { formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';
import { railHere } from './related';

export const railHigh: Check = {
  code: 'rail-high',
  title: 'Rail above what it may have',
  severity: 'error',
  why: 'A pump without regulation climbs towards its ideal voltage as soon as the load goes away; parts on it must survive that.',
  run: (analysis) =>
    [...analysis.rails.values()].flatMap((result) => {
      const miss = missOf(result, 'strong');
      return miss ? [toFinding(miss)] : [];
    }),
};

function toFinding({ result, needed, limit, voltage, by, mode, corner }: Miss): Finding {
  const { name, path, nameSpan } = result.rail;
  const most = formatQuantity(limit, 'V');
  const reached = formatQuantity(voltage, 'V');
  const words = corner && cornerWords(corner);
  const when = corner ? ` at the corner${words ? `: ${words}` : ' of its tolerance'}` : inMode(mode);
  return {
    code: 'rail-high',
    severity: corner ? 'warning' : 'error',
    at: `${path}.needs.voltage`,
    span: needed.span ?? nameSpan,
    message: `${name} rises to ${reached}${when}, ${volts(by)} beyond the ${most} it may have. ${cureOf(result.rail.origin?.kind)}`,
    expected: `at most ${most}`,
    actual: reached,
    source: 'needs.voltage of this rail',
    related: [railHere(result.rail, `${name} is made here`)],
  };
}

function cureOf(origin: string | undefined): string {
  switch (origin) {
    case 'pump':
      return 'A steady load (bleeder), a lower input or a regulator behind the pump holds it down.';
    case 'regulator':
      return 'Choose another output of the regulator, or widen the need.';
    default:
      return 'Choose another supply, or a regulator between it and the load.';
  }
}
