/**
 * "Size this rail": shows the smallest capacitors with which a pump rail meets its needs and, when told so,
 * writes them into the file as one change. When nothing meets the needs, it says which limit stops it.
 */
import * as vscode from 'vscode';
import type { Sizing } from '../../core/index';
import type { Analyses } from '../analyses';
import { toRange, toWorkspaceEdit } from '../convert';
import { isOurs } from '../files';
import { confirmSizing, pickRail } from './size-rail-pick';

export interface SizeRailOptions {
  /** The document; the active one if left out. */
  readonly uri?: string;
  /** `true` writes without asking, `false` only answers; asks the user if left out. */
  readonly apply?: boolean;
}

/** The command's body: a rail by name, or by the cursor, or picked from a list. Answers with the outcome. */
export function sizeRailHandler(analyses: Analyses, showLog: () => void, log: (line: string) => void) {
  return async (rail?: unknown, given?: SizeRailOptions): Promise<Sizing | undefined> => {
    const options = given ?? {};
    const document = await findDocument(options.uri);
    if (document === undefined) {
      void vscode.window.showInformationMessage('Open a rails.yaml first: its rails are sized there.');
      return undefined;
    }
    const name = typeof rail === 'string' ? rail : await railToSize(analyses, document);
    if (name === undefined) return undefined;
    const sizing = await propose(analyses, document, name);
    if (sizing === undefined || options.apply === false) return sizing?.sizing;

    for (const line of [headline(sizing.sizing), ...sizing.sizing.details]) log(`${name}: ${line}`);
    if (!sizing.sizing.ok) {
      if (options.apply === undefined) void tellWhy(sizing.sizing, showLog);
      return sizing.sizing;
    }
    if (sizing.sizing.edits.length === 0) {
      if (options.apply === undefined)
        void vscode.window.showInformationMessage(`${name}: ${sizing.sizing.summary}`);
      return sizing.sizing;
    }
    if (options.apply === undefined) {
      const first = sizing.sizing.edits[0]!;
      vscode.window.visibleTextEditors
        .find((editor) => editor.document === document)
        ?.revealRange(toRange(document, first.span), vscode.TextEditorRevealType.InCenterIfOutsideViewport);
      if (!(await confirmSizing(sizing.sizing))) return sizing.sizing;
    }
    await write(document, sizing);
    return sizing.sizing;
  };
}

interface Proposal {
  readonly sizing: Sizing;
  readonly version: number;
}

async function propose(
  analyses: Analyses,
  document: vscode.TextDocument,
  rail: string,
): Promise<Proposal | undefined> {
  const analysis = await analyses.of(document);
  if (analysis === undefined) return undefined;
  const { version } = document;
  const core = await analyses.loadCore();
  return { sizing: core.sizeRail(analysis, rail), version };
}

async function write(document: vscode.TextDocument, { sizing, version }: Proposal): Promise<void> {
  if (!sizing.ok) return;
  // The spans of the edits hold for the text that was sized, and for no other.
  const stale = document.version !== version;
  const written = !stale && (await vscode.workspace.applyEdit(toWorkspaceEdit(document, sizing.edits)));
  if (written) vscode.window.setStatusBarMessage(`${sizing.rail}: ${sizing.summary}`, 6000);
  else
    void vscode.window.showInformationMessage(
      `${sizing.rail} was not changed: ${stale ? 'the file changed meanwhile' : 'the editor refused the change'}.`,
    );
}

async function findDocument(uri: string | undefined): Promise<vscode.TextDocument | undefined> {
  if (uri !== undefined) {
    const document = await vscode.workspace.openTextDocument(vscode.Uri.parse(uri));
    return isOurs(document) ? document : undefined;
  }
  const active = vscode.window.activeTextEditor?.document;
  return active !== undefined && isOurs(active) ? active : undefined;
}

async function railToSize(analyses: Analyses, document: vscode.TextDocument): Promise<string | undefined> {
  const analysis = await analyses.of(document);
  if (analysis === undefined) return undefined;
  const core = await analyses.loadCore();
  const rails = core.pumpRails(analysis);
  const editor = vscode.window.activeTextEditor;
  if (editor?.document === document) {
    const here = core.railAt(analysis, document.offsetAt(editor.selection.active));
    if (rails.some((rail) => rail.name === here)) return here;
  }
  if (rails.length === 0)
    void vscode.window.showInformationMessage(
      'This board has no rail that a charge pump feeds, so there is nothing to size.',
    );
  return rails.length > 1 ? pickRail(rails) : rails[0]?.name;
}

async function tellWhy(sizing: Sizing & { ok: false }, showLog: () => void): Promise<void> {
  const more = sizing.details.length > 0 ? ['Show details'] : [];
  const answer = await vscode.window.showInformationMessage(`${sizing.rail}: ${sizing.reason}`, ...more);
  if (answer !== undefined) showLog();
}

function headline(sizing: Sizing): string {
  return sizing.ok ? sizing.summary : sizing.reason;
}
