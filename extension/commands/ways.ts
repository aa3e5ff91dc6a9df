/**
 * "Ways to make this rail": from what the rail needs to a handful of different pumps, each with its parts, as a list; the
 * chosen one is shown as a comparison or written as one change.
 */
import * as vscode from 'vscode';
import type { SizeChoice, SizeResult } from '../../core/index';
import type { Analyses, Core } from '../analyses';
import { toWorkspaceEdit } from '../convert';
import { findDocument } from './find-document';
import { inSlices } from './in-slices';

export interface WaysOptions {
  /** The document; the active one if left out. */
  readonly uri?: string;
  /** Writes this one without asking; -1 only answers; asks the user if left out. */
  readonly choice?: number;
}

const title = 'Ways to make this rail';

/** The command's body: a rail by name, by the cursor, or from a list. Answers with all ways. */
export function waysHandler(analyses: Analyses) {
  return async (rail?: unknown, options: WaysOptions = {}): Promise<SizeResult | undefined> => {
    const document = await findDocument(options.uri);
    if (document === undefined) {
      tell('Open a rails.yaml first: its rails are made there.');
      return undefined;
    }
    const analysis = await analyses.of(document);
    if (analysis === undefined) return undefined;
    const core = await analyses.loadCore();
    const editor = vscode.window.activeTextEditor;
    const here =
      editor?.document === document
        ? core.railAt(analysis, document.offsetAt(editor.selection.active))
        : undefined;
    const name =
      typeof rail === 'string' ? rail : (here ?? (await pickName([...analysis.board.rails.keys()])));
    if (name === undefined) return undefined;
    const result = await inSlices(title, core.sizeRun(analysis, name), ({ done, of }) => ({
      message: `${done} of ${of} ways`,
      share: done / of,
    }));
    if (result === undefined || options.choice === -1) return result;
    if (result.choices.length === 0) {
      tell(`${name}: ${result.because.join(' ')}`);
      return result;
    }
    const chosen =
      options.choice === undefined
        ? await pickWay(core, document, analysis.text, result)
        : result.choices[options.choice];
    if (chosen) await write(document, analysis.text, chosen);
    return result;
  };
}

async function pickName(names: readonly string[]): Promise<string | undefined> {
  return names.length > 1
    ? vscode.window.showQuickPick([...names], { title, placeHolder: 'Which rail?' })
    : names[0];
}

const compare: vscode.QuickInputButton = {
  iconPath: new vscode.ThemeIcon('diff'),
  tooltip: 'Compare with the file',
};

interface Item extends vscode.QuickPickItem {
  readonly choice: SizeChoice;
}

function pickWay(
  core: Core,
  document: vscode.TextDocument,
  text: string,
  { rail, choices }: SizeResult,
): Promise<SizeChoice | undefined> {
  const pick = vscode.window.createQuickPick<Item>();
  pick.title = `${title}: ${rail}`;
  pick.placeholder = 'Enter writes it as one change; undo takes it back';
  pick.matchOnDetail = true;
  pick.ignoreFocusOut = true;
  pick.items = choices.map((choice) => ({
    label: plain(choice.title),
    description: choice.best.join(', '),
    detail: plain(
      `${figures(choice)} · ${choice.parts.map(({ count, part }) => `${count} × ${part}`).join(', ')} · ${choice.limit}`,
    ),
    buttons: [compare],
    choice,
  }));
  return new Promise((resolve) => {
    pick.onDidTriggerItemButton(({ item }) => void showComparison(core, document, text, rail, item.choice));
    pick.onDidAccept(() => {
      resolve(pick.activeItems[0]?.choice);
      pick.hide();
    });
    pick.onDidHide(() => {
      resolve(undefined);
      pick.dispose();
    });
    pick.show();
  });
}

function figures({ voltage, ripple, efficiency, pins }: SizeChoice): string {
  const volts = `${voltage.min.toFixed(2)} to ${voltage.max.toFixed(2)} V`;
  const share = efficiency === null ? [] : [`${Math.round(100 * efficiency)} % efficient`];
  const most = Math.max(0, ...pins.map(({ rms }) => rms ?? 0));
  return [
    volts,
    `ripple ${(1e3 * ripple).toFixed(1)} mV`,
    ...share,
    ...(most > 0 ? [`pin ${(1e3 * most).toFixed(1)} mA`] : []),
  ].join(' · ');
}

async function showComparison(
  core: Core,
  document: vscode.TextDocument,
  text: string,
  rail: string,
  { edits }: SizeChoice,
): Promise<void> {
  const content = core.applyEdits(text, edits);
  const proposed = await vscode.workspace.openTextDocument({ language: document.languageId, content });
  await vscode.commands.executeCommand('vscode.diff', document.uri, proposed.uri, `${rail} as it would be`, {
    preview: true,
  });
}

/** The spans of the edits hold for the text that was looked at, and for no other. */
async function write(
  document: vscode.TextDocument,
  text: string,
  { edits, title: way }: SizeChoice,
): Promise<void> {
  const stale = document.getText() !== text;
  const written = !stale && (await vscode.workspace.applyEdit(toWorkspaceEdit(document, edits)));
  if (written) vscode.window.setStatusBarMessage(`Written: ${way}`, 6000);
  else tell(stale ? 'Nothing was written: the file changed meanwhile.' : 'The editor refused the change.');
}

function tell(message: string): void {
  void vscode.window.showInformationMessage(message);
}

/** A label may show an icon; words from the file must not. */
function plain(text: string): string {
  return text.replace(/\$\(/g, '$ (');
}
