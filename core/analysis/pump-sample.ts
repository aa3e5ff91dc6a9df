/**
 * One point of a pump without all that only a report needs: no derivatives, no parts, just what stands at the output.
 */
import { solve } from '../engine';
import { pumpNetwork } from '../pump/network';
import type { PumpModel } from './pump-model';

/** V at the output in one mode; ripple peak to peak, null for a rail that no pump makes. */
export interface Reached {
  readonly volts: number;
  readonly ripple: number | null;
  /** Lowest and highest moment; absent where they are those of `volts`. */
  readonly moments?: { readonly low: number; readonly high: number };
}

/** Undefined when no steady state was found. */
export function samplePump(model: PumpModel, at: readonly number[]): Reached | undefined {
  const network = pumpNetwork(model.values(at));
  if (!network) return undefined;
  const solved = solve(network.network);
  if (!solved.converged) return undefined;
  const { average, min, max } = solved.nodes[network.output]!;
  if (!Number.isFinite(average)) return undefined;
  return { volts: average, ripple: max - min, moments: { low: min, high: max } };
}
