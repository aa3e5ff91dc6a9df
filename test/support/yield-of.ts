/**
 * A Monte Carlo run of a board as text, to its end.
 */
import { expect } from 'vitest';
import { analyse, type YieldOptions, type YieldResult, yieldRun } from '../../core/index';

export function yieldOf(text: string, options: Partial<YieldOptions> = {}): YieldResult {
  const run = yieldRun(analyse(text, { file: 'rails.yaml' }), { samples: 200, seed: 1, ...options });
  let step = run.next();
  while (!step.done) step = run.next();
  return step.value;
}

export const railOf = (result: YieldResult, name: string) => result.rails.find(({ rail }) => rail === name)!;

/** Fails unless the share lies within four standard errors, `sqrt(p (1 - p) / N)`, of what it must be. */
export function expectShare(hits: number, samples: number, p: number): void {
  expect(Math.abs(hits / samples - p), `${hits} of ${samples} against ${p}`).toBeLessThan(
    4 * Math.sqrt((p * (1 - p)) / samples),
  );
}
