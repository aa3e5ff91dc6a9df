/**
 * Counts and gathers what one rail does sample by sample, and judges it as the rules for rails do.
 */
import { Correlation } from '../compute/correlation';
import { type Spread, spreadOf } from '../compute/spread';
import { wilsonInterval } from '../compute/wilson-interval';
import type { Band } from '../quantity/figure';
import type { Lots } from './lots';
import type { SampledRail } from './sampled-rails';
import { isNegative } from './sign';
import { isClipped, type SwingNeed, swingNeed } from './swing-need';
import { type Edge, edgeOf, isBeyond, isTooMuchRipple } from './window';
import type { Outcome, RailYield, Seen } from './yield-result';

/** Shares of the quantiles: within three standard deviations of a normal distribution, nine in ten, and half. */
const shares = [0.00135, 0.05, 0.5, 0.95, 0.99865];
const mostLeading = 3;

export type Verdict = 'met' | 'missed' | 'unsolved';

export class Tally {
  readonly #counts = { met: 0, missed: 0, unsolved: 0 };

  add(verdict: Verdict): void {
    this.#counts[verdict]++;
  }

  get outcome(): Outcome | null {
    const { met, missed, unsolved } = this.#counts;
    const all = met + missed + unsolved;
    const interval = wilsonInterval(met, all);
    return interval ? { met, missed, unsolved, yield: met / all, interval } : null;
  }
}

export class RailTally {
  readonly #tally = new Tally();
  readonly #weak: Edge | undefined;
  readonly #strong: Edge | undefined;
  readonly #signal: SwingNeed | undefined;
  readonly #ripple: Band | undefined;
  readonly #sign: 1 | -1;
  readonly #misses = { low: 0, high: 0, ripple: 0 };
  readonly #spreads: { readonly volts: number[]; readonly ripple: number[] }[];
  readonly #correlations: ReadonlyMap<number, Correlation>;
  #weakest: Seen | null = null;
  #strongest: Seen | null = null;
  #mostRipple: Seen | null = null;

  /** `judgesRipple`: false for a rail that no pump makes. */
  constructor(
    private readonly sampled: SampledRail,
    private readonly modes: readonly (string | undefined)[],
    private readonly lots: Lots,
    judgesRipple: boolean,
    typical: number,
  ) {
    const { voltage, ripple } = sampled.rail.needs ?? {};
    this.#weak = voltage && edgeOf(voltage, 'weak');
    this.#strong = voltage && edgeOf(voltage, 'strong');
    this.#ripple = judgesRipple ? ripple : undefined;
    this.#sign = (voltage ? isNegative(voltage) : typical < 0) ? -1 : 1;
    this.#signal = swingNeed(sampled.rail.needs, this.#sign < 0);
    this.#spreads = modes.map(() => ({ volts: [], ripple: [] }));
    this.#correlations = new Map([...sampled.used].map((lot) => [lot, new Correlation()]));
  }

  /** Judges the present sample, `number` from 1, over all modes. */
  add(number: number): Verdict {
    const missed = { low: false, high: false, ripple: false };
    let unsolved = false;
    let size = Number.POSITIVE_INFINITY;
    this.modes.forEach((mode, k) => {
      const reached = this.sampled.reach(k);
      if (!reached) {
        unsolved = true;
        return;
      }
      const { volts, ripple, moments } = reached;
      missed.low ||= this.#weak !== undefined && isBeyond(this.#weak, volts);
      const weakest = (this.#sign < 0 ? moments?.high : moments?.low) ?? volts;
      missed.low ||= this.#signal !== undefined && isClipped(this.#signal, weakest);
      missed.high ||= this.#strong !== undefined && isBeyond(this.#strong, volts);
      this.#spreads[k]!.volts.push(volts);
      const seen = (value: number): Seen => ({
        value,
        ...(mode === undefined ? {} : { mode }),
        sample: number,
      });
      const sign = this.#sign;
      size = Math.min(size, sign * volts);
      if (!this.#weakest || sign * volts < sign * this.#weakest.value) this.#weakest = seen(volts);
      if (!this.#strongest || sign * volts > sign * this.#strongest.value) this.#strongest = seen(volts);
      if (ripple === null) return;
      missed.ripple ||= this.#ripple !== undefined && isTooMuchRipple(this.#ripple, ripple);
      this.#spreads[k]!.ripple.push(ripple);
      if (!this.#mostRipple || ripple > this.#mostRipple.value) this.#mostRipple = seen(ripple);
    });
    for (const need of ['low', 'high', 'ripple'] as const) if (missed[need]) this.#misses[need]++;
    if (!unsolved)
      for (const [lot, correlation] of this.#correlations) correlation.add(this.lots.shares[lot]!, size);
    const failed = missed.low || missed.high || missed.ripple;
    const verdict = failed ? 'missed' : unsolved ? 'unsolved' : 'met';
    this.#tally.add(verdict);
    return verdict;
  }

  get result(): RailYield {
    const { low, high, ripple } = this.#misses;
    return {
      rail: this.sampled.rail.name,
      outcome: this.#tally.outcome,
      misses: {
        low: this.#weak || this.#signal ? low : null,
        high: this.#strong ? high : null,
        ripple: this.#ripple ? ripple : null,
      },
      weakest: this.#weakest,
      strongest: this.#strongest,
      mostRipple: this.#mostRipple,
      modes: this.modes.map((mode, k) => ({
        ...(mode === undefined ? {} : { mode }),
        voltage: spread(this.#spreads[k]!.volts),
        ripple: spread(this.#spreads[k]!.ripple),
      })),
      leading: this.#leading(),
    };
  }

  /** What does not stand out of the noise of so many samples is left out. */
  #leading(): RailYield['leading'] {
    return [...this.#correlations]
      .flatMap(([lot, { value, noise }]) => {
        if (value === undefined || Math.abs(value) <= noise) return [];
        return [{ ...this.lots.quantities[lot]!, correlation: value }];
      })
      .sort((a, b) => Math.abs(b.correlation) - Math.abs(a.correlation))
      .slice(0, mostLeading);
  }
}

function spread(values: readonly number[]): Spread | null {
  return spreadOf(values, shares) ?? null;
}
