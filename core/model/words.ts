/**
 * Words out of the file: texts, choices, names of entries, pins.
 */
import type { NameSpace, Value } from '../format';
import { listNames } from '../text/closest';
import type { Span } from '../text/span';
import { span } from '../text/span';
import type { PinRef, Ref } from './board';
import { type Context, guess, nameList, report, reportNotComputed } from './context';
import { textSpan } from './figures';
import { replacement, type Slot } from './slot';

/** Any scalar as text. */
export function refOf(slot: Slot | undefined): Ref | undefined {
  if (!slot) return undefined;
  if (slot.node.kind !== 'scalar') {
    const example = slot.row.example === '' ? '' : `, for example \`${slot.row.example}\``;
    report(
      slot.context,
      'syntax',
      { path: slot.path, span: slot.keySpan },
      `One word or text stands here${example}.`,
    );
    return undefined;
  }
  return { name: slot.node.text.trim(), span: textSpan(slot.node) };
}

export function textOf(slot: Slot | undefined): string | undefined {
  return refOf(slot)?.name;
}

/** One of the row's options; anything else is reported and left out. */
export function choiceOf(slot: Slot | undefined): Ref | undefined {
  const ref = refOf(slot);
  if (!slot || !ref) return undefined;
  const options = slot.row.values.flatMap((value) => (value.kind === 'choice' ? value.options : []));
  const chosen = options.find((option) => option.name === ref.name);
  if (!chosen) {
    const names = options.map((option) => option.name);
    const meant = guess(slot.context, ref.name, names);
    const cure = meant ? `did you mean \`${meant}\`?` : `it is one of ${listNames(names)}.`;
    const key = slot.context.text.slice(slot.keySpan.start, slot.keySpan.end);
    report(
      slot.context,
      'unknown-name',
      { path: slot.path, span: ref.span },
      `\`${key}\` cannot be \`${ref.name}\`: ${cure}`,
      {
        expected: nameList(names),
        actual: ref.name,
        ...(meant && { fixes: [replacement(ref.span, meant)] }),
      },
    );
    return undefined;
  }
  if (!chosen.computed)
    reportNotComputed(slot.context, { path: slot.path, span: ref.span }, `\`${chosen.name}\``);
  return ref;
}

/** A name of another entry. Unknown names are reported, and kept: the reader of the board finds no such entry. */
export function nameOf(slot: Slot | undefined): Ref | undefined {
  const ref = refOf(slot);
  if (!slot || !ref) return undefined;
  const value = slot.row.values.find(
    (candidate): candidate is Value & { kind: 'name' } => candidate.kind === 'name',
  );
  if (!value || value.also.includes(ref.name)) return ref;
  checkName(slot.context, slot.path, ref, value.of, value.also);
  return ref;
}

export function checkName(
  context: Context,
  path: string,
  ref: Ref,
  spaces: readonly NameSpace[],
  also: readonly string[] = [],
): void {
  const space = spaces.find((candidate) => context.names[candidate].has(ref.name)) ?? spaces[0] ?? 'rails';
  const target = context.names[space].get(ref.name);
  context.references.push({ span: ref.span, path, to: space, name: ref.name, ...(target && { target }) });
  if (target) return;
  const lists = spaces.map((candidate) => context.nameLists[candidate]);
  const known = ([] as string[]).concat(...lists, also);
  const what = spaces.map((candidate) => singular[candidate]).join(' or ');
  reportUnknownName(context, path, ref, what, known);
}

/** `ref` names no `what`; `known` is what there is. */
export function reportUnknownName(
  context: Context,
  path: string,
  ref: Ref,
  what: string,
  known: readonly string[],
): void {
  const meant = guess(context, ref.name, known);
  const list =
    known.length > 0
      ? `There ${known.length === 1 ? 'is' : 'are'} ${listNames(known, 10)}.`
      : 'None is given in this file.';
  const question = meant ? ` did you mean \`${meant}\`?` : '';
  report(
    context,
    'unknown-name',
    { path, span: ref.span },
    `No ${what} \`${ref.name}\`${meant ? ':' : '.'}${question} ${list}`,
    {
      expected: nameList(known),
      actual: ref.name,
      ...(meant && { fixes: [replacement(ref.span, meant)] }),
    },
  );
}

/** `CHIP.PIN`; whether the chip has such a pin is for the caller, who knows the chips. */
export function pinOf(slot: Slot | undefined): PinRef | undefined {
  const ref = refOf(slot);
  if (!slot || !ref || slot.node.kind !== 'scalar') return undefined;
  const chips = [...slot.context.names.chips.keys()];
  // Names may hold dots themselves: a known chip's name wins over the first dot.
  const known = chips.find((chip) => ref.name.startsWith(`${chip}.`));
  const dot = known?.length ?? ref.name.indexOf('.');
  const { node } = slot;
  const lead = node.text.indexOf(ref.name);
  const stretch = (from: number, to: number): Span => node.locate(span(lead + from, lead + to));
  if (dot <= 0 || dot === ref.name.length - 1) {
    const example = `${chips[0] ?? 'mcu'}.${dot < 0 && !chips.includes(ref.name) ? ref.name : 'GP15'}`;
    report(
      slot.context,
      'unknown-name',
      { path: slot.path, span: ref.span },
      `A pin is written CHIP.PIN, for example \`${example}\`.`,
      {
        expected: 'CHIP.PIN',
        actual: ref.name,
      },
    );
    return undefined;
  }
  const chip = { name: ref.name.slice(0, dot), span: stretch(0, dot) };
  checkName(slot.context, slot.path, chip, ['chips']);
  slot.context.references.push({
    span: stretch(dot + 1, ref.name.length),
    path: slot.path,
    to: 'pin',
    name: ref.name,
  });
  return { chip: chip.name, pin: ref.name.slice(dot + 1), span: ref.span };
}

const singular: Readonly<Record<NameSpace, string>> = {
  supplies: 'supply',
  chips: 'chip',
  clocks: 'clock',
  drivers: 'driver',
  rails: 'rail',
  modes: 'mode',
};
