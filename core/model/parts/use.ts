/**
 * A part wherever one is expected: a key of the catalogue (with the file's own `parts` in it), or figures in place.
 */
import type { PartEntry } from '../../catalog/part';
import type { PartFamily } from '../../format';
import type { Use } from '../board';
import type { Slot } from '../slot';
import { refOf, reportUnknownName } from '../words';

/** `build` makes an entry of the figures in place; `list` is the family's catalogue. */
export function useOf<T extends PartEntry>(
  slot: Slot | undefined,
  family: PartFamily,
  list: readonly T[],
  build: (slot: Slot, key: string) => T | undefined,
): Use<T> | undefined {
  if (!slot) return undefined;
  if (slot.node.kind === 'map') {
    const data = build(slot, inPlace);
    return data ? { span: slot.span, data } : { span: slot.span };
  }
  return lookUp(slot, list, singular[family]);
}

/** A key of a list that has no figures in place. */
export function lookUp<T extends PartEntry>(
  slot: Slot | undefined,
  list: readonly T[],
  what: string,
): Use<T> | undefined {
  const ref = refOf(slot);
  if (!slot || !ref) return undefined;
  const data = list.find((entry) => entry.key === ref.name);
  const target = slot.context.partPlaces.get(data);
  const reference = { span: ref.span, path: slot.path, to: 'part' as const, name: ref.name };
  slot.context.references.push(target ? { ...reference, target } : reference);
  if (data) return { ref, span: ref.span, data };
  const known = list.map((entry) => entry.key);
  reportUnknownName(slot.context, slot.path, ref, what, known);
  return { ref, span: ref.span };
}

/** Key of an entry that stands in place of a key. */
export const inPlace = 'in place';

const singular: Readonly<Record<PartFamily, string>> = {
  chips: 'chip part',
  diodes: 'diode',
  transistors: 'transistor',
  mosfets: 'MOS transistor',
  gates: 'gate',
  timers: 'timer',
  capacitors: 'kind of capacitor',
};
