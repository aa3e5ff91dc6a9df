/**
 * The rival of the periodic solver: the same stepper, period after period from empty capacitors until the output's
 * average stays within a thousandth of the value that the periodic solver found.
 */

import type { Network } from '../../core/engine';
import { prepare } from '../../core/engine/circuit';
import { coarseMesh, fineMesh } from '../../core/engine/mesh';

export interface Settled {
  readonly periods: number;
  readonly average: number;
}

export function settle(network: Network, output: number, target: number, most: number): Settled {
  const circuit = prepare(network);
  const count = circuit.capacitors.count;
  const state = new Float64Array(count);
  const reach = Math.max(...network.knowns.flatMap((known) => known.volts.flat().map(Math.abs)));
  const swing = new Float64Array(count).fill(reach / 10);
  let seed = coarseMesh(circuit, 1);
  let average = 0;
  for (let period = 1; period <= most; period++) {
    const path = fineMesh(circuit, state, swing, seed, { tolerance: 1e-3, lineError: 1e-6, mostSteps: 4000 });
    if (!path) return { periods: period, average: Number.NaN };
    const width = circuit.nodes + circuit.knowns;
    let sum = 0;
    for (let s = 0; s < path.count; s++)
      sum += path.weight[s]! * path.volts[s * width + circuit.place[output]!]!;
    average = sum / circuit.period;
    for (let k = 0; k < count; k++) state[k] = path.state[(path.count - 1) * count + k]!;
    if (Math.abs(average - target) <= 1e-3 * Math.abs(target)) return { periods: period, average };
    seed = path;
  }
  return { periods: most, average };
}
