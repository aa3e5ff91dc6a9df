/**
 * Files with parts shared between boards. The core reads no files: who calls it hands in their texts, or a reason why
 * there is none.
 */
import type { Catalogue } from '../catalog/part';
import type { Finding } from '../checks/finding';
import { boardShape, type Row } from '../format';
import type { Node } from '../syntax/node';
import { parseText } from '../syntax/parse';
import { stripBom } from '../text/bom';
import { lineIndex } from '../text/lines';
import { joined, pathFault } from '../text/relative-path';
import type { Ref } from './board';
import { type Context, report } from './context';
import { namesOf } from './names';
import { readParts } from './parts';
import type { Slot } from './slot';

export interface IncludeProblem {
  /** One clause: `there is no such file`. */
  readonly problem: string;
}

/** Text of a file by its path relative to the board's; undefined when nobody looked for it. */
export type IncludeSource = (path: string) => string | IncludeProblem | undefined;

/** Files that include files that include files: deeper is taken for a mistake. */
const deepest = 8;

/** Paths that a text includes, as written, relative to itself; those that cannot be read by anybody are left out. */
export function includePaths(text: string): readonly string[] {
  const { root } = parseText(stripBom(text));
  return listed(root).flatMap(({ text: path }) => (pathFault(path.trim()) ? [] : [path.trim()]));
}

function listed(root: Node | undefined) {
  const entry = root?.kind === 'map' ? root.entries.find(({ key }) => key.text === 'include') : undefined;
  const items = entry?.value?.kind === 'list' ? entry.value.items : [];
  return items.flatMap((item) => (item.value?.kind === 'scalar' ? [item.value] : []));
}

/** The catalogue with the parts of all included files in it, later ones over earlier ones. */
export function withIncludes(
  context: Context,
  includes: readonly (Ref & { readonly path: string })[],
  source: IncludeSource | undefined,
): Catalogue {
  const reader = new Reader(context, source);
  for (const { name, span, path } of includes) reader.read(name, name, { path, span }, 1);
  return reader.catalogue;
}

class Reader {
  catalogue: Catalogue;
  readonly #read = new Set<string>();

  constructor(
    private readonly context: Context,
    private readonly source: IncludeSource | undefined,
  ) {
    this.catalogue = context.catalogue;
  }

  /** `written` as it stands in the file that names it, `path` relative to the board. */
  read(written: string, path: string, place: Pick<Slot, 'path' | 'span'>, depth: number): void {
    const normal = joined('', path);
    if (this.#read.has(normal)) return;
    this.#read.add(normal);
    const found = this.#textOf(written, normal, depth);
    if (typeof found !== 'string') {
      const message = `\`${path}\` is not included: ${found.problem}.`;
      report(this.context, 'include-failed', place, message, {}, found.severity ?? 'error');
      return;
    }
    const { root, findings, catalogue } = this.#parts(stripBom(found));
    for (const item of listed(root))
      this.read(item.text.trim(), joined(normal, item.text.trim()), place, depth + 1);
    this.catalogue = catalogue();
    const first = findings.find(({ severity }) => severity !== 'information');
    if (!first) return;
    const { line } = lineIndex(stripBom(found)).position(first.span.start);
    const rest = findings.filter(({ severity }) => severity !== 'information').length - 1;
    const more = rest > 0 ? ` (and ${rest} more)` : '';
    report(
      this.context,
      'include-failed',
      place,
      `\`${normal}\`, line ${line}: ${first.message}${more}`,
      {},
      first.severity,
    );
  }

  #textOf(
    written: string,
    path: string,
    depth: number,
  ): string | (IncludeProblem & { readonly severity?: 'warning' }) {
    const problem = pathFault(written);
    if (problem !== undefined) return { problem };
    if (depth > deepest) return { problem: `files include each other more than ${deepest} deep` };
    return this.source?.(path) ?? { problem: 'nobody reads files here', severity: 'warning' };
  }

  /** Its `parts`, read when `catalogue` is called: what it includes itself lies beneath them. */
  #parts(text: string): { root: Node | undefined; findings: Finding[]; catalogue: () => Catalogue } {
    const { root, issues } = parseText(text);
    const findings: Finding[] = issues.map(({ kind, span, message }) => ({
      code: 'syntax',
      severity: kind === 'warning' ? 'warning' : 'error',
      at: '',
      span,
      message,
    }));
    const catalogue = () => {
      const context: Context = {
        ...this.context,
        ...namesOf(root),
        text,
        catalogue: this.catalogue,
        partPlaces: new Map(),
        findings,
        quantities: [],
        references: [],
        said: new Set(),
      };
      if (root && root.kind !== 'map') {
        const message = 'A file with shared parts is a map with the key `parts`.';
        report(context, 'syntax', { path: '', span: root.span }, message);
        return this.catalogue;
      }
      for (const { key } of root?.entries ?? [])
        if (key.text !== 'parts' && key.text !== 'include')
          report(
            context,
            'unknown-key',
            { path: key.text, span: key.span },
            `\`${key.text}\` has no effect here: only \`parts\` and \`include\` are shared.`,
            {},
            'warning',
          );
      const entry = root?.entries.find(({ key }) => key.text === 'parts');
      if (!entry?.value) return this.catalogue;
      const row: Row = boardShape.keys.parts;
      const slot = {
        context,
        node: entry.value,
        row,
        path: 'parts',
        span: entry.value.span,
        keySpan: entry.key.span,
      };
      return readParts(context, slot).catalogue;
    };
    return { root, findings, catalogue };
  }
}
