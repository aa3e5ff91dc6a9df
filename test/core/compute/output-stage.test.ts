import { describe, expect, it } from 'vitest';
import { outputStageResistance } from '../../../core/compute/output-stage-resistance';
import { expectNear } from '../../support/near';

const exactly = (value: number) => ({ min: value, typical: value, max: value });
const point = (amps: number, volts: number, supply: number) => ({
  current: exactly(amps),
  voltage: exactly(volts),
  supply: exactly(supply),
});

describe('resistance of an output from test points', () => {
  // ATmega328P data sheet, DC characteristics: 0.9 V and 4.2 V at 20 mA and 5 V, 0.6 V and 2.3 V at 10 mA and 3 V.
  const low = [point(20e-3, 0.9, 5), point(10e-3, 0.6, 3)];
  const high = [point(20e-3, 4.2, 5), point(10e-3, 2.3, 3)];
  it('divides the drop to the right rail by the current', () => {
    expectNear(outputStageResistance(low, 'low', 5)?.max, 45, 1e-12);
    expectNear(outputStageResistance(high, 'high', 5)?.max, 40, 1e-12);
    expectNear(outputStageResistance(low, 'low', 3)?.max, 60, 1e-12);
    expectNear(outputStageResistance(high, 'high', 3)?.max, 70, 1e-12);
  });
  it('interpolates between supplies and holds the nearest beyond them', () => {
    expectNear(outputStageResistance(low, 'low', 4)?.max, 52.5, 1e-12);
    expectNear(outputStageResistance(low, 'low', 1.8)?.max, 60, 1e-12);
    expectNear(outputStageResistance(low, 'low', 5.5)?.max, 45, 1e-12);
  });
  it('takes the worse of two points at one supply', () => {
    expectNear(
      outputStageResistance([point(8e-3, 0.4, 3.3), point(20e-3, 1.3, 3.3)], 'low', 3.3)?.max,
      65,
      1e-12,
    );
  });
  it('has no answer without a point or with a current of zero', () => {
    expect(outputStageResistance([], 'low', 5)).toBeUndefined();
    expect(outputStageResistance([point(0, 0.4, 5)], 'low', 5)).toBeUndefined();
  });
});
