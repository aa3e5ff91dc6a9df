/**
 * The board that a command is about.
 */
import * as vscode from 'vscode';
import { isOurs } from '../files';

/** The document named, or the active one; nothing when it is no board. */
export async function findDocument(uri: string | undefined): Promise<vscode.TextDocument | undefined> {
  if (uri !== undefined) {
    const document = await vscode.workspace.openTextDocument(vscode.Uri.parse(uri));
    return isOurs(document) ? document : undefined;
  }
  const active = vscode.window.activeTextEditor?.document;
  return active !== undefined && isOurs(active) ? active : undefined;
}
