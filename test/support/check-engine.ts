/** One solve of a simple pump, read in the words of the pump, and its comparison with an outside reference. */
import { expect } from 'vitest';
import { type SolveOptions, solve } from '../../core/engine';
import { expectNear } from './near';
import { integrate } from './ode-reference';
import { type SimplePump, toNetwork } from './simple-pump';

export interface PumpSolution {
  readonly average: number;
  readonly ripple: number;
  readonly inputA: number;
  readonly pinSourceA: number;
  readonly pinSinkA: number;
  readonly pinRmsA: number;
  readonly balance: number;
}

/** Fails when the engine does not converge. */
export function solvePump(pump: SimplePump, options: Partial<SolveOptions> = {}): PumpSolution {
  const solved = solve(toNetwork(pump), options);
  if (!solved.converged) throw new Error(`the engine did not converge: ${solved.reason}`);
  const out = solved.nodes.find((node) => node.name === 'out')!;
  const pin = solved.resistors.find((resistor) => resistor.name === 'pin')!;
  return {
    average: out.average,
    ripple: out.max - out.min,
    inputA: solved.diodes.find((diode) => diode.name === 'first')!.average,
    pinSourceA: pin.averagePositive,
    pinSinkA: pin.averageNegative,
    pinRmsA: pin.rms,
    balance: solved.balance,
  };
}

/** Largest relative difference allowed for each figure. */
export interface Agreement {
  readonly average: number;
  readonly current: number;
  readonly rms: number;
  readonly ripple: number;
}

/** The engine against the ODE package; its own energy balance besides. */
export function checkAgainstIntegration(
  pump: SimplePump,
  within: Agreement,
  options: Partial<SolveOptions> = {},
): void {
  const reference = integrate(pump);
  expect(reference.drift, 'the reference is periodic').toBeLessThan(1e-8);
  const solution = solvePump(pump, options);
  expectNear(solution.average, reference.average, within.average);
  expectNear(solution.ripple, reference.ripple, within.ripple);
  for (const key of ['inputA', 'pinSourceA', 'pinSinkA'] as const) {
    expectNear(solution[key], reference[key], within.current);
  }
  expectNear(solution.pinRmsA, reference.pinRmsA, within.rms);
  expect(solution.balance).toBeLessThan(1e-3);
}
