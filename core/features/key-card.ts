/**
 * The card of a key, or of one of the words that may stand behind it: its sentence from the table of the language.
 */
import { type Option, type Row, schemaAt } from '../format';
import type { Place } from '../syntax/locate';
import type { Card } from './card';

/** Undefined where the language has nothing to say, as on a name that the user gave. */
export function keyCard(place: Place): Card | undefined {
  const schema = schemaAt(place.path);
  const key = place.path.at(-1);
  if (!schema?.row || key === undefined) return undefined;
  if (place.on === 'value') return optionCard(place, schema.row);
  if (place.on !== 'key' || schemaAt(place.path.slice(0, -1))?.table) return undefined;
  return {
    span: place.span,
    title: String(key),
    answer: plain(schema.row.doc),
    state: 'neutral',
    head: ['', ''],
    rows: rowsOf(schema.row),
    origins: schema.row.computed ? [] : ['Read and checked, but no number follows from it yet.'],
  };
}

function optionCard(place: Place, row: Row): Card | undefined {
  if (place.node?.kind !== 'scalar') return undefined;
  const { text } = place.node;
  const option = optionsOf(row).find(({ name }) => name === text);
  if (!option) return undefined;
  return {
    span: place.span,
    title: `${String(place.path.at(-1))}: ${option.name}`,
    answer: plain(option.doc),
    state: 'neutral',
    head: [],
    rows: [],
    origins: option.computed ? [] : ['Read and checked, but no number follows from it yet.'],
  };
}

function rowsOf(row: Row): readonly (readonly string[])[] {
  const options = optionsOf(row).map(({ name }) => name);
  const keys = row.values.flatMap((value) => (value.kind === 'map' ? Object.keys(value.shape.keys) : []));
  return [
    ...(options.length > 0 ? [['one of', options.join(', ')]] : []),
    ...(keys.length > 0 ? [['keys', keys.join(', ')]] : []),
    ...(row.example === '' ? [] : [['for example', row.example]]),
  ];
}

function optionsOf(row: Row): readonly Option[] {
  return row.values.flatMap((value) => (value.kind === 'choice' ? value.options : []));
}

/** A card has no code font: the quotes of the sentence would stand there as they are. */
function plain(doc: string): string {
  return doc.replace(/`/g, '');
}
