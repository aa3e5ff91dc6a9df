/**
 * What building a board collects on its way, and what it knows: names of the sections, part data, findings.
 */
import type { Catalogue } from '../catalog/part';
import type { Finding, FindingCode, Severity } from '../checks/finding';
import type { NameSpace } from '../format';
import type { Figure } from '../quantity/figure';
import { closest } from '../text/closest';
import type { Span } from '../text/span';

/** A quantity of the file: a hover on it shows what it was read as. */
export interface ReadQuantity {
  readonly span: Span;
  /** Dotted path of the key. */
  readonly path: string;
  readonly figure: Figure;
  /** True when it is an `=` expression. */
  readonly expression: boolean;
}

/** A name of the file that points to an entry, a part or a finding. */
export interface ReadReference {
  readonly span: Span;
  readonly path: string;
  readonly to: NameSpace | 'pin' | 'part';
  readonly name: string;
  /** Where the entry's name stands; absent for names of the catalogue and unknown ones. */
  readonly target?: Span;
}

export interface Context {
  readonly text: string;
  /** With the file's own `parts` in it. */
  readonly catalogue: Catalogue;
  readonly names: Readonly<Record<NameSpace, ReadonlyMap<string, Span>>>;
  /** The same names as lists, for findings that name what there is. */
  readonly nameLists: Readonly<Record<NameSpace, readonly string[]>>;
  /** Where the file's own parts have their names, by entry. */
  readonly partPlaces: ReadonlyMap<unknown, Span>;
  readonly findings: Finding[];
  readonly quantities: ReadQuantity[];
  readonly references: ReadReference[];
  /** True inside an entry that as a whole is not computed: its keys need no finding of their own. */
  readonly quiet: boolean;
  /** What was already said once for the whole file. */
  readonly said: Set<string>;
  /** How many more words may be compared for guesses: a file full of unknown names must not take seconds. */
  readonly comparisons: { left: number };
}

/** What was probably meant by `word`; undefined when nothing is near, or when too much was guessed already. */
export function guess(context: Context, word: string, candidates: readonly string[]): string | undefined {
  if (context.comparisons.left < candidates.length) return undefined;
  context.comparisons.left -= candidates.length;
  return closest(word, candidates);
}

/** Names as data of a finding, cut where no reader would go on. */
export function nameList(names: readonly string[]): string {
  return names.slice(0, 40).join(', ');
}

export type FindingDetails = Partial<Omit<Finding, 'code' | 'severity' | 'at' | 'span' | 'message'>>;

export function report(
  context: Context,
  code: FindingCode,
  place: { readonly path: string; readonly span: Span },
  message: string,
  details: FindingDetails = {},
  severity: Severity = code === 'assumed' || code === 'not-computed' ? 'information' : 'error',
): void {
  context.findings.push({ code, severity, at: place.path, span: place.span, message, ...details });
}

/** Says that something is read but has no effect on the numbers yet, unless the entry around it said so. */
export function reportNotComputed(
  context: Context,
  place: { readonly path: string; readonly span: Span },
  subject: string,
): void {
  if (context.quiet) return;
  report(context, 'not-computed', place, `${subject} is read but not computed yet: the numbers ignore it.`);
}
