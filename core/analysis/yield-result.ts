/**
 * What a Monte Carlo run says: plain data, ready for JSON. `null` stands for "not computed" or "not asked".
 */
import type { Distribution } from '../compute/distribution';
import type { Spread } from '../compute/spread';

export interface YieldOptions {
  /** Boards to draw, 1 or more. */
  readonly samples: number;
  /** A whole number: the same seed draws the same boards. */
  readonly seed: number;
  /** `uniform` (cautious) when left out. */
  readonly distribution?: Distribution;
}

export interface YieldProgress {
  readonly done: number;
  readonly samples: number;
}

/** How many samples met everything; the three counts add up to all samples. */
export interface Outcome {
  readonly met: number;
  readonly missed: number;
  /** No steady state was found, and what was found missed nothing: never counted as met. */
  readonly unsolved: number;
  /** Share that met, and the interval of 95 % confidence about it. */
  readonly yield: number;
  readonly interval: { readonly low: number; readonly high: number };
}

/** An extreme that was seen. */
export interface Seen {
  readonly value: number;
  /** Absent for a board without modes. */
  readonly mode?: string;
  /** Number of the sample, from 1. */
  readonly sample: number;
}

export interface RailYield {
  readonly rail: string;
  /** Null when the rail is not computed; `because` says why. */
  readonly outcome: Outcome | null;
  readonly because?: string;
  /**
   * Samples that miss the weak end of the window or what a signal needs, its strong end, the ripple; null where that
   * is no need.
   */
  readonly misses: {
    readonly low: number | null;
    readonly high: number | null;
    readonly ripple: number | null;
  };
  /** In magnitude the lowest and highest voltage, and the largest ripple, of all samples and modes. */
  readonly weakest: Seen | null;
  readonly strongest: Seen | null;
  readonly mostRipple: Seen | null;
  /** One for each mode; null when no sample was solved, ripple also for rails that no pump makes. */
  readonly modes: readonly {
    readonly mode?: string;
    readonly voltage: Spread | null;
    readonly ripple: Spread | null;
  }[];
  /** What goes most closely with the rail's magnitude in its weakest mode, at most three, most closely first. */
  readonly leading: readonly {
    readonly label: string;
    readonly path: string;
    /** -1..1; positive: more of it makes the rail stronger. */
    readonly correlation: number;
  }[];
}

export interface YieldResult {
  readonly file: string;
  readonly board: string | null;
  readonly samples: number;
  readonly seed: number;
  readonly distribution: Distribution;
  /** Quantities drawn in each sample. */
  readonly quantities: number;
  /** All rails with needs in the same sample; null when a rail is not computed or none has a need. */
  readonly outcome: Outcome | null;
  readonly rails: readonly RailYield[];
  /** Needs that a run does not judge: those of switch-on, and ripple of rails that no pump makes. */
  readonly notJudged: readonly { readonly rail: string; readonly need: string }[];
  readonly confidence: {
    /** 0.95. */
    readonly level: number;
    /** With that confidence at least this share of all boards lies above the lowest value seen. */
    readonly oneSided: number | null;
    /** The same between the lowest and the highest value seen. */
    readonly twoSided: number | null;
    /** When no sample failed: the share that may fail all the same, about 3/N. */
    readonly mayFail: number | null;
  };
}
