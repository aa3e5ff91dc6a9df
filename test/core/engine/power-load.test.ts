/**
 * Constant power far from what the pump can carry, standing on ground, where nothing holds the output up but the pump.
 * Outside source: the independent integration of `reference.test.ts`; it starts where a resistor that takes the same
 * power would leave the pump, and ends at the upper operating point.
 */
import { expect, it } from 'vitest';
import type { PumpValues } from '../../../core/pump/values';
import { solveValues } from '../../support/check-pump';
import { capacitor, fromGround, pinDrive, pump } from '../../support/circuits';
import { expectNear } from '../../support/near';
import { pumpEquations } from '../../support/pump-equations';
import { periodicState } from '../../support/pump-reference';

function onGround(topology: PumpValues['topology'], stages: number, negative: boolean): PumpValues {
  const column = Array.from({ length: stages }, () => capacitor(1e-6, 0.05));
  const pin = pinDrive(30);
  return fromGround(
    pump({
      topology,
      stages,
      negative,
      drives: topology === 'chain' && stages > 1 ? [pin, pinDrive(30, 30, true)] : [pin],
      flying: column,
      smoothing: topology === 'ladder' ? column : [],
      reservoir: capacitor(10e-6, 0.05),
      diodes: Array.from({ length: topology === 'ladder' ? 2 * stages : stages + 1 }, () => ({
        saturation: 2.5e-9,
        slope: 0.045,
        ohms: 0.6,
      })),
    }),
  );
}

it.each([
  ['chain', 1, true, 10e-3, 3.2],
  ['chain', 4, false, 6e-3, 16.9],
  ['chain', 4, true, 8e-3, 16.7],
  ['ladder', 2, true, 4e-3, 7.3],
  ['ladder', 4, false, 4e-3, 14.9],
] as const)('%s of %d stages, negative %s, carries %d W', (topology, stages, negative, watts, about) => {
  const values = onGround(topology, stages, negative);
  const like = solveValues({
    ...values,
    loads: [{ name: 'r', kind: 'resistance', ohms: about ** 2 / watts }],
  });
  const power: PumpValues = {
    ...values,
    loads: [{ name: 'p', kind: 'power', watts, knee: 1 }],
  };
  const reference = periodicState(pumpEquations(power), like.states);
  expect(reference.correction).toBeLessThan(1e-6);
  expect(Math.abs(reference.average)).toBeGreaterThan(0.8 * Math.abs(like.average));
  expectNear(solveValues(power).average, reference.average, 5e-4);
});
