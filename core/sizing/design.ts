/**
 * A way to make a rail, as data: what stands in the pump, what drives it, and what it costs.
 */
import type { CapacitorKind, DiodeData } from '../catalog/part';
import type { Topology } from '../model/board';

export interface CapacitorPlan {
  readonly farads: number;
  readonly kind: CapacitorKind;
  /** V; absent where the kind needs none to be computed. */
  readonly rated?: number;
  /** True when kind and rating are those that the file has, so that only the value may change. */
  readonly asWritten?: boolean;
}

/** An entry that a drive needs and the file does not have yet. */
export interface NewEntry {
  readonly section: 'clocks' | 'drivers';
  readonly name: string;
  /** Its map, in braces. */
  readonly text: string;
}

export interface DrivePlan {
  /** `mcu.PB1`, `two pins of mcu`, `push-pull stage`. */
  readonly label: string;
  /** What stands in `drive`: one name, or two of opposite phase. */
  readonly names: readonly string[];
  readonly entries: readonly NewEntry[];
  /** Parts on the board beside the pump's own. */
  readonly parts: readonly string[];
  readonly pins: number;
  /** Rail whose voltage it swings by. */
  readonly swingRail: string;
}

/** Everything about a pump but the values of its capacitors. */
export interface Frame {
  readonly topology: Topology;
  readonly stages: number;
  readonly negative: boolean;
  /** Name of a rail, or `ground`. */
  readonly input: string;
  readonly drive: DrivePlan;
  readonly diode: DiodeData;
}

export interface Design extends Frame {
  readonly flying: CapacitorPlan;
  readonly reservoir: CapacitorPlan;
}

export function diodesOf({ topology, stages }: Pick<Frame, 'topology' | 'stages'>): number {
  return topology === 'ladder' ? 2 * stages : stages + 1;
}

/** Capacitors beside the reservoir. */
export function pumpedOf({ topology, stages }: Pick<Frame, 'topology' | 'stages'>): number {
  return topology === 'ladder' ? 2 * stages : stages;
}

/** Parts to place: diodes, capacitors, and what the drive needs. */
export function partCount(frame: Frame): number {
  return diodesOf(frame) + pumpedOf(frame) + 1 + frame.drive.parts.length;
}

export function totalCapacitance(design: Design): number {
  return pumpedOf(design) * design.flying.farads + design.reservoir.farads;
}

/** Two-phase stages need two drives. */
export function needsTwoPhases({ topology, stages }: Pick<Frame, 'topology' | 'stages'>): boolean {
  return topology === 'multiplier' && stages > 1;
}
