import { describe, expect, it } from 'vitest';
import { analyse } from '../../../core/index';
import { pushPullBoard } from '../../support/push-pull-board';

const own = (polarity: string, storage: string) =>
  `{ polarity: ${polarity}, saturation: 10 fA, gain: 200, collector-resistance: 2 ohm${storage} }`;
const report = (storage: string) =>
  analyse(
    pushPullBoard('base: { npn: 10 kohm, pnp: 10 kohm }', 'a')
      .replace('npn-small-signal', own('npn', storage))
      .replace('pnp-small-signal', own('pnp', storage)),
    { file: 'rails.yaml' },
  ).report;

describe('stored charge of a push-pull stage', () => {
  const without = report('');
  const stored = report(', storage: 150 ns');
  const added = stored.rails['v5']!.current! - without.rails['v5']!.current!;

  it('takes current from the rail that supplies the stage', () => {
    // Charge control by hand (Gray and Meyer, from memory: confirm). The base resistance is 10 kohm with 10 ohm of the
    // transistor and 20 ohm of the pin; the junction keeps 0.7 V (from memory). tau = 150 ns / ln(2 / 1.05).
    const tau = 150e-9 / Math.log(2 / 1.05);
    const on = (5 - 0.7) / 10030;
    const off = 0.7 / 10030;
    const cross = 200 * on;
    // The load's 1 mA flows for half the period: 2 mA while on.
    const time = tau * Math.log((on + off) / ((2e-3 + cross / 2) / 200 + off));
    // Two edges a period at 50 kHz.
    expect(added).toBeGreaterThan(0.9 * (2 * 50e3 * cross * time));
    expect(added).toBeLessThan(1.1 * (2 * 50e3 * cross * time));
  });

  it('heats the stage with all of it, and moves neither the rail nor its drops', () => {
    const heat = stored.drivers['amp']!.dissipation! - without.drivers['amp']!.dissipation!;
    expect(heat).toBeCloseTo(5 * added, 9);
    expect(stored.rails['up']?.voltage).toEqual(without.rails['up']?.voltage);
    const drops = ({ rails }: typeof stored) =>
      rails['up']!.drops!.map(({ in: where, volts }) => `${where} ${volts.toFixed(9)}`);
    expect(drops(stored)).toEqual(drops(without));
  });

  it('reaches the supply, with its band', () => {
    const spread = report(', storage: 100..150..300 ns');
    expect(stored.supplies['lab']!.current!.typical).toBeCloseTo(spread.supplies['lab']!.current!.typical, 9);
    // Time and charge go in proportion with the time constant: twice the storage, twice the overlap.
    const most = spread.supplies['lab']!.current!.max - stored.supplies['lab']!.current!.max;
    expect(most).toBeGreaterThan(0.9 * added);
    expect(most).toBeLessThan(1.1 * added);
  });
});
