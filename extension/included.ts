/**
 * Files that a board includes: read relative to it and only from its own workspace folder, or from its own folder where
 * it belongs to none. An open document counts as it stands in the editor.
 */
import * as vscode from 'vscode';
import type { IncludeProblem } from '../core/index';

/** Where the file of an include stands. */
export function includedUri(board: vscode.TextDocument, path: string): vscode.Uri {
  return vscode.Uri.joinPath(board.uri, '..', path);
}

export async function readIncluded(
  board: vscode.TextDocument,
  path: string,
): Promise<string | IncludeProblem> {
  if (board.isUntitled) return { problem: 'save this board first: the path is relative to its folder' };
  const folder = vscode.Uri.joinPath(board.uri, '..');
  const workspace = vscode.workspace.getWorkspaceFolder(board.uri)?.uri ?? folder;
  const file = includedUri(board, path);
  const inside = file.path.startsWith(workspace.path.endsWith('/') ? workspace.path : `${workspace.path}/`);
  if (!inside) return { problem: 'it lies outside the workspace folder' };
  const open = vscode.workspace.textDocuments.find(({ uri }) => uri.toString() === file.toString());
  if (open) return open.getText();
  try {
    const bytes = await vscode.workspace.fs.readFile(file);
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch (error) {
    return { problem: reason(error) };
  }
}

function reason(error: unknown): string {
  if (error instanceof vscode.FileSystemError) {
    if (error.code === 'FileNotFound') return 'there is no such file';
    if (error.code === 'FileIsADirectory') return 'it is a folder';
    if (error.code === 'NoPermissions') return 'it may not be read';
  }
  return error instanceof TypeError ? 'it is not UTF-8 text' : 'it cannot be read';
}
