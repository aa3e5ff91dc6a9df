import { describe, it } from 'vitest';
import type { Network, Parameter } from '../../../core/engine';
import type { PumpValues } from '../../../core/pump/values';
import { checkDerivatives } from '../../support/check-derivatives';
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
      checkDerivatives(
        values,
        every(networkOf(values).network),
        ({ kind }) => (kind === 'volts' || kind === 'drop' ? 1e-2 : 2e-2),
        { share: 2e-2, volts: 2e-4 },
        { tolerance: 1e-6, lineError: 1e-10 },
      );
    });
  }
});
