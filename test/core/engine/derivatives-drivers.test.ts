import { describe, it } from 'vitest';
import type { Parameter } from '../../../core/engine';
import type { PumpValues } from '../../../core/pump/values';
import { checkDerivatives } from '../../support/check-derivatives';
import { networkOf } from '../../support/circuits';
import { driverCircuits } from '../../support/driver-circuits';

// The outside reference is the definition of a derivative: a central difference of two independent solutions.
const names = [
  'push-pull, doubler',
  'push-pull behind a timer whose high level leaves the upper transistor on',
  'push-pull with a shared base resistor',
  'push-pull that starves',
  'push-pull, inverter',
  'follower, doubler',
  'push-pull, doubler on a soft rail',
] as const;
const circuits: Readonly<Record<string, PumpValues>> = {
  ...driverCircuits,
  'push-pull, doubler on a soft rail': {
    ...driverCircuits['push-pull, doubler']!,
    rails: [{ name: 'soft', volts: 5, ohms: 20 }],
  },
};

/** Everything of the drive: gains, junctions, base and other resistors, levels of the clock, the rail. */
function ofDrive(values: PumpValues): Parameter[] {
  const { drives, rails } = networkOf(values);
  const { high, low, driver } = drives[0]!;
  const { npn, pnp, shared } = driver!;
  return [
    ...[npn, pnp].flatMap(({ base, collector, emitterJunction, collectorJunction }): Parameter[] => [
      { kind: 'alpha', index: emitterJunction },
      { kind: 'alpha', index: collectorJunction },
      { kind: 'saturation', index: emitterJunction },
      { kind: 'saturation', index: collectorJunction },
      { kind: 'slope', index: emitterJunction },
      { kind: 'slope', index: collectorJunction },
      { kind: 'diode-ohms', index: emitterJunction },
      { kind: 'ohms', index: base },
      { kind: 'ohms', index: collector },
    ]),
    ...[high, low, ...(shared === undefined ? [] : [shared])].map(
      (index): Parameter => ({
        kind: 'ohms',
        index,
      }),
    ),
    { kind: 'drop', index: high },
    { kind: 'drop', index: low },
    ...rails.flatMap(({ known, resistor }): Parameter[] => [
      { kind: 'volts', index: known },
      ...(resistor === undefined ? [] : [{ kind: 'ohms', index: resistor } as const]),
    ]),
  ];
}

/** Steps over which the figures stay straight enough: a gain of 200 has 0.005 left to one, a slope acts in an exponent. */
function step({ kind }: Parameter): number {
  if (kind === 'alpha') return 2e-5;
  if (kind === 'slope') return 2e-4;
  return kind === 'volts' || kind === 'drop' ? 1e-3 : 1e-2;
}

describe('derivatives of the output by the parts of a drive', () => {
  it.each(names)('agree with central differences: %s', (name) => {
    const values = circuits[name]!;
    checkDerivatives(
      values,
      ofDrive(values),
      step,
      { share: 5e-3, volts: 3e-5 },
      {
        tolerance: 1e-6,
        lineError: 1e-10,
      },
    );
  });
});
