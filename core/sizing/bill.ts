/**
 * The parts of a design, as one would order them.
 */
import { formatQuantity } from '../quantity/write';
import { type CapacitorPlan, type Design, diodesOf, pumpedOf } from './design';

/** Parts by their key, with how many of each. */
export function billOf(design: Design): readonly { readonly count: number; readonly part: string }[] {
  const { flying, reservoir, diode, drive } = design;
  const list = new Map<string, number>();
  const add = (part: string, count: number) => list.set(part, (list.get(part) ?? 0) + count);
  const words = ({ farads, kind, rated }: CapacitorPlan) =>
    `${formatQuantity(farads, 'F')} ${kind.key}${rated === undefined ? '' : ` ${formatQuantity(rated, 'V')}`}`;
  add(words(flying), pumpedOf(design));
  add(words(reservoir), 1);
  add(diode.key, diodesOf(design));
  for (const part of drive.parts) add(part, 1);
  return [...list].map(([part, count]) => ({ count, part }));
}
