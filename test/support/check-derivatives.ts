/** Derivatives that the engine gives, against their definition: central differences of independent solutions. */
import { expect } from 'vitest';
import { type Network, type Parameter, type SolveOptions, solve } from '../../core/engine';
import type { PumpValues } from '../../core/pump/values';
import { networkOf } from './circuits';

/** How far a derivative may be off: a share of it, and an amount in V. */
export interface Slack {
  readonly share: number;
  readonly volts: number;
}

/** Every parameter's derivative of average and ripple; each moves by its own `step` to both sides. */
export function checkDerivatives(
  values: PumpValues,
  parameters: readonly Parameter[],
  step: (parameter: Parameter) => number,
  within: Slack,
  precision: Partial<SolveOptions>,
): void {
  const { network, output, ground } = networkOf(values);
  // Meshes of the two solutions differ; a tight tolerance keeps that below the difference itself.
  const options = { port: { a: output, b: ground }, ...precision };
  const solved = solve(network, { ...options, parameters });
  if (!solved.converged) throw new Error(solved.reason);
  const figures = (parameter: Parameter, amount: number) => {
    const result = solve(movedNetwork(network, parameter, amount), options);
    if (!result.converged) throw new Error(result.reason);
    const node = result.nodes[output]!;
    return { average: node.average, ripple: node.max - node.min };
  };
  parameters.forEach((parameter, k) => {
    const amount = step(parameter);
    const up = figures(parameter, amount);
    const down = figures(parameter, -amount);
    for (const what of ['average', 'ripple'] as const) {
      const expected = (up[what] - down[what]) / (2 * amount);
      const found = solved.derivatives[what][k]!;
      expect(
        Math.abs(found - expected),
        `${JSON.stringify(parameter)} ${what} ${found} ${expected}`,
      ).toBeLessThan(within.share * Math.abs(expected) + within.volts);
    }
  });
}

/** The network with one quantity moved: relative for parts, in volt for potentials. */
export function movedNetwork(network: Network, parameter: Parameter, step: number): Network {
  const scaled = <T, K extends keyof T>(list: readonly T[], index: number, key: K): T[] =>
    list.map((e, k) => (k === index ? { ...e, [key]: (e[key] as number) * Math.exp(step) } : e));
  switch (parameter.kind) {
    case 'draw':
      return {
        ...network,
        loads: [...network.loads, { name: 'draw', a: parameter.a, b: parameter.b, amps: step, knee: 1e-9 }],
      };
    case 'ohms':
      return {
        ...network,
        resistors: network.resistors.map((r, k) =>
          k === parameter.index
            ? { ...r, ohms: r.ohms.map((o, s) => (s === (parameter.segment ?? s) ? o * Math.exp(step) : o)) }
            : r,
        ),
      };
    case 'volts':
      return {
        ...network,
        knowns: network.knowns.map((known, k) =>
          k === parameter.index
            ? { ...known, volts: known.volts.map((v) => (typeof v === 'number' ? v + step : v)) }
            : known,
        ),
      };
    case 'farads':
      return { ...network, capacitors: scaled(network.capacitors, parameter.index, 'farads') };
    case 'esr':
      return { ...network, capacitors: scaled(network.capacitors, parameter.index, 'ohms') };
    case 'load':
      return {
        ...network,
        loads: network.loads.map((l, k) => {
          if (k !== parameter.index) return l;
          const factor = Math.exp(step);
          return 'amps' in l ? { ...l, amps: l.amps * factor } : { ...l, watts: l.watts * factor };
        }),
      };
    case 'alpha':
      return {
        ...network,
        diodes: network.diodes.map((d, k) =>
          k === parameter.index && d.transfer
            ? { ...d, transfer: { ...d.transfer, alpha: d.transfer.alpha + step } }
            : d,
        ),
      };
    case 'drop':
      return {
        ...network,
        resistors: network.resistors.map((r, k) =>
          k === parameter.index
            ? { ...r, drop: network.segments.map((_, n) => ((r.drop?.[n] ?? 0) as number) + step) }
            : r,
        ),
      };
    case 'saturation':
      return { ...network, diodes: scaled(network.diodes, parameter.index, 'saturation') };
    case 'slope':
      return { ...network, diodes: scaled(network.diodes, parameter.index, 'slope') };
    case 'diode-ohms':
      return { ...network, diodes: scaled(network.diodes, parameter.index, 'ohms') };
  }
}
