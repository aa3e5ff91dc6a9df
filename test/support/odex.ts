/** The general-purpose ODE package that independent references integrate with, and its types. */
import { createRequire } from 'node:module';

export interface OdeSolver {
  absoluteTolerance: number;
  relativeTolerance: number;
  maxSteps: number;
  initialStepSize: number;
  solve(
    f: (x: number, y: number[]) => number[],
    x0: number,
    y0: readonly number[],
    x1: number,
  ): { y: number[]; outcome: number };
}

// Its own sources are TypeScript that our strict settings would reject, hence the plain require with these types.
const odex = createRequire(import.meta.url)('odex') as { Solver: new (dimension: number) => OdeSolver };

/** Extrapolation code of E. Hairer and G. Wanner, one tolerance for all components. */
export function odeSolver(dimension: number, tolerance: number, firstStep: number): OdeSolver {
  const solver = new odex.Solver(dimension);
  solver.absoluteTolerance = tolerance;
  solver.relativeTolerance = tolerance;
  solver.maxSteps = 100_000;
  solver.initialStepSize = firstStep;
  return solver;
}
