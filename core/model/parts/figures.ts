/**
 * Figures of part data: from the file, else from the entry that is overridden, else a typical one of the
 * catalogue that the report names.
 */
import type { PartEntry } from '../../catalog/part';
import { type Figure, figure } from '../../quantity/figure';
import { report } from '../context';
import { figureOf } from '../figures';
import { type Fields, join, type Slot } from '../slot';
import { textOf } from '../words';
import { inPlace } from './use';

/** Adds the entry's `source` to figures from the file. */
export function partFigure<K extends string>(
  fields: Fields<K>,
  key: K,
  base: Figure | undefined,
  source?: string,
): Figure | undefined {
  const found = figureOf(fields.at(key));
  if (!found) return base;
  return source === undefined ? found : { ...found, origin: { kind: 'file', note: source } };
}

export function entryHead(
  key: string,
  slot: Slot,
  fields: Fields<'source'>,
  base: PartEntry | undefined,
): PartEntry {
  const source = textOf(fields.at('source')) ?? base?.source ?? 'figures in the file';
  return { key, title: base?.title ?? (key === inPlace ? `figures at ${slot.path}` : key), source };
}

export interface StandIn {
  /** The figure with origin `assumed`, and a note of it for the finding. */
  take(key: string, model: Figure | undefined): Figure | undefined;
  /** Reports what was taken, once for the entry. */
  report(): void;
}

/** Typical figures from `like`, an entry of the catalogue, where an entry of the file leaves some out. */
export function standIn(slot: Slot, like: PartEntry | undefined): StandIn {
  const taken: string[] = [];
  return {
    take(key, model) {
      if (!model || !like) return undefined;
      taken.push(key);
      return figure(model, model.unit, { kind: 'assumed', note: `as ${like.key}` });
    },
    report() {
      if (taken.length === 0 || !like || slot.context.quiet) return;
      const names = taken.map((key) => `\`${key}\``).join(' and ');
      const verb = taken.length === 1 ? 'is' : 'are';
      const place = { path: slot.path, span: slot.keySpan };
      report(
        slot.context,
        'assumed',
        place,
        `${names} ${verb} left out here: the typical figures of \`${like.key}\` stand in.`,
      );
    },
  };
}

/** Reports a figure without which the entry says nothing. */
export function missingFigure(slot: Slot, key: string, what: string, example: string): void {
  const place = { path: join(slot.path, key), span: slot.keySpan };
  report(
    slot.context,
    'missing-key',
    place,
    `\`${key}\` is missing: ${what}. For example \`${key}: ${example}\`.`,
  );
}
