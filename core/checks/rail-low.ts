/**
 * A rail that is weaker than its loads need: at typical values an error, at a corner only a warning that names it.
 */
import { type Miss, missOf } from '../analysis/window';
import { cornerWords, inMode, volts } from '../analysis/words';
import { formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';
import { pumpCure } from './pump-cure';
import { largestLoad, railHere } from './related';

export const railLow: Check = {
  code: 'rail-low',
  title: 'Rail below what it needs',
  severity: 'error',
  why: 'Amplifiers clip, gates are not fully driven and references drop out when their rail sags under load, first in the cold and with weak parts.',
  run: (analysis) =>
    [...analysis.rails.values()].flatMap((result) => {
      const miss = missOf(result, 'weak');
      return miss ? [toFinding(miss)] : [];
    }),
};

function toFinding(miss: Miss): Finding {
  const { result, needed, limit, voltage, by, corner } = miss;
  const { name, path, nameSpan } = result.rail;
  const need = formatQuantity(limit, 'V');
  const reached = formatQuantity(voltage, 'V');
  const cure = pumpCure(result, by);
  const message = corner
    ? `${name} falls to ${reached} at the corner${cornerAfter(miss)}, ${volts(by)} short of the ${need} it needs. ${cure}`
    : `${name} reaches only ${reached}${inMode(miss.mode)}, ${volts(by)} short of the ${need} it needs. ${cure}`;
  return {
    code: 'rail-low',
    severity: corner ? 'warning' : 'error',
    at: `${path}.needs.voltage`,
    span: needed.span ?? nameSpan,
    message,
    expected: `at least ${need}`,
    actual: reached,
    source: 'needs.voltage of this rail',
    related: [railHere(result.rail, `${name} is made here`), ...largestLoad(result)],
  };
}

function cornerAfter({ corner }: Miss): string {
  const words = corner && cornerWords(corner);
  return words ? `: ${words}` : ' of its tolerance';
}
