import { describe, expect, it } from 'vitest';
import { solve } from '../../../core/engine';
import { idealVoltage } from '../../../core/pump/values';
import { networkOf } from '../../support/circuits';
import { randomDriven, randomNumbers, randomPump } from '../../support/random-circuits';

// References: Kirchhoff's laws and conservation of energy; no pump of diodes exceeds its ideal voltage.
describe('random pumps', () => {
  it('end in a steady state that obeys the laws, or in a reason', () => {
    const random = randomNumbers(20_261_201);
    let unsolved = 0;
    for (let n = 0; n < 300; n++) {
      const values = randomPump(random);
      const { network, output, ground } = networkOf(values);
      const solved = solve(network, {
        port: { a: output, b: ground },
        parameters: [{ kind: 'draw', a: output, b: ground }],
      });
      const label = `circuit ${n}: ${JSON.stringify(values)}`;
      if (!solved.converged) {
        expect(solved.reason.length, label).toBeGreaterThan(10);
        unsolved++;
        continue;
      }
      const out = solved.nodes[output]!;
      const ideal = idealVoltage(values);
      const reach = values.rails[0]!.volts * (values.stages + 1);
      expect(solved.balance, label).toBeLessThan(1e-3);
      expect(Number.isFinite(out.average) && Number.isFinite(solved.derivatives.average[0]!), label).toBe(
        true,
      );
      // Beyond the ideal by no more than the solver's own tolerance.
      const sign = values.negative ? -1 : 1;
      expect(sign * out.average, label).toBeLessThan(sign * ideal + 1e-3 * reach);
      // A capacitor's average current is nothing, and so is what flows into all known potentials together:
      // within the solver's own tolerance, the leak of 1 pS at every node, and the last bits of a voltage.
      const farads = network.capacitors.reduce((sum, c) => sum + c.farads, 0);
      const leak = 1e-12 * reach * network.nodeNames.length;
      const bits = 1e-13 * reach * farads * values.frequency + 2 * leak + 1e-10;
      for (const c of solved.capacitors)
        expect(Math.abs(c.average), `${label} ${c.name}`).toBeLessThan(1e-5 * c.rms + bits);
      const flows = solved.knowns.map((k) => k.average);
      const largest = Math.max(
        ...flows.map(Math.abs),
        ...values.loads.map((l) => (l.kind === 'current' ? l.amps : 0)),
      );
      expect(Math.abs(flows.reduce((a, b) => a + b, 0)), label).toBeLessThan(1e-5 * largest + bits);
      // Current drawn out of the output never lifts its potential, whatever the rail's sign.
      expect(solved.derivatives.average[0]!, label).toBeLessThan(1e-3);
    }
    // An unsolved circuit would be reported as such, but none of these has a reason to be.
    expect(unsolved).toBe(0);
  });
});

describe('random pumps behind stages of two transistors', () => {
  it('end in a steady state with its energy in balance, or in a reason', () => {
    const random = randomNumbers(20_261_202);
    let unsolved = 0;
    for (let n = 0; n < 100; n++) {
      const values = randomDriven(random);
      const { network, output } = networkOf(values);
      const solved = solve(network);
      if (!solved.converged) {
        expect(solved.reason.length).toBeGreaterThan(10);
        unsolved++;
        continue;
      }
      expect(solved.balance, JSON.stringify(values)).toBeLessThan(1e-3);
      expect(Number.isFinite(solved.nodes[output]!.average), JSON.stringify(values)).toBe(true);
    }
    expect(unsolved).toBeLessThanOrEqual(1);
  });
});
