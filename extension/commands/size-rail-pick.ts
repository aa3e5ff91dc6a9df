/**
 * The two lists of "Size this rail": which rail, and whether to write the proposal.
 */
import * as vscode from 'vscode';
import type { PumpRail, Sizing } from '../../core/index';

export async function pickRail(rails: readonly PumpRail[]): Promise<string | undefined> {
  const picked = await vscode.window.showQuickPick(
    rails.map(({ name, detail }) => ({ label: name, description: detail })),
    { title: 'Size this rail', placeHolder: 'Which rail?', matchOnDescription: true },
  );
  return picked?.label;
}

/** Shows the proposal with its reasons; true when the user wants it written. */
export function confirmSizing(sizing: Sizing & { ok: true }): Promise<boolean> {
  const write = { label: '$(edit) Write it into the file', detail: sizing.summary };
  const leave = { label: '$(close) Leave the file as it is' };
  const pick = vscode.window.createQuickPick();
  pick.title = `Size this rail: ${sizing.rail}`;
  pick.placeholder = 'One change; undo takes it back';
  pick.items = [
    write,
    leave,
    ...(sizing.details.length > 0 ? [{ label: 'Why', kind: vscode.QuickPickItemKind.Separator }] : []),
    ...sizing.details.map((line) => ({ label: plainLabel(line) })),
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

/** A label may show an icon; words from the file must not. */
function plainLabel(text: string): string {
  return text.replace(/\$\(/g, '$ (');
}
