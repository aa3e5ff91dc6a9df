/** Closed form against solved circuit: two independent ways to the same rail must stay close while losses are moderate. */
import { describe, expect, it } from 'vitest';
import { pumpEstimate } from '../../../core/compute/pump-estimate';
import { solvePump } from '../../support/check-engine';
import type { SimplePump } from '../../support/simple-pump';

const doubler: SimplePump = {
  topology: 'doubler',
  inputV: 3.3,
  highV: 3.3,
  lowV: 0,
  frequencyHz: 100e3,
  highShare: 0.5,
  highOhm: 28,
  lowOhm: 21,
  flyingF: 1e-6,
  flyingOhm: 10e-3,
  reservoirF: 10e-6,
  reservoirOhm: 10e-3,
  saturationA: 2.2e-8,
  slopeV: 0.02646,
  diodeOhm: 1.15,
  loadA: 1.2e-3,
};
const circuits: Record<string, SimplePump> = {
  'doubler in its fast limit': doubler,
  'doubler in its slow limit': { ...doubler, frequencyHz: 2e3, highOhm: 5, lowOhm: 5, loadA: 1e-3 },
  'doubler between the limits': { ...doubler, frequencyHz: 10e3, loadA: 3e-3 },
  'doubler at duty 0.3 with electrolytics': {
    ...doubler,
    highShare: 0.3,
    flyingF: 10e-6,
    flyingOhm: 2,
    reservoirF: 100e-6,
    reservoirOhm: 2,
    loadA: 4e-3,
  },
  inverter: { ...doubler, topology: 'inverter', inputV: 0, loadA: 0.5e-3 },
  'inverter at duty 0.7': { ...doubler, topology: 'inverter', inputV: 0, highShare: 0.7, loadA: 0.5e-3 },
};

describe('the estimate on paper', () => {
  it.each(Object.entries(circuits))('is within 3.5 %% of the ideal voltage: %s', (_, pump) => {
    const up = pump.topology === 'doubler';
    const estimate = pumpEstimate({
      topology: pump.topology,
      stages: 1,
      sign: 1,
      inputV: pump.inputV,
      swingV: pump.highV - pump.lowV,
      frequencyHz: pump.frequencyHz,
      deliverShare: up ? pump.highShare : 1 - pump.highShare,
      flyingF: [pump.flyingF],
      smoothingF: [],
      driverHighOhm: pump.highOhm,
      driverLowOhm: pump.lowOhm,
      diodeOhm: pump.diodeOhm,
      flyingEsrOhm: pump.flyingOhm,
      reservoirEsrOhm: pump.reservoirOhm,
      outputA: pump.loadA!,
      diodeSaturationA: pump.saturationA,
      diodeSlopeV: pump.slopeV,
    })!;
    const { average } = solvePump(pump);
    const ideal = Math.abs(estimate.idealV);
    expect(1 - Math.abs(average) / ideal, 'losses are moderate').toBeLessThan(1 / 3);
    expect(Math.abs(estimate.outputV - average) / ideal).toBeLessThan(0.035);
  });
});
