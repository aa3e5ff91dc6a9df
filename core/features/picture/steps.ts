/**
 * The rows of the picture: the ideal voltage of a pump, each loss, and the output, so that the losses lead from the
 * one to the other.
 */
import type { PumpResult } from '../../analysis/types';

export interface Step {
  readonly name: string;
  readonly kind: 'ideal' | 'loss' | 'output';
  /** Magnitudes, V: the bar reaches from `from` to `to`. */
  readonly from: number;
  readonly to: number;
  readonly value: string;
}

/** Losses below half a percent of the ideal voltage are gathered, so that every row can be seen. */
export function stepsOf(pump: PumpResult): readonly Step[] {
  const { ideal, voltage, drops } = pump.heaviest;
  const size = Math.abs(ideal);
  const large = drops.filter((drop) => Math.abs(drop.volts) >= 0.005 * size);
  const rest = size - Math.abs(voltage) - large.reduce((sum, drop) => sum + drop.volts, 0);
  const losses = Math.abs(rest) >= 0.001 * size ? [...large, { in: 'the rest', volts: rest }] : large;
  let level = size;
  const lossSteps = losses.map((drop): Step => {
    const next = level - drop.volts;
    const step: Step = {
      name: drop.in,
      kind: 'loss',
      from: Math.min(level, next),
      to: Math.max(level, next),
      value: signedVolts(ideal < 0 ? drop.volts : -drop.volts, size, true),
    };
    level = next;
    return step;
  });
  return [
    { name: 'ideal', kind: 'ideal', from: 0, to: size, value: signedVolts(ideal, size) },
    ...lossSteps,
    { name: 'output', kind: 'output', from: 0, to: Math.abs(voltage), value: signedVolts(voltage, size) },
  ];
}

/** With as many decimals in every row, so that a column adds up by eye. */
function signedVolts(value: number, scale: number, always = false): string {
  const decimals = scale < 1 ? 3 : scale < 100 ? 2 : 1;
  const sign = value < 0 ? '\u2212' : always ? '+' : '';
  return `${sign}${Math.abs(value).toFixed(decimals)} V`;
}
