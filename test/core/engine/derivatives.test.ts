import { describe, expect, it } from 'vitest';
import { type Network, type Parameter, solve } from '../../../core/engine';
import type { PumpValues } from '../../../core/pump/values';
import { capacitor, fromGround, networkOf, pinDrive, pump, siliconDiode } from '../../support/circuits';

// The outside reference is the definition of a derivative: a central difference of two independent solutions.
const circuits: Record<string, PumpValues> = {
  'doubler, slow': pump(),
  'doubler, fast, with series resistances': pump({
    frequency: 50e3,
    duty: 0.3,
    drives: [pinDrive(57, 42)],
    rails: [{ name: 'v3', volts: 3.3, ohms: 0.4 }],
    flying: [capacitor(2.2e-6, 0.02)],
    diodes: [0, 1].map(() => ({ ...siliconDiode, ohms: 0.6 })),
    reservoir: capacitor(10e-6, 0.5),
    loads: [
      { name: 'i', kind: 'current', amps: 2e-3 },
      { name: 'r', kind: 'resistance', ohms: 10e3 },
    ],
  }),
  'doubler with a load of constant power': pump({
    drives: [pinDrive(40)],
    loads: [{ name: 'p', kind: 'power', watts: 5e-3, knee: 1 }],
  }),
  inverter: fromGround(pump({ negative: true, loads: [{ name: 'r', kind: 'resistance', ohms: 4700 }] })),
};

/** The network with one quantity moved: relative for parts, in volt for potentials. */
function moved(network: Network, parameter: Parameter, step: number): Network {
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

function every(network: Network): Parameter[] {
  const all = <T>(list: readonly T[], of: (index: number) => Parameter[]) => list.flatMap((_, k) => of(k));
  return [
    ...all(network.resistors, (index) => [
      { kind: 'ohms', index, segment: 0 },
      { kind: 'ohms', index, segment: 1 },
      { kind: 'ohms', index },
      { kind: 'drop', index },
    ]),
    ...all(network.knowns, (index) => [{ kind: 'volts', index }]),
    ...all(network.capacitors, (index) => [
      { kind: 'farads', index },
      ...(network.capacitors[index]!.ohms > 0 ? [{ kind: 'esr', index } as const] : []),
    ]),
    ...all(network.diodes, (index) => [
      { kind: 'saturation', index },
      { kind: 'slope', index },
      ...(network.diodes[index]!.ohms > 0 ? [{ kind: 'diode-ohms', index } as const] : []),
    ]),
    ...all(network.loads, (index) => [{ kind: 'load', index }]),
  ];
}

describe('derivatives of the output', () => {
  for (const [name, values] of Object.entries(circuits)) {
    it(`agree with central differences: ${name}`, () => {
      const { network, output, ground } = networkOf(values);
      const port = { a: output, b: ground };
      const parameters = every(network);
      // Meshes of the two solutions differ; a tight tolerance keeps that below the difference itself.
      const options = { port, tolerance: 1e-6, lineError: 1e-10 };
      const solved = solve(network, { ...options, parameters });
      if (!solved.converged) throw new Error(solved.reason);
      const average = (step: number, parameter: Parameter) => {
        const result = solve(moved(network, parameter, step), options);
        if (!result.converged) throw new Error(result.reason);
        const node = result.nodes[output]!;
        return { average: node.average, ripple: node.max - node.min };
      };
      parameters.forEach((parameter, k) => {
        const step = parameter.kind === 'volts' || parameter.kind === 'drop' ? 1e-2 : 2e-2;
        const up = average(step, parameter);
        const down = average(-step, parameter);
        const label = `${name}: ${JSON.stringify(parameter)}`;
        for (const what of ['average', 'ripple'] as const) {
          const expected = (up[what] - down[what]) / (2 * step);
          const found = solved.derivatives[what][k]!;
          expect(Math.abs(found - expected), `${label} ${what} ${found} ${expected}`).toBeLessThan(
            2e-2 * Math.abs(expected) + 2e-4,
          );
        }
      });
    });
  }
});
