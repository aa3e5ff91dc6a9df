/**
 * One analysis per document version, shared by all features. The core is loaded at the first of our documents
 * and not before: an editor full of other YAML files never pays for it.
 */
import type * as vscode from 'vscode';
import type { Analysis, PumpMemory } from '../core/index';
import { includedUri, readIncluded } from './included';
import { describe, type Log } from './log';

export type Core = typeof import('../core/index');

interface Kept {
  readonly version: number;
  readonly analysis: Analysis;
}

export class Analyses {
  private core: Promise<Core> | undefined;
  private readonly kept = new WeakMap<vscode.TextDocument, Kept>();
  private readonly memories = new WeakMap<vscode.TextDocument, PumpMemory>();

  /** Files that each board asked for. */
  private readonly included = new WeakMap<vscode.TextDocument, ReadonlySet<string>>();

  constructor(private readonly log: Log) {}

  /** True for a board that asked for that file; what was computed from its old text is forgotten. */
  forgetIncluder(document: vscode.TextDocument, file: vscode.Uri): boolean {
    const includes = this.included.get(document)?.has(file.toString()) === true;
    if (includes) this.kept.delete(document);
    return includes;
  }

  get coreLoaded(): boolean {
    return this.core !== undefined;
  }

  loadCore(): Promise<Core> {
    if (this.core === undefined) {
      const start = performance.now();
      this.core = import('../core/index');
      this.core.then(
        () => this.log.debug(`Core loaded in ${elapsed(start)}.`),
        (error) => this.log.error(`The core could not be loaded: ${describe(error)}`),
      );
    }
    return this.core;
  }

  /** The analysis of the document as it stands; nothing when the core itself failed (the log says why). */
  async of(document: vscode.TextDocument): Promise<Analysis | undefined> {
    try {
      const core = await this.loadCore();
      const kept = this.kept.get(document);
      if (kept?.version === document.version) return kept.analysis;
      const start = performance.now();
      const { version } = document;
      const text = document.getText();
      const included = new Set<string>();
      this.included.set(document, included);
      const include = await core.readIncludes(text, (path) => {
        included.add(includedUri(document, path).toString());
        return readIncluded(document, path);
      });
      const analysis = core.analyse(text, {
        file: fileName(document.uri),
        memory: this.memoryOf(document, core),
        include,
        today: new Date().toISOString().slice(0, 10),
      });
      this.kept.set(document, { version, analysis });
      this.log.debug(`${fileName(document.uri)}, version ${version}, computed in ${elapsed(start)}.`);
      return analysis;
    } catch (error) {
      this.log.error(`${document.uri.toString()} could not be computed: ${describe(error)}`);
      return undefined;
    }
  }

  /** Pumps of the versions before: typing recomputes only what it reaches. */
  private memoryOf(document: vscode.TextDocument, core: Core): PumpMemory {
    const known = this.memories.get(document);
    if (known) return known;
    const memory = core.newMemory();
    this.memories.set(document, memory);
    return memory;
  }
}

function fileName(uri: vscode.Uri): string {
  return uri.path.slice(uri.path.lastIndexOf('/') + 1);
}

function elapsed(start: number): string {
  return `${Math.round(performance.now() - start)} ms`;
}
