/**
 * Solved pumps kept from one analysis to the next, found again by everything that they depend on: after an edit only
 * the pumps that it reaches are solved anew. An analysis with a memory gives the same numbers as one without.
 */

import type { NoPoint } from './pump-point';
import type { ModeModel } from './pump-result';
import type { PumpResult } from './types';

export interface SolvedPump {
  /** One for each mode; fewer when a part of the pump has no usable value. */
  readonly models: readonly ModeModel[];
  readonly result: PumpResult | NoPoint;
}

/** Analyses for which a pump that nobody asks for is kept: an edit that is undone finds it again. */
const keptFor = 8;

export class Memory {
  #analysis = 0;
  /** Pumps that had to be solved since the last `begin`. */
  solved = 0;
  readonly #pumps = new Map<string, { pump: SolvedPump; used: number }>();

  /** To be called at the start of each analysis. */
  begin(): void {
    this.#analysis++;
    this.solved = 0;
    for (const [key, { used }] of this.#pumps) if (used < this.#analysis - keptFor) this.#pumps.delete(key);
  }

  get size(): number {
    return this.#pumps.size;
  }

  pump(inputs: unknown, solve: () => SolvedPump): SolvedPump {
    const key = keyOf(inputs);
    const known = this.#pumps.get(key);
    if (known) {
      known.used = this.#analysis;
      return known.pump;
    }
    const pump = solve();
    this.solved++;
    this.#pumps.set(key, { pump, used: this.#analysis });
    return pump;
  }
}

/** Where a figure stands and where it comes from changes no number, and a pump does not depend on what is asked of it. */
const noNumbers: ReadonlySet<string> = new Set([
  'span',
  'nameSpan',
  'topologySpan',
  'keys',
  'origin',
  'source',
  'title',
  'needs',
]);

function keyOf(inputs: unknown): string {
  return JSON.stringify(inputs, (key, value: unknown) => {
    if (noNumbers.has(key)) return undefined;
    if (value instanceof Map) return [...value];
    return value;
  });
}
