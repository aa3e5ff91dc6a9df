/** The sizing of one rail run to its end, and what a choice makes of the board. */
import {
  type Analysis,
  analyse,
  applyEdits,
  type SizeChoice,
  type SizeResult,
  sizeRun,
} from '../../core/index';

export function sizeOf(text: string, rail: string): { analysis: Analysis; result: SizeResult } {
  const analysis = analyse(text, { file: 'rails.yaml' });
  const run = sizeRun(analysis, rail);
  for (;;) {
    const step = run.next();
    if (step.done) return { analysis, result: step.value };
  }
}

export function changedBy(text: string, choice: SizeChoice): { text: string; analysis: Analysis } {
  const changed = applyEdits(text, choice.edits);
  return { text: changed, analysis: analyse(changed, { file: 'rails.yaml' }) };
}
