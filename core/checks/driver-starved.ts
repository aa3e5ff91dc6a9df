/**
 * A stage whose base current cannot bring its output to the rail before the phase ends.
 */
import { formatQuantity } from '../quantity/write';
import type { Check } from './check';
import { stagesOf } from './driver-stages';

/** A saturated transistor stays below this (common practice, no source), V. */
const saturated = 0.5;

export const driverStarved: Check = {
  code: 'driver-starved',
  title: 'Driver without enough base current',
  severity: 'error',
  why: 'Base current times gain is all that a transistor can carry: when the pump asks for more, the output stops short of its rail and every stage of the pump loses that.',
  run: (analysis) =>
    stagesOf(analysis).flatMap(({ driver, use, stage }) => {
      if (driver.stage?.kind !== 'push-pull' || driver.stage.sharedBase) return [];
      if (stage.shortOf <= saturated) return [];
      return [
        {
          code: 'driver-starved',
          severity: 'error',
          at: driver.path,
          span: driver.nameSpan,
          message: `${driver.name} ends a phase ${formatQuantity(stage.shortOf, 'V')} short of its rail or ground while it pumps ${use.railName}: ${formatQuantity(stage.baseCurrent, 'A')} of base current at a gain of ${Number(stage.forcedGain.toPrecision(2))} is all it carries. Smaller base resistors, transistors of higher gain or a lower load would let it saturate.`,
          expected: `output within ${saturated} V of its rail and ground`,
          actual: formatQuantity(stage.shortOf, 'V'),
          source: 'solution of the circuit at typical values',
        },
      ];
    }),
};
