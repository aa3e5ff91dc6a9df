/**
 * Keeps the squiggles of our documents in step with their text: at once on opening and saving, after a pause
 * while typing, and gone with the document. A result that comes late for its version is dropped.
 */
import * as vscode from 'vscode';
import type { Analyses } from './analyses';
import { toDiagnostic } from './convert';
import { isJudged, isPart } from './files';
import { concernsUs, settingsFor } from './settings';

export function registerDiagnostics(analyses: Analyses, pages: vscode.Uri): vscode.Disposable {
  const collection = vscode.languages.createDiagnosticCollection('rail-ledger');
  const pending = new Map<string, ReturnType<typeof setTimeout>>();

  function cancel(uri: vscode.Uri): void {
    clearTimeout(pending.get(uri.toString()));
    pending.delete(uri.toString());
  }

  async function judge(document: vscode.TextDocument): Promise<void> {
    cancel(document.uri);
    if (!isJudged(document)) return;
    const { version } = document;
    const analysis = await analyses.of(document);
    if (document.isClosed || document.version !== version) return;
    const findings = analysis?.findings ?? [];
    collection.set(
      document.uri,
      findings.map((finding) => toDiagnostic(document, finding, pages)),
    );
  }

  function judgeLater(document: vscode.TextDocument): void {
    if (!isJudged(document)) return;
    const { run, delayMs } = settingsFor(document.uri);
    cancel(document.uri);
    if (run === 'onSave') return;
    pending.set(
      document.uri.toString(),
      setTimeout(() => void judge(document), delayMs),
    );
  }

  function forget(uri: vscode.Uri): void {
    cancel(uri);
    collection.delete(uri);
  }

  function judgeAll(): void {
    for (const document of vscode.workspace.textDocuments) void judge(document);
  }

  /** Other YAML files may be parts that boards include: those boards alone are computed again. */
  function judgeIncluders(file: vscode.Uri): void {
    for (const document of vscode.workspace.textDocuments)
      if (analyses.forgetIncluder(document, file)) judgeLater(document);
  }

  const watcher = vscode.workspace.createFileSystemWatcher('**/*.{yaml,yml}');
  const subscriptions = [
    collection,
    watcher,
    watcher.onDidChange(judgeIncluders),
    watcher.onDidCreate(judgeIncluders),
    watcher.onDidDelete(judgeIncluders),
    vscode.workspace.onDidOpenTextDocument(judge),
    vscode.workspace.onDidSaveTextDocument(judge),
    vscode.workspace.onDidChangeTextDocument((event) => {
      // A change of the dirty flag alone arrives here too, with nothing changed.
      if (event.contentChanges.length === 0) return;
      if (isPart(event.document)) judgeIncluders(event.document.uri);
      else judgeLater(event.document);
    }),
    vscode.workspace.onDidCloseTextDocument((document) => forget(document.uri)),
    vscode.workspace.onDidDeleteFiles(({ files }) => {
      for (const file of files) forget(file);
    }),
    vscode.workspace.onDidRenameFiles(({ files }) => {
      for (const file of files) forget(file.oldUri);
    }),
    vscode.workspace.onDidChangeConfiguration((event) => {
      if (concernsUs(event)) judgeAll();
    }),
    new vscode.Disposable(() => pending.forEach(clearTimeout)),
  ];
  judgeAll();
  return vscode.Disposable.from(...subscriptions);
}
