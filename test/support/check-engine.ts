/** One solve of a simple pump, read in the words of the pump, and its comparison with an outside reference. */
import { expect } from 'vitest';
import { solve } from '../../core/engine';
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
export function solvePump(pump: SimplePump): PumpSolution {
  const solved = solve(toNetwork(pump));
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

/** The engine against the ODE package: output within 0.05 %, currents and rms within 0.5 %, ripple within 1 %. */
export function checkAgainstIntegration(pump: SimplePump): void {
  const reference = integrate(pump);
  expect(reference.drift, 'the reference is periodic').toBeLessThan(1e-8);
  const solution = solvePump(pump);
  expectNear(solution.average, reference.average, 5e-4);
  expectNear(solution.ripple, reference.ripple, 1e-2);
  for (const key of ['inputA', 'pinSourceA', 'pinSinkA', 'pinRmsA'] as const) {
    expectNear(solution[key], reference[key], 5e-3);
  }
  expect(solution.balance).toBeLessThan(1e-3);
}
