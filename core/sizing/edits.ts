/**
 * A design as the fewest edits of the file: values replaced, keys put in or taken out, entries added to their section.
 */
import type { Rail } from '../model/board';
import { formatQuantity } from '../quantity/write';
import type { MapEntry, MapNode, Node } from '../syntax/node';
import { parseText } from '../syntax/parse';
import type { TextEdit } from '../text/edit';
import { insertAfter, insertFirst } from '../text/insert-key';
import type { Span } from '../text/span';
import type { CapacitorPlan, Design, NewEntry } from './design';

/** Undefined when the file has no place for it. */
export function designEdits(text: string, rail: Rail, design: Design): readonly TextEdit[] | undefined {
  const { root } = parseText(text);
  const rails = child(root, 'rails');
  const own = child(rails, rail.name);
  if (root?.kind !== 'map' || own?.kind !== 'map') return undefined;
  const pump = child(own, 'pump');
  const edits = pump?.kind === 'map' ? changed(text, pump, design) : made(text, own, design);
  if (!edits) return undefined;
  const added = addEntries(text, root, design.drive.entries);
  return added && [...edits, ...added];
}

function child(node: Node | undefined, key: string): Node | undefined {
  return node?.kind === 'map' ? entry(node, key)?.value : undefined;
}

function entry(map: MapNode, key: string): MapEntry | undefined {
  return map.entries.find((each) => each.key.text === key);
}

/** Keys of the pump with their words, in the usual order; undefined words: the key does not belong. */
function wanted(design: Design): readonly (readonly [string, string | undefined])[] {
  const several = design.topology === 'multiplier' || design.topology === 'ladder';
  return [
    ['topology', design.topology],
    ['stages', several ? `${design.stages}` : undefined],
    ['polarity', several && design.negative ? 'negative' : undefined],
    ['input', design.topology === 'inverter' ? undefined : design.input],
    [
      'drive',
      design.drive.names.length === 1 ? design.drive.names[0]! : `[${design.drive.names.join(', ')}]`,
    ],
    ['diode', design.diode.key],
    ['flying', capacitorText(design.flying)],
    ['smoothing', undefined],
    ['reservoir', capacitorText(design.reservoir)],
  ];
}

export function capacitorText({ farads, kind, rated }: CapacitorPlan): string {
  const value = plain(farads, 'F');
  return rated === undefined
    ? `{ value: ${value}, kind: ${kind.key} }`
    : `{ value: ${value}, kind: ${kind.key}, rated: ${plain(rated, 'V')} }`;
}

function plain(value: number, unit: 'F' | 'V'): string {
  return formatQuantity(value, unit).replace('µ', 'u');
}

function made(text: string, rail: MapNode, design: Design): readonly TextEdit[] | undefined {
  const body = wanted(design).flatMap(([key, words]) => (words === undefined ? [] : [`${key}: ${words}`]));
  const edit = insertFirst(text, keySpans(rail), 'pump', `{ ${body.join(', ')} }`);
  return edit && [edit];
}

function changed(text: string, pump: MapNode, design: Design): readonly TextEdit[] | undefined {
  const edits: TextEdit[] = [];
  let after: Span | undefined;
  for (const [key, words] of wanted(design)) {
    const present = entry(pump, key);
    if (present?.value && words !== undefined) {
      const span = present.alias ?? present.value.span;
      const plan = key === 'flying' ? design.flying : key === 'reservoir' ? design.reservoir : undefined;
      const inside = plan && capacitorEdits(text, present.value, plan);
      if (inside) edits.push(...inside);
      else if (!means(text, present.value, words)) edits.push({ span, text: words });
      if (after === undefined || span.end > after.end) after = span;
    } else if (present && words === undefined) edits.push(removal(text, pump, present));
    else if (words !== undefined && after) {
      const edit = insertAfter(text, keySpans(pump), after, key, words);
      if (!edit) return undefined;
      edits.push(edit);
    }
  }
  return edits;
}

/** A capacitor that stays of its kind keeps everything but its value and its rating; undefined for any other. */
function capacitorEdits(text: string, node: Node, plan: CapacitorPlan): readonly TextEdit[] | undefined {
  const value = plain(plan.farads, 'F');
  if (node.kind === 'scalar')
    return plan.rated === undefined && plan.asWritten ? [{ span: node.span, text: value }] : undefined;
  const kind = child(node, 'kind');
  const present = child(node, 'value');
  if (!present || (kind?.kind === 'scalar' ? kind.text !== plan.kind.key : !plan.asWritten)) return undefined;
  const rated = child(node, 'rated');
  const edits: TextEdit[] = means(text, present, value) ? [] : [{ span: present.span, text: value }];
  if (plan.rated === undefined || (rated && means(text, rated, plain(plan.rated, 'V')))) return edits;
  if (rated) return [...edits, { span: rated.span, text: plain(plan.rated, 'V') }];
  return undefined;
}

/** True when the file says the same already, in other words perhaps. */
function means(text: string, node: Node, words: string): boolean {
  const written = text.slice(node.span.start, node.span.end);
  const bare = (from: string) => from.replace(/[\s'"]/g, '').replace(/[µμ]/g, 'u');
  return bare(written) === bare(words);
}

function removal(text: string, map: MapNode, item: MapEntry): TextEdit {
  const end = item.value?.span.end ?? item.key.span.end;
  const { start } = item.key.span;
  if (map.flow) {
    const before = /,\s*$/.exec(text.slice(0, start));
    if (before) return { span: { start: start - before[0].length, end }, text: '' };
    const behind = /^\s*,\s*/.exec(text.slice(end));
    return { span: { start, end: end + (behind?.[0].length ?? 0) }, text: '' };
  }
  const line = text.lastIndexOf('\n', start - 1) + 1;
  const next = text.indexOf('\n', end);
  return { span: { start: line, end: next < 0 ? text.length : next + 1 }, text: '' };
}

function keySpans(map: MapNode): readonly Span[] {
  return map.entries.filter(({ merged }) => !merged).map(({ key }) => key.span);
}

/** New entries behind the last one of their section, or in a new section in front of `rails`. */
function addEntries(
  text: string,
  root: MapNode,
  entries: readonly NewEntry[],
): readonly TextEdit[] | undefined {
  const edits: TextEdit[] = [];
  for (const section of ['clocks', 'drivers'] as const) {
    const added = entries.filter((each) => each.section === section);
    if (added.length === 0) continue;
    const present = child(root, section);
    if (present?.kind === 'map' && present.entries.length > 0) {
      const last = present.entries.at(-1)!;
      const after = last.value?.span ?? last.key.span;
      const all = added.map(({ name, text: body }) =>
        insertAfter(text, keySpans(present), after, name, body),
      );
      const span = all[0]?.span;
      if (!span) return undefined;
      edits.push({ span, text: all.map((edit) => edit!.text).join('') });
      continue;
    }
    const rails = entry(root, 'rails');
    if (!rails || root.flow) return undefined;
    const at = rails.key.span.start;
    const body = added.map(({ name, text: map }) => `  ${name}: ${map}\n`).join('');
    edits.push({ span: { start: at, end: at }, text: `${section}:\n${body}` });
  }
  return joined(edits);
}

/** Two insertions at one place are one edit. */
function joined(edits: readonly TextEdit[]): readonly TextEdit[] {
  const byPlace = new Map<number, TextEdit>();
  for (const edit of edits) {
    const known = edit.span.start === edit.span.end ? byPlace.get(edit.span.start) : undefined;
    byPlace.set(edit.span.start, known ? { span: known.span, text: known.text + edit.text } : edit);
  }
  return [...byPlace.values()];
}
