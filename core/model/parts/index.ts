/**
 * The file's own `parts` over the catalogue: an entry with a known key overrides the figures it gives and keeps
 * the rest; an entry with a new key is added.
 */
import type { Catalogue, PartEntry } from '../../catalog/part';
import { partsShape } from '../../format';
import type { Span } from '../../text/span';
import type { Context } from '../context';
import { tableOf } from '../entries';
import { openMap, type Slot } from '../slot';
import { gateData, mosfetData, timerData, transistorData } from './active';
import { chipData } from './chip';
import { capacitorKind, diodeData } from './diode';

export interface OwnParts {
  readonly catalogue: Catalogue;
  /** Where the names of the file's entries stand, by entry. */
  readonly places: ReadonlyMap<unknown, Span>;
}

export function readParts(context: Context, slot: Slot | undefined): OwnParts {
  const fields = slot && openMap(slot, partsShape);
  const places = new Map<unknown, Span>();
  const { catalogue } = context;
  if (!fields) return { catalogue, places };

  function merge<T extends PartEntry>(
    inner: Slot | undefined,
    list: readonly T[],
    build: (slot: Slot, key: string, base?: T) => T | undefined,
  ): readonly T[] {
    let merged = list;
    for (const named of tableOf(inner)) {
      const base = list.find((entry) => entry.key === named.name);
      const built = named.slot && build(named.slot, named.name, base);
      if (!built) continue;
      places.set(built, named.nameSpan);
      merged = base ? merged.map((entry) => (entry.key === base.key ? built : entry)) : [...merged, built];
    }
    return merged;
  }

  return {
    places,
    catalogue: {
      ...catalogue,
      chips: merge(fields.at('chips'), catalogue.chips, chipData),
      diodes: merge(fields.at('diodes'), catalogue.diodes, diodeData),
      transistors: merge(fields.at('transistors'), catalogue.transistors, transistorData),
      mosfets: merge(fields.at('mosfets'), catalogue.mosfets, mosfetData),
      gates: merge(fields.at('gates'), catalogue.gates, gateData),
      timers: merge(fields.at('timers'), catalogue.timers, timerData),
      capacitors: merge(fields.at('capacitors'), catalogue.capacitors, capacitorKind),
    },
  };
}
