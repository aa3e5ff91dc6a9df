/**
 * The extension's entry: registers features by file name and returns. Nothing is computed here; the core is
 * loaded when the first board opens.
 */
import * as vscode from 'vscode';
import { Analyses } from './analyses';
import { runYieldCommand, showLogCommand, sizeRailCommand, waysCommand } from './commands/names';
import { sizeRailHandler } from './commands/size-rail';
import { waysHandler } from './commands/ways';
import { yieldHandler } from './commands/yield';
import { registerDiagnostics } from './diagnostics';
import { selector } from './files';
import { createLog } from './log';
import { hoverProvider } from './providers/hover';
import { quickFixKinds, quickFixProvider } from './providers/quick-fix';

/** What other extensions (and the tests) may ask. */
export interface Api {
  /** False until a board has been opened in this window. */
  readonly coreLoaded: () => boolean;
}

export function activate(context: vscode.ExtensionContext): Api {
  const log = createLog();
  const analyses = new Analyses(log);
  const showLog = () => log.show();
  context.subscriptions.push(
    log,
    registerDiagnostics(analyses, vscode.Uri.joinPath(context.extensionUri, 'media', 'findings')),
    vscode.languages.registerHoverProvider(selector, hoverProvider(analyses)),
    vscode.languages.registerCodeActionsProvider(selector, quickFixProvider(analyses), {
      providedCodeActionKinds: quickFixKinds,
    }),
    vscode.commands.registerCommand(
      sizeRailCommand,
      sizeRailHandler(analyses, showLog, (line) => log.info(line)),
    ),
    vscode.commands.registerCommand(waysCommand, waysHandler(analyses)),
    vscode.commands.registerCommand(runYieldCommand, yieldHandler(analyses)),
    vscode.commands.registerCommand(showLogCommand, showLog),
  );
  return { coreLoaded: () => analyses.coreLoaded };
}
