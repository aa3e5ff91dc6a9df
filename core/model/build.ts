/**
 * Text to board: the whole language in one call. Never throws; a broken or half-typed text gives whatever can be
 * read, and findings.
 */
import type { Catalogue } from '../catalog/part';
import type { Finding } from '../checks/finding';
import { boardShape, conditionsShape, type Row } from '../format';
import { type Figure, figure } from '../quantity/figure';
import { locate, type Place } from '../syntax/locate';
import type { Node } from '../syntax/node';
import { parseText } from '../syntax/parse';
import { stripBom } from '../text/bom';
import { type Span, touches } from '../text/span';
import type { Board } from './board';
import type { Context, ReadQuantity, ReadReference } from './context';
import { report } from './context';
import { railCycles } from './cycles';
import { figureOf } from './figures';
import { type IncludeSource, withIncludes } from './include';
import { namesOf } from './names';
import { readParts } from './parts';
import { present } from './present';
import { chipsOf } from './sections/chips';
import { clocksOf } from './sections/clocks';
import { driversOf } from './sections/drivers';
import { railsOf } from './sections/rails';
import { benchOf, includesOf, waiversOf } from './sections/reality';
import { stockOf } from './sections/stock';
import { modesOf, suppliesOf } from './sections/supplies';
import { settle, syntaxFinding } from './settle';
import { openMap, type Slot } from './slot';
import { refOf } from './words';

export interface BoardReading {
  /** The text that all spans refer to: without a byte-order mark. */
  readonly text: string;
  readonly board: Board;
  /** What is wrong with the file as a text of the language, by place. */
  readonly findings: readonly Finding[];
  /** With the file's own `parts` in it. */
  readonly catalogue: Catalogue;
  /** Where the names of the file's own parts stand, by entry of the catalogue. */
  readonly ownParts: ReadonlyMap<unknown, Span>;
  /** Every quantity that could be read, by place. */
  readonly quantities: readonly ReadQuantity[];
  /** Every name that points somewhere, by place. */
  readonly references: readonly ReadReference[];
  /** Key path and node at an offset; also on lines that are half typed. */
  nodeAt(offset: number): Place;
  quantityAt(offset: number): ReadQuantity | undefined;
  referenceAt(offset: number): ReadReference | undefined;
}

export function readBoard(source: string, catalogue: Catalogue, includes?: IncludeSource): BoardReading {
  const text = stripBom(source);
  const { root, issues } = parseText(text);
  const context: Context = {
    text,
    catalogue,
    ...namesOf(root),
    partPlaces: new Map(),
    findings: issues.map((issue) => syntaxFinding(text, root, issue)),
    quantities: [],
    references: [],
    quiet: false,
    said: new Set(),
    comparisons: { left: 100_000 },
  };
  const board = boardOf(context, root, includes);
  const quantities = byPlace(context.quantities);
  const references = byPlace(context.references);
  return {
    text,
    board: board.board,
    catalogue: board.catalogue,
    ownParts: board.ownParts,
    findings: settle(text, [...context.findings, ...railCycles(board.board)], issues),
    quantities,
    references,
    nodeAt: (offset) => locate(text, root, offset),
    quantityAt: (offset) => innermost(quantities, offset),
    referenceAt: (offset) => innermost(references, offset),
  };
}

function boardOf(
  context: Context,
  root: Node | undefined,
  source: IncludeSource | undefined,
): { board: Board; catalogue: Catalogue; ownParts: ReadonlyMap<unknown, Span> } {
  const slot: Slot | undefined = root && {
    context,
    node: root,
    row: wholeFile,
    path: '',
    span: top(root.span),
    keySpan: top(root.span),
  };
  const fields = slot && openMap(slot, boardShape);
  if (!fields?.keys.has('rails') && (root === undefined || root.kind === 'map')) {
    const place = { path: 'rails', span: { start: 0, end: Math.min(1, context.text.length) } };
    report(
      context,
      'missing-key',
      place,
      'This file has no `rails` yet: there is nothing to compute. For example `rails: { v5: { supply: port } }`.',
      {},
      'warning',
    );
  }
  const includes = includesOf(fields?.at('include'));
  const shared = { ...context, catalogue: withIncludes(context, includes, source) };
  const partsSlot = fields?.at('parts');
  const own = readParts(shared, partsSlot && { ...partsSlot, context: shared });
  // Everything below looks parts up in the catalogue with the file's own entries.
  const parts = { catalogue: own.catalogue, partPlaces: own.places };
  const at = (key: keyof typeof boardShape.keys): Slot | undefined => {
    const found = fields?.at(key);
    return found && { ...found, context: { ...found.context, ...parts } };
  };
  const title = refOf(at('board'));
  const conditions = at('conditions');
  const chips = chipsOf(at('chips'));
  const clocks = clocksOf(at('clocks'), chips);
  const drivers = driversOf(at('drivers'), chips);
  reportSharedNames(context, clocks, drivers);
  return {
    catalogue: own.catalogue,
    ownParts: own.places,
    board: {
      ...present({ title: title?.name, titleSpan: title?.span }),
      ambient: ambientOf(conditions),
      supplies: suppliesOf(at('supplies')),
      chips,
      clocks,
      drivers,
      rails: railsOf(at('rails')),
      modes: modesOf(at('modes')),
      bench: benchOf(at('bench')),
      waivers: waiversOf(at('waivers')),
      stock: stockOf(at('stock')),
      includes,
    },
  };
}

const wholeFile: Row = {
  values: [{ kind: 'map', shape: boardShape }],
  doc: boardShape.doc,
  example: '',
  required: true,
  computed: true,
};

/** 25 degC, at which part data hold, where the file says nothing. */
const usualAmbient = figure(298.15, 'K', { kind: 'assumed', note: '25 degC, as part data' });

function ambientOf(slot: Slot | undefined): Figure {
  const fields = slot && openMap(slot, conditionsShape);
  return figureOf(fields?.at('ambient')) ?? usualAmbient;
}

/** `drive` names clocks and drivers alike, so that no two of them may share a name. */
function reportSharedNames(context: Context, clocks: Board['clocks'], drivers: Board['drivers']): void {
  for (const driver of drivers.values()) {
    const clock = clocks.get(driver.name);
    if (!clock) continue;
    const message = `A clock is called \`${driver.name}\` too: a pump's \`drive\` could mean either. Rename one of them.`;
    const related = [{ span: clock.nameSpan, message: 'The clock is here.' }];
    report(context, 'duplicate-name', { path: driver.path, span: driver.nameSpan }, message, { related });
  }
}

function byPlace<T extends { readonly span: Span }>(items: readonly T[]): T[] {
  return [...items].sort((a, b) => a.span.start - b.span.start || a.span.end - b.span.end);
}

function innermost<T extends { readonly span: Span }>(items: readonly T[], offset: number): T | undefined {
  const here = items.filter(({ span }) => touches(span, offset));
  return here.sort((a, b) => a.span.end - a.span.start - (b.span.end - b.span.start))[0];
}

/** A mark for the whole file: its first character. */
function top(span: Span): Span {
  return { start: span.start, end: Math.min(span.end, span.start + 1) };
}
