/**
 * A push-pull stage whose bases hang on one resistor: both emitter junctions stand in series across the supply.
 */
import { formatQuantity } from '../quantity/write';
import type { Span } from '../text/span';
import type { Check } from './check';
import { stagesOf } from './driver-stages';
import type { Fix } from './finding';

export const driverSharedBase: Check = {
  code: 'driver-shared-base',
  title: 'Push-pull stage with joined bases',
  severity: 'error',
  why: 'With the bases joined nothing but the transistors themselves limits the current from the supply through both emitter junctions, at any level of the clock.',
  run: (analysis) =>
    stagesOf(analysis).flatMap(({ driver, use, stage }) => {
      const shared = driver.stage?.kind === 'push-pull' ? driver.stage.sharedBase : undefined;
      if (!shared || stage.crossCurrent <= 1e-4) return [];
      const flows = formatQuantity(stage.railCurrent, 'A');
      return [
        {
          code: 'driver-shared-base',
          severity: 'error',
          at: `${driver.path}.push-pull.shared-base`,
          span: shared.span ?? driver.nameSpan,
          message: `${driver.name} takes ${flows} from its rail, ${formatQuantity(stage.crossCurrent, 'A')} of it straight through both transistors (pump of ${use.railName}), because the joined bases put both emitter junctions in series across the supply. Give each base a resistor of its own: base: { npn: R, pnp: R }.`,
          expected: 'one resistor for each base',
          actual: 'one for both',
          source: 'solution of the circuit at typical values',
          fixes: separate(analysis.text, shared.span),
        },
      ];
    }),
};

/** One resistor of the same value for each base. */
function separate(text: string, value: Span | undefined): readonly Fix[] {
  const key = value ? text.lastIndexOf('shared-base', value.start) : -1;
  if (!value || key < 0) return [];
  const ohms = text.slice(value.start, value.end);
  const edit = { span: { start: key, end: value.end }, text: `base: { npn: ${ohms}, pnp: ${ohms} }` };
  return [{ title: `Give each base ${ohms} of its own`, edits: [edit], preferred: true }];
}
