/**
 * Derivatives of what stands at the output port, from the sensitivities that close the period.
 */
import type { Circuit } from './circuit';
import { isOnCurve } from './measure';
import type { Terminal } from './network';
import type { Parameter } from './parameter';
import { closePeriod, linearPass } from './periodic';
import { derivatives } from './stage';
import type { Trajectory } from './trajectory';

export interface Port {
  readonly a: Terminal;
  readonly b: Terminal;
}

/** Per unit of each parameter, in the order of `parameters`; NaN where they could not be had. */
export interface PortDerivatives {
  /** Of the average voltage at `port`, V. */
  readonly average: readonly number[];
  /** Of the peak-to-peak voltage at `port`, V. */
  readonly ripple: readonly number[];
}

export function differentiate(
  circuit: Circuit,
  path: Trajectory,
  start: Float64Array,
  parameters: readonly Parameter[],
  port: Port | undefined,
): PortDerivatives {
  const none = { average: parameters.map(() => Number.NaN), ripple: parameters.map(() => Number.NaN) };
  if (parameters.length === 0 || !port) return none;
  const d = derivatives(circuit, path.count, parameters);
  if (!linearPass(circuit, path, start, d)) return none;
  const change = closePeriod(circuit, path, start, d);
  if (!change) return none;
  const { nodes } = circuit;
  const count = circuit.capacitors.count;
  const place = (terminal: Terminal) => (terminal < 0 ? -1 : circuit.place[terminal]!);
  const a = place(port.a);
  const b = place(port.b);
  const at = (column: number, s: number) => {
    const offset = (s * d.columns + column) * nodes;
    return (a < 0 ? 0 : d.volts[offset + a]!) - (b < 0 ? 0 : d.volts[offset + b]!);
  };
  const { highest, lowest } = extremes(circuit, path, port);
  const rows = Array.from({ length: d.columns }, (_, column) => {
    let sum = 0;
    for (let s = 0; s < path.count; s++) sum += path.weight[s]! * at(column, s);
    return { average: sum / circuit.period, ripple: at(column, highest) - at(column, lowest) };
  });
  const width = 1 + parameters.length;
  const total = (p: number, key: 'average' | 'ripple') => {
    let sum = rows[count + p]![key];
    for (let k = 0; k < count; k++) sum += rows[k]![key] * change[k * width + 1 + p]!;
    return sum;
  };
  return {
    average: parameters.map((_, p) => total(p, 'average')),
    ripple: parameters.map((_, p) => total(p, 'ripple')),
  };
}

/** Stages at which the voltage at the port is highest and lowest. */
function extremes(circuit: Circuit, path: Trajectory, port: Port) {
  const width = circuit.nodes + circuit.knowns;
  const index = (t: Terminal) => (t >= 0 ? circuit.place[t]! : circuit.nodes + ~t);
  const a = index(port.a);
  const b = index(port.b);
  const volts = (s: number) => path.volts[s * width + a]! - path.volts[s * width + b]!;
  let highest = 0;
  let lowest = 0;
  for (let s = 0; s < path.count; s++) {
    if (!isOnCurve(path, s)) continue;
    if (volts(s) > volts(highest)) highest = s;
    if (volts(s) < volts(lowest)) lowest = s;
  }
  return { highest, lowest };
}
