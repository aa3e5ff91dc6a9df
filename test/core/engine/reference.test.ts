/**
 * Outside source of the comparisons here: the same equations written out once more, Kirchhoff's current law solved
 * with the exponentials as they are, integrated by the ODE package `odex` (E. Hairer, G. Wanner, Solving Ordinary
 * Differential Equations I) and closed over the period by Newton's method. First the reference itself is checked.
 */
import { describe, it } from 'vitest';
import { thermalVoltage } from '../../../core/compute/thermal-voltage';
import { checkAgainstReference, type Differences } from '../../support/check-pump';
import { pump } from '../../support/circuits';
import { drawnCircuits } from '../../support/drawn-circuits';
import { driverCircuits } from '../../support/driver-circuits';
import { solveInPlace } from '../../support/gauss';
import { diodeCurrent, transistorCurrents } from '../../support/junctions';
import { expectNear } from '../../support/near';
import { integrate } from '../../support/ode-reference';
import { pinCircuits } from '../../support/pin-circuits';
import { pumpEquations } from '../../support/pump-equations';
import { periodicState } from '../../support/pump-reference';

/** Base-emitter and collector-emitter voltage of a transistor that carries these currents. */
function saturated(collectorA: number, baseA: number): { be: number; ce: number } {
  const slope = thermalVoltage(298.15)!;
  const volts = [0.75, 0.7];
  for (let i = 0; i < 60; i++) {
    const now = transistorCurrents(1e-14, slope, 200, 5, volts[0]!, volts[1]!);
    const slopes = Float64Array.of(now.collectorByBe, now.collectorByBc, now.baseByBe, now.baseByBc);
    const step = Float64Array.of(collectorA - now.collector, baseA - now.base);
    solveInPlace(slopes, step, 2);
    volts.forEach((v, k) => {
      volts[k] = v + Math.max(-slope, Math.min(slope, step[k]!));
    });
  }
  return { be: volts[0]!, ce: volts[0]! - volts[1]! };
}

describe('the reference', () => {
  // Saturation voltage of the transport model in closed form (Sedra and Smith, Microelectronic Circuits; from memory:
  // confirm), 1e-14 A, gains 200 and 5, 25 degC: 31.20 mV at 10 and 1 mA, 69.46 mV at 50 and 1 mA.
  it.each([
    [10e-3, 1e-3, 0.7212, 31.2e-3],
    [50e-3, 1e-3, 0.7534, 69.46e-3],
  ])('saturates a transistor with %d A and %d A as the closed form says', (collector, base, be, ce) => {
    const found = saturated(collector, base);
    expectNear(found.be, be, 1e-4);
    expectNear(found.ce, ce, 2e-4);
    const forced = collector / base;
    const closed = thermalVoltage(298.15)! * Math.log((1 + (forced + 1) / 5) / (1 - forced / 200));
    expectNear(found.ce, closed, 1e-9);
  });
  // T. C. Banwell, A. Jayakumar, Electronics Letters 36, 2000 (Lambert form): 2.5 nA, n 1.75, 1000.6 ohm, 5 V: 4.351 mA.
  it('has a diode with resistance carry the current of the Lambert form', () => {
    expectNear(diodeCurrent(2.5e-9, 1.75 * thermalVoltage(298.15)!, 1000.6, 5).amps, 4.351e-3, 1e-4);
  });
  // The other reference of this project: two capacitors, one scalar equation, nothing in common but the ODE package.
  it('agrees with the integration of a doubler by hand-made equations', () => {
    const parts = { frequencyHz: 20e3, highOhm: 40, lowOhm: 45, flyingF: 1e-6, reservoirF: 4.7e-6 };
    const other = integrate({
      topology: 'doubler',
      inputV: 5,
      highV: 5,
      lowV: 0,
      highShare: 0.4,
      ...parts,
      flyingOhm: 0.1,
      reservoirOhm: 0.2,
      saturationA: 2.5e-9,
      slopeV: 0.045,
      diodeOhm: 0.6,
      loadA: 2e-3,
    });
    const diode = { saturation: 2.5e-9, slope: 0.045, ohms: 0.6 };
    const values = pump({
      frequency: parts.frequencyHz,
      duty: 0.4,
      drives: [
        {
          clock: { rail: 0, highDrop: 0, highOhms: parts.highOhm, lowVolts: 0, lowOhms: parts.lowOhm },
          opposite: false,
        },
      ],
      flying: [{ farads: parts.flyingF, ohms: 0.1 }],
      reservoir: { farads: parts.reservoirF, ohms: 0.2 },
      diodes: [diode, diode],
      loads: [{ name: 'i', kind: 'current', amps: 2e-3 }],
    });
    const found = periodicState(pumpEquations(values), [4, 8]);
    expectNear(found.average, other.average, 1e-8);
    expectNear(found.ripple, other.ripple, 1e-3);
    expectNear(found.pinRms[0]!, other.pinRmsA, 1e-6);
  });
});

const asked: Differences = { average: 5e-4, ripple: 1e-2, pin: 5e-3, rail: 1e-3, collector: 2e-3 };

/** Current that passes two transistors within an edge is followed by its own error estimate, a little less closely. */
const slowEdges: Partial<Differences> = { collector: 1e-2 };

describe('the engine agrees with the reference, pumps on pins:', () => {
  it.each(Object.entries(pinCircuits))('%s', (_, values) => checkAgainstReference(values, asked));
});

describe('the engine agrees with the reference, pumps on timers and stages of two transistors:', () => {
  it.each(Object.entries(driverCircuits))('%s', (_, values) => checkAgainstReference(values, asked));
});

describe("what is left is the engine's step error, which its tolerance governs:", () => {
  const tight: Differences = { average: 5e-6, ripple: 1e-3, pin: 5e-5, rail: 2e-5, collector: 1e-4 };
  it.each(Object.entries({ ...pinCircuits, ...driverCircuits }))('%s', (_, values) => {
    const edges = values.rise + values.fall > 0 ? { collector: 1e-3 } : {};
    checkAgainstReference(values, { ...tight, ...edges }, { tolerance: 1e-6 });
  });
});

describe('and so do pumps drawn by lot', () => {
  it.each(drawnCircuits(30, 4711).map((values, k) => [k, values] as const))('number %d', (_, values) => {
    const edges = values.rise + values.fall > 0 && values.drives[0]!.driver?.kind === 'push-pull';
    checkAgainstReference(values, { ...asked, ...(edges ? slowEdges : {}) });
  });
});
