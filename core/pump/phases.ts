/**
 * The clock period cut into segments: first clock high, its falling edge, low, its rising edge.
 */
import type { Course, Segment } from '../engine';
import type { PumpValues } from './values';

export type Phase = 'high' | 'fall' | 'low' | 'rise';

export interface Phases {
  readonly segments: readonly Segment[];
  readonly phases: readonly Phase[];
}

/** Undefined when the edges are longer than the levels leave room for. */
export function clockPhases({ frequency, duty, rise, fall }: PumpValues): Phases | undefined {
  const edges = (rise + fall) / 2;
  const high = duty / frequency - edges;
  const low = (1 - duty) / frequency - edges;
  if (!(high > 0 && low > 0)) return undefined;
  const all: readonly (readonly [Phase, number])[] = [
    ['high', high],
    ['fall', fall],
    ['low', low],
    ['rise', rise],
  ];
  const present = all.filter(([, duration]) => duration > 0);
  return {
    segments: present.map(([, duration]) => ({ duration })),
    phases: present.map(([phase]) => phase),
  };
}

/** The phase as an output sees it that runs opposite to the first clock. */
export function oppositePhase(phase: Phase): Phase {
  const turned: Readonly<Record<Phase, Phase>> = { high: 'low', fall: 'rise', low: 'high', rise: 'fall' };
  return turned[phase];
}

/** Resistance of a switch that is off, ohm: as far from everything else as the leak of a node. */
const offOhms = 1e12;

/** Upper switch of an output: resistance and series drop in each segment; an edge is a drop that shrinks. */
export function upperSwitch(
  phases: readonly Phase[],
  ohms: number,
  drop: number,
  least: number,
): { ohms: number[]; drop: Course[] } {
  return {
    ohms: phases.map((phase) => (phase === 'high' || phase === 'rise' ? ohms : offOhms)),
    drop: phases.map((phase) => (phase === 'rise' ? [least, drop] : phase === 'high' ? drop : 0)),
  };
}

/** Lower switch of an output. */
export function lowerSwitch(
  phases: readonly Phase[],
  ohms: number,
  drop: number,
  most: number,
): { ohms: number[]; drop: Course[] } {
  return {
    ohms: phases.map((phase) => (phase === 'low' || phase === 'fall' ? ohms : offOhms)),
    drop: phases.map((phase) => (phase === 'fall' ? [most, drop] : phase === 'low' ? drop : 0)),
  };
}
