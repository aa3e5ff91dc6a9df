/**
 * A rail that is weaker than its loads need: at typical values an error, at a corner only a warning that names it.
 */
import { type SwingMiss, swingMissOf, swingWords } from '../analysis/swing-need';
import { type Miss, missOf } from '../analysis/window';
import { cornerWords, inMode, volts } from '../analysis/words';
import { nextPreferredUp } from '../quantity/preferred';
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
      const signal = swingMissOf(result);
      return [...(miss ? [toFinding(miss)] : []), ...(signal ? [ofSignal(signal)] : [])];
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

/** A signal clips at the weakest moment of the ripple, whatever the average is. */
function ofSignal(miss: SwingMiss): Finding {
  const { result, need, voltage, by, corner } = miss;
  const { name, path, nameSpan } = result.rail;
  const edge = formatQuantity(need.limit, 'V');
  const reached = formatQuantity(voltage, 'V');
  const when = corner ? `at the corner${cornerAfter(miss)}` : `at typical values${inMode(miss.mode)}`;
  return {
    code: 'rail-low',
    severity: corner ? 'warning' : 'error',
    at: `${path}.needs.swing`,
    span: need.swing.span ?? nameSpan,
    message: `${name} holds only ${reached} at the weakest moment of its ripple ${when}, ${volts(by)} short of the ${edge} that ${swingWords(need)} take. ${signalCure(miss)}`,
    expected: `at least ${edge} at every moment`,
    actual: reached,
    source: need.headroomGiven
      ? 'needs.swing and needs.headroom of this rail'
      : `needs.swing of this rail; headroom ${need.headroom.origin.kind}`,
    related: [railHere(result.rail, `${name} is made here`), ...largestLoad(result)],
  };
}

/** A part of the dip is the step in the ESR, which no capacitance takes away. */
const mostOfDip = 0.9;

/** Where the ripple takes more than what is missing, a larger reservoir gives it back. */
function signalCure({ result, by, dip }: SwingMiss): string {
  const { origin } = result.rail;
  const present = origin?.kind === 'pump' ? origin.pump.reservoir?.value?.typical : undefined;
  if (present === undefined || !(by < mostOfDip * dip)) return pumpCure(result, by);
  const proposed = nextPreferredUp((present * dip) / (dip - by), 'E6');
  return `Ripple takes ${volts(dip)} of it: about ${formatQuantity(proposed, 'F')} of reservoir instead of ${formatQuantity(present, 'F')} would do.`;
}

function cornerAfter({ corner }: Pick<Miss, 'corner'>): string {
  const words = corner && cornerWords(corner);
  return words ? `: ${words}` : ' of its tolerance';
}
