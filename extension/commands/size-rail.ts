/**
 * "Size this rail": shows the smallest capacitors with which a pump rail meets its needs and, when told so,
 * writes them into the file as one change. When nothing meets the needs, it says which limit stops it.
 */
import * as vscode from 'vscode';
import type { Sizing } from '../../core/index';
import type { Analyses } from '../analyses';
import { toRange, toWorkspaceEdit } from '../convert';
import { findDocument } from './find-document';
import { confirmSizing, pickRail } from './size-rail-pick';

export interface SizeRailOptions {
  /** The document; the active one if left out. */
  readonly uri?: string;
  /** `true` writes without asking, `false` only answers; asks the user if left out. */
  readonly apply?: boolean;
}

/** The command's body: a rail by name, or by the cursor, or picked from a list. Answers with the outcome. */
export function sizeRailHandler(analyses: Analyses, showLog: () => void, log: (line: string) => void) {
  return async (rail?: unknown, options: SizeRailOptions = {}): Promise<Sizing | undefined> => {
    const document = await findDocument(options.uri);
    if (document === undefined) {
      tell('Open a rails.yaml first: its rails are sized there.');
      return undefined;
    }
    const name = typeof rail === 'string' ? rail : await railToSize(analyses, document);
    const analysis = name === undefined ? undefined : await analyses.of(document);
    if (name === undefined || analysis === undefined) return undefined;
    const core = await analyses.loadCore();
    const sizing = core.sizeRail(analysis, name);
    if (options.apply === false) return sizing;

    for (const line of [headline(sizing), ...sizing.details]) log(`${name}: ${line}`);
    if (options.apply === undefined && !(await agreed(document, sizing, showLog))) return sizing;
    if (sizing.ok && sizing.edits.length > 0) await write(document, analysis.text, sizing);
    return sizing;
  };
}

/** Shows the outcome to the user; true when there is something to write and it shall be written. */
async function agreed(document: vscode.TextDocument, sizing: Sizing, showLog: () => void): Promise<boolean> {
  const [first] = sizing.ok ? sizing.edits : [];
  if (!sizing.ok || first === undefined) {
    void tellOutcome(sizing, showLog);
    return false;
  }
  vscode.window.visibleTextEditors
    .find((editor) => editor.document === document)
    ?.revealRange(toRange(document, first.span), vscode.TextEditorRevealType.InCenterIfOutsideViewport);
  return confirmSizing(document, sizing);
}

/** The spans of the edits hold for the text that was sized, and for no other. */
async function write(
  document: vscode.TextDocument,
  sized: string,
  sizing: Sizing & { ok: true },
): Promise<void> {
  const stale = document.getText() !== sized;
  const written = !stale && (await vscode.workspace.applyEdit(toWorkspaceEdit(document, sizing.edits)));
  if (written) vscode.window.setStatusBarMessage(sizing.summary, 6000);
  else
    tell(
      `${sizing.rail} was not changed: ${stale ? 'the file changed meanwhile' : 'the editor refused the change'}.`,
    );
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
  if (rails.length === 0) tell('No rail of this board is fed by a charge pump, so there is nothing to size.');
  return rails.length > 1 ? pickRail(rails) : rails[0]?.name;
}

async function tellOutcome(sizing: Sizing, showLog: () => void): Promise<void> {
  const more = sizing.details.length > 0 ? ['Show details'] : [];
  if ((await vscode.window.showInformationMessage(headline(sizing), ...more)) !== undefined) showLog();
}

/** Only ever the answer to a command that the user gave. */
function tell(message: string): void {
  void vscode.window.showInformationMessage(message);
}

function headline(sizing: Sizing): string {
  return sizing.ok ? sizing.summary : sizing.reason;
}
