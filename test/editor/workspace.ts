/**
 * What the suites need of the editor: fixtures opened as a person opens them, edits, and the findings shown.
 */
import * as vscode from 'vscode';
import { eventually, ok } from './expect';

export const extensionId = 'rail-ledger.rail-ledger';

export interface ExtensionApi {
  readonly coreLoaded: () => boolean;
}

export function fixture(name: string): vscode.Uri {
  const folder = vscode.workspace.workspaceFolders?.[0];
  ok(folder, 'the fixtures are open as a folder');
  return vscode.Uri.joinPath(folder.uri, name);
}

/** Opened through the editor's own command, so that closing the tab really closes the document. */
export async function openFixture(name: string): Promise<vscode.TextEditor> {
  const uri = fixture(name);
  await vscode.commands.executeCommand('vscode.open', uri);
  return eventually(() => {
    const editor = vscode.window.activeTextEditor;
    return editor?.document.uri.toString() === uri.toString() ? editor : undefined;
  }, `${name} is the active editor`);
}

/** Throws unsaved changes away. */
export async function closeEditor(): Promise<void> {
  await vscode.commands.executeCommand('workbench.action.revertAndCloseActiveEditor');
}

export function ourDiagnostics(uri: vscode.Uri): readonly vscode.Diagnostic[] {
  return vscode.languages.getDiagnostics(uri).filter(({ source }) => source === 'Rail Ledger');
}

export function diagnosticAt(
  uri: vscode.Uri,
  code: string,
  range: vscode.Range,
): vscode.Diagnostic | undefined {
  return ourDiagnostics(uri).find((one) => codeOf(one) === code && one.range.isEqual(range));
}

/** Where a piece of the text stands; it must be there once. */
export function rangeOf(document: vscode.TextDocument, piece: string): vscode.Range {
  const text = document.getText();
  const start = text.indexOf(piece);
  ok(start >= 0 && text.indexOf(piece, start + 1) < 0, `"${piece}" stands in the file once`);
  return new vscode.Range(document.positionAt(start), document.positionAt(start + piece.length));
}

export async function replace(editor: vscode.TextEditor, range: vscode.Range, text: string): Promise<void> {
  ok(await editor.edit((edit) => edit.replace(range, text)), 'the edit was accepted');
}

/** The code, whose page stands beside it. */
export function codeOf({ code }: vscode.Diagnostic): string | number | undefined {
  return typeof code === 'object' ? code.value : code;
}
