/**
 * Quantities moved from their typical values towards the ends of their bands until the prediction meets a goal: the
 * derivatives say how far, the solver says whether that is so.
 */
import type { BenchModel, BenchReading } from './bench-model';
import { typicals } from './bench-model';
import type { Target } from './pump-corners';
import { hasBand } from './pump-model';

export interface Goal {
  readonly target: Target;
  readonly value: number;
  /** The goal counts as met this near, V. */
  readonly within: number;
}

/** A variable, by its index, and the value that it has at share 1. */
export interface Step {
  readonly index: number;
  readonly end: number;
}

/** A step towards the goal, and the share of it that should do, by the derivatives. */
export interface Approach {
  readonly step: Step;
  readonly share: number;
}

export interface Found {
  /** Common to all steps. */
  readonly share: number;
  readonly values: readonly number[];
  readonly reading: BenchReading;
}

/** All variables that tolerance can move towards the goal, those that need the smallest share first. */
export function approaches(model: BenchModel, goal: Goal): Approach[] {
  const need = goal.value - readingOf(model.typical(), goal.target);
  return model.variables
    .flatMap((variable, index): Approach[] => {
      if (!hasBand(variable)) return [];
      const { min, typical, max } = variable.band;
      return [min, max].flatMap((end) => {
        const step = { index, end };
        const share = end === typical ? 0 : need / gainOf(model, step, goal.target);
        return share > 0 ? [{ step, share }] : [];
      });
    })
    .sort((a, b) => a.share - b.share);
}

/** Change of the target at share 1 if the derivative held; where there is none, the solver is asked. */
function gainOf(model: BenchModel, step: Step, target: Target): number {
  const { typical } = model.variables[step.index]!.band;
  const slope = model.typical().slopes[target][step.index]!;
  if (!Number.isNaN(slope)) return slope * speed(typical, step.end);
  const reached = model.at(along(model, [step], 1));
  return reached ? readingOf(reached, target) - readingOf(model.typical(), target) : Number.NaN;
}

/** Rounds in which the share may be corrected; the derivative is close, so that two usually do. */
const mostRounds = 5;

/** The share, up to `most`, at which the steps together meet the goal; undefined when they do not. */
export function settle(
  model: BenchModel,
  steps: readonly Step[],
  goal: Goal,
  first: number,
  most = 1,
): Found | undefined {
  let before = { share: 0, off: readingOf(model.typical(), goal.target) - goal.value };
  let share = first;
  for (let round = 0; round < mostRounds; round++) {
    if (!(share > 0)) return undefined;
    share = Math.min(share, most);
    const values = along(model, steps, share);
    const reading = model.at(values);
    if (!reading) return undefined;
    const off = readingOf(reading, goal.target) - goal.value;
    if (Math.abs(off) <= goal.within) return { share, values, reading };
    if (share === most && off * before.off > 0) return undefined;
    const next = share - (off * (share - before.share)) / (off - before.off);
    before = { share, off };
    share = next;
  }
  return undefined;
}

/** Typical values, those of the steps moved by a share of their way. */
export function along(model: BenchModel, steps: readonly Step[], share: number): number[] {
  const values = typicals(model.variables);
  for (const { index, end } of steps) values[index] = between(values[index]!, end, share);
  return values;
}

/** What is positive by nature differs by factors from part to part. */
function between(typical: number, end: number, share: number): number {
  if (share === 1) return end;
  return byFactors(typical, end) ? typical * (end / typical) ** share : typical + (end - typical) * share;
}

/** Change per share at the typical value. */
export function speed(typical: number, end: number): number {
  return byFactors(typical, end) ? typical * Math.log(end / typical) : end - typical;
}

function byFactors(typical: number, end: number): boolean {
  return typical > 0 && end > 0;
}

export function readingOf(reading: BenchReading, target: Target): number {
  return reading[target] ?? Number.NaN;
}
