/**
 * Core data to editor data, all of it: spans, findings and edits. Hover cards have their own file, `markdown.ts`.
 */
import * as vscode from 'vscode';
import type { Finding, Severity, Span, TextEdit, Theme } from '../core/index';

export const diagnosticSource = 'Rail Ledger';

const severities: Record<Severity, vscode.DiagnosticSeverity> = {
  error: vscode.DiagnosticSeverity.Error,
  warning: vscode.DiagnosticSeverity.Warning,
  information: vscode.DiagnosticSeverity.Information,
};

export function toRange(document: vscode.TextDocument, span: Span): vscode.Range {
  return new vscode.Range(document.positionAt(span.start), document.positionAt(span.end));
}

/** `pages`: the folder with a page for each code, which a click on the code opens. */
export function toDiagnostic(
  document: vscode.TextDocument,
  finding: Finding,
  pages: vscode.Uri,
): vscode.Diagnostic {
  const diagnostic = new vscode.Diagnostic(
    toRange(document, finding.span),
    finding.message,
    severities[finding.severity],
  );
  diagnostic.code = { value: finding.code, target: vscode.Uri.joinPath(pages, `${finding.code}.md`) };
  diagnostic.source = diagnosticSource;
  diagnostic.relatedInformation = finding.related?.map(
    ({ span, message }) =>
      new vscode.DiagnosticRelatedInformation(
        new vscode.Location(document.uri, toRange(document, span)),
        message,
      ),
  );
  if (finding.code === 'unused') diagnostic.tags = [vscode.DiagnosticTag.Unnecessary];
  return diagnostic;
}

/** All edits as one change, which one undo takes back. */
export function toWorkspaceEdit(
  document: vscode.TextDocument,
  edits: readonly TextEdit[],
): vscode.WorkspaceEdit {
  const change = new vscode.WorkspaceEdit();
  for (const { span, text } of edits) change.replace(document.uri, toRange(document, span), text);
  return change;
}

export function toTheme(kind: vscode.ColorThemeKind): Theme {
  switch (kind) {
    case vscode.ColorThemeKind.Light:
      return 'light';
    case vscode.ColorThemeKind.HighContrast:
      return 'high-contrast';
    case vscode.ColorThemeKind.HighContrastLight:
      return 'high-contrast-light';
    default:
      return 'dark';
  }
}
