/**
 * The two lists of "Size this rail": which rail, and whether to write the proposal.
 */
import * as vscode from 'vscode';
import type { PumpRail, Sizing, TextEdit } from '../../core/index';
import { toRange } from '../convert';

export async function pickRail(rails: readonly PumpRail[]): Promise<string | undefined> {
  const picked = await vscode.window.showQuickPick(
    rails.map(({ name, detail }) => ({ label: name, description: detail })),
    { title: 'Size this rail', placeHolder: 'Which rail?', matchOnDescription: true },
  );
  return picked?.label;
}

/** Shows the proposal with its reasons; true when the user wants it written. */
export function confirmSizing(
  document: vscode.TextDocument,
  sizing: Sizing & { ok: true },
): Promise<boolean> {
  const write = { label: '$(edit) Write it into the file', detail: sizing.summary };
  const leave = { label: '$(close) Leave the file as it is' };
  const pick = vscode.window.createQuickPick();
  pick.title = `Size this rail: ${sizing.rail}`;
  pick.placeholder = 'One change; undo takes it back';
  pick.items = [
    write,
    leave,
    ...section('Changes', changes(document, sizing.edits)),
    ...section('Why', sizing.details),
  ];
  return new Promise((resolve) => {
    pick.onDidAccept(() => {
      const [item] = pick.activeItems;
      // The reasons are there to be read; choosing one decides nothing.
      if (item !== write && item !== leave) return;
      resolve(item === write);
      pick.hide();
    });
    pick.onDidHide(() => {
      resolve(false);
      pick.dispose();
    });
    pick.show();
  });
}

/** Lines to read, under a heading; none without its lines. */
function section(heading: string, lines: readonly string[]): vscode.QuickPickItem[] {
  if (lines.length === 0) return [];
  return [
    { label: heading, kind: vscode.QuickPickItemKind.Separator },
    ...lines.map((line) => ({ label: plainLabel(line) })),
  ];
}

function changes(document: vscode.TextDocument, edits: readonly TextEdit[]): string[] {
  return edits.map(({ span, text }) => {
    const range = toRange(document, span);
    const before = document.getText(range);
    return `line ${range.start.line + 1}: ${before === '' ? 'adds' : `${before} →`} ${text.trim()}`;
  });
}

/** A label may show an icon; words from the file must not. */
function plainLabel(text: string): string {
  return text.replace(/\$\(/g, '$ (');
}
