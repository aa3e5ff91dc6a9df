/** A pump solved by the engine and by the independent reference, and their comparison. */
import { expect } from 'vitest';
import { type SolveOptions, solve } from '../../core/engine';
import type { PumpNetwork } from '../../core/pump/network';
import type { PumpValues } from '../../core/pump/values';
import { networkOf } from './circuits';
import { pumpEquations } from './pump-equations';
import { type PumpFigures, type PumpReference, periodicState } from './pump-reference';

export interface SolvedPump extends PumpFigures {
  readonly balance: number;
  /** Capacitor voltages at the start of the period: flying, smoothing, reservoir; V. */
  readonly states: readonly number[];
}

/** Fails when the engine does not converge. */
export function solveValues(values: PumpValues, options: Partial<SolveOptions> = {}): SolvedPump {
  const placed = networkOf(values);
  const solved = solve(placed.network, options);
  if (!solved.converged) throw new Error(`the engine did not converge: ${solved.reason}`);
  const out = solved.nodes[placed.output]!;
  const { reservoir } = placed;
  return {
    average: out.average,
    ripple: out.max - out.min,
    pinRms: placed.drives.map(({ high, low }) =>
      Math.hypot(solved.resistors[high]!.rms, solved.resistors[low]!.rms),
    ),
    collectorRms: collectors(placed).map((index) => solved.resistors[index]!.rms),
    railAmps: placed.rails.map(({ known }) => solved.knowns[known]!.average),
    balance: solved.balance,
    states: [...placed.flying, ...placed.smoothing, ...(reservoir === undefined ? [] : [reservoir])].map(
      (index) => solved.start[index]!,
    ),
  };
}

function collectors({ drives }: PumpNetwork): number[] {
  return drives.flatMap(({ driver }) => (driver ? [driver.npn.collector, driver.pnp.collector] : []));
}

/**
 * Relative differences; of currents, the largest against the largest of their kind. A ripple below a ten-thousandth of
 * the voltage counts as that much.
 */
export interface Differences {
  readonly average: number;
  readonly ripple: number;
  readonly pin: number;
  readonly collector: number;
  readonly rail: number;
}

export function compare(solved: PumpFigures, reference: PumpReference): Differences {
  const worst = (key: 'pinRms' | 'collectorRms' | 'railAmps') => {
    const largest = Math.max(0, ...reference[key].map(Math.abs));
    return Math.max(0, ...reference[key].map((amps, k) => Math.abs(solved[key][k]! - amps) / largest));
  };
  const least = 1e-4 * Math.abs(reference.average);
  return {
    average: Math.abs(solved.average / reference.average - 1),
    ripple: Math.abs(solved.ripple - reference.ripple) / Math.max(reference.ripple, least),
    pin: worst('pinRms'),
    collector: worst('collectorRms'),
    rail: worst('railAmps'),
  };
}

/** The engine against the reference; its own energy balance besides. */
export function checkAgainstReference(
  values: PumpValues,
  within: Differences,
  options: Partial<SolveOptions> = {},
): void {
  const solved = solveValues(values, options);
  const reference = periodicState(pumpEquations(values), solved.states);
  expect(reference.correction, 'the reference is periodic').toBeLessThan(1e-7);
  const differences = compare(solved, reference);
  for (const key of Object.keys(within) as (keyof Differences)[])
    expect(differences[key], key).toBeLessThanOrEqual(within[key]);
  expect(solved.balance).toBeLessThan(1e-3);
}
