/**
 * A pump that cannot carry its load: the loads ask for more current than it can deliver at any voltage.
 */
import type { PumpPoint, RailResult } from '../analysis/types';
import { inMode } from '../analysis/words';
import { formatPercent, formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';
import { largestLoad } from './related';

export const railStalls: Check = {
  code: 'rail-stalls',
  title: 'Pump cannot carry its load',
  severity: 'error',
  why: 'Beyond its short-circuit current a pump does not sag, it collapses; every voltage computed for such a rail is meaningless to the parts on it.',
  run: (analysis) =>
    [...analysis.rails.values()].flatMap((result) => {
      const stalled = result.pump?.points.filter(isStalled) ?? [];
      const worst = stalled.reduce<PumpPoint | undefined>(
        (a, b) => (a === undefined || missing(b) > missing(a) ? b : a),
        undefined,
      );
      return worst ? [toFinding(result, worst)] : [];
    }),
};

/** One percent: a load's own knee near zero volt takes less than that from a healthy rail. */
function isStalled(point: PumpPoint): boolean {
  return missing(point) > 0.01 * point.askedCurrent;
}

function missing(point: PumpPoint): number {
  return point.askedCurrent - point.loadCurrent;
}

function toFinding(result: RailResult, point: PumpPoint): Finding {
  const { name, path, nameSpan } = result.rail;
  const asked = formatQuantity(point.askedCurrent, 'A');
  const carried = formatQuantity(point.loadCurrent, 'A');
  const share = formatPercent(point.loadCurrent / point.askedCurrent, 2);
  const bound = shortCircuit(result, point);
  const most =
    bound === undefined ? '' : ` Even into a short circuit it gives about ${formatQuantity(bound, 'A', 2)}.`;
  return {
    code: 'rail-stalls',
    severity: 'error',
    at: path,
    span: nameSpan,
    message: `${name} collapses to ${formatQuantity(point.voltage, 'V', 2)}${inMode(point.mode)}: its loads ask for ${asked} and it carries ${carried} (${share}).${most} Lighten the load, raise flying capacitance or frequency, or drive it harder.`,
    expected: `${asked} into the loads`,
    actual: carried,
    source: 'solution of the circuit at typical values',
    related: largestLoad(result),
  };
}

/** Ideal voltage less the diodes, over the output resistance: the most that the pump can push at all, A. */
function shortCircuit(result: RailResult, point: PumpPoint): number | undefined {
  const estimate = result.pump?.estimate;
  if (!estimate || !(estimate.resistance > 0)) return undefined;
  const bound = Math.max(0, Math.abs(point.ideal) - 2 * estimate.diodeDrop) / estimate.resistance;
  return bound < point.askedCurrent ? bound : undefined;
}
