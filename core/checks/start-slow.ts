/**
 * A rail that takes longer to come up from empty capacitors than its need allows.
 */
import { inMode } from '../analysis/words';
import { formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';

export const startSlow: Check = {
  code: 'start-slow',
  title: 'Rail comes up too slowly',
  severity: 'error',
  why: 'A chip that is released before its rail has come up starts in an undefined state, and a large reservoir on a weak pump takes its time.',
  run: (analysis) =>
    [...analysis.rails.values()].flatMap(({ rail, transients }): Finding[] => {
      const allowed = rail.needs?.start;
      if (!allowed || !transients) return [];
      const course = transients();
      const place = {
        code: 'start-slow',
        at: `${rail.path}.needs.start`,
        span: allowed.span ?? rail.nameSpan,
        expected: `within ${formatQuantity(allowed.max, 's')}`,
        source: 'switch-on from empty capacitors at typical values',
      } as const;
      if (!course || course.startTime === null)
        return [
          {
            ...place,
            severity: 'warning',
            message: `${rail.name}: its switch-on could not be followed to 90 % of its voltage. Check that it carries its load while it comes up.`,
          },
        ];
      if (course.startTime <= allowed.max) return [];
      const took = formatQuantity(course.startTime, 's');
      const factor = course.startTime / allowed.max;
      return [
        {
          ...place,
          severity: 'error',
          actual: took,
          message: `${rail.name} takes ${took}${inMode(course.mode)} to reach 90 % of its voltage, ${Number(factor.toPrecision(2))} times the ${formatQuantity(allowed.max, 's')} allowed. A reservoir as much smaller, or a larger flying capacitor while the slow limit dominates, would do.`,
        },
      ];
    }),
};
