/**
 * More ripple than the rail may have: at typical values an error, at a corner only a warning that names it.
 */
import type { CornerEnd, PumpPoint, PumpResult, RailResult } from '../analysis/types';
import { isTooMuchRipple } from '../analysis/window';
import { cornerWords, inMode } from '../analysis/words';
import type { Capacitor } from '../model/board';
import type { Figure } from '../quantity/figure';
import { nextPreferredUp } from '../quantity/preferred';
import { formatPercent, formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';
import { largestLoad, railHere } from './related';

export const rippleHigh: Check = {
  code: 'ripple-high',
  title: 'More ripple than the rail may have',
  severity: 'error',
  why: 'Ripple at the clock frequency gets into everything that the rail feeds, and a supply filter inside an amplifier helps little at that frequency.',
  run: (analysis) =>
    [...analysis.rails.values()].flatMap((result) => {
      const allowed = result.rail.needs?.ripple;
      return allowed && result.pump ? judge(result, result.pump, allowed) : [];
    }),
};

function judge(result: RailResult, pump: PumpResult, allowed: Figure): readonly Finding[] {
  const worst = pump.points.reduce((a, b) => (b.ripple > a.ripple ? b : a));
  if (isTooMuchRipple(allowed, worst.ripple)) return [toFinding(result, allowed, worst.ripple, worst)];
  const corner = pump.ripple.highest;
  return isTooMuchRipple(allowed, corner.value)
    ? [toFinding(result, allowed, corner.value, worst, corner)]
    : [];
}

function toFinding(
  result: RailResult,
  allowed: Figure,
  ripple: number,
  point: PumpPoint,
  corner?: CornerEnd,
): Finding {
  const { name, path, nameSpan } = result.rail;
  const words = corner && cornerWords(corner);
  const when = corner ? ` at the corner${words ? `: ${words}` : ''}` : inMode(point.mode);
  return {
    code: 'ripple-high',
    severity: corner ? 'warning' : 'error',
    at: `${path}.needs.ripple`,
    span: allowed.span ?? nameSpan,
    message: `${name} has ${formatQuantity(ripple, 'V')} of ripple${when}, ${excess(ripple / allowed.max)} the ${formatQuantity(allowed.max, 'V')} it may have. ${cure(result, ripple, point, allowed.max)}`,
    expected: `at most ${formatQuantity(allowed.max, 'V')} peak to peak`,
    actual: formatQuantity(ripple, 'V'),
    source: 'needs.ripple of this rail',
    related: [railHere(result.rail, `${name} is made here`), ...largestLoad(result)],
  };
}

function excess(ratio: number): string {
  return ratio < 2 ? `${formatPercent(ratio - 1, 2)} more than` : `${Number(ratio.toPrecision(2))} times`;
}

/** The step that the load current makes in the ESR stays whatever the capacitance: say so when it is most of the ripple. */
function cure(result: RailResult, ripple: number, point: PumpPoint, limit: number): string {
  const pump = result.rail.origin?.kind === 'pump' ? result.rail.origin.pump : undefined;
  const reservoir: Capacitor | undefined = pump?.reservoir;
  const present = reservoir?.value?.typical;
  if (present === undefined) return 'A reservoir across the output, or a higher frequency, lowers it.';
  const esr = reservoir?.esr?.typical ?? 0;
  // The delivery lasts half a period or less: the step is at least twice the load current (form of pump data sheets).
  const step = 2 * point.loadCurrent * esr;
  if (step > 0.5 * limit) {
    return `The reservoir's ESR of ${formatQuantity(esr, 'ohm')} alone steps by about ${formatQuantity(step, 'V', 2)}: take a capacitor with less ESR, more capacitance does not help.`;
  }
  // Capacitive ripple goes with 1/C; the step stays.
  const proposed = nextPreferredUp((present * (ripple - step)) / (limit - step), 'E6');
  return `About ${formatQuantity(proposed, 'F')} of reservoir instead of ${formatQuantity(present, 'F')}, or a higher frequency, would do.`;
}
