/**
 * Quick fixes: the cures that findings carry, offered where the finding is drawn. They come from the same analysis
 * as the squiggle, so that they never disagree with it.
 */
import * as vscode from 'vscode';
import type { Finding } from '../../core/index';
import type { Analyses } from '../analyses';
import { waysCommand } from '../commands/names';
import { toRange, toWorkspaceEdit } from '../convert';

/** Findings that another pump may cure. */
const sizable: ReadonlySet<string> = new Set(['rail-low', 'rail-high', 'ripple-high', 'rail-stalls']);

export const quickFixKinds = [vscode.CodeActionKind.QuickFix];

export function quickFixProvider(analyses: Analyses): vscode.CodeActionProvider {
  return {
    async provideCodeActions(document, range, context, cancellation) {
      const analysis = await analyses.of(document);
      if (analysis === undefined || cancellation.isCancellationRequested) return [];
      return analysis.findings.flatMap((finding) => {
        const place = toRange(document, finding.span);
        if (place.intersection(range) === undefined) return [];
        const diagnostics = context.diagnostics.filter(
          (shown) => codeOf(shown) === finding.code && shown.range.isEqual(place),
        );
        const written = (finding.fixes ?? []).map((fix) => {
          const action = new vscode.CodeAction(fix.title, vscode.CodeActionKind.QuickFix);
          action.edit = toWorkspaceEdit(document, fix.edits);
          action.isPreferred = fix.preferred;
          action.diagnostics = diagnostics;
          return action;
        });
        return [...written, ...waysFor(document, finding, diagnostics)];
      });
    },
  };
}

/** The code of one of our diagnostics, whose page stands beside it. */
function codeOf({ code }: vscode.Diagnostic): string | number | undefined {
  return typeof code === 'object' ? code.value : code;
}

/** The list of ways to make the rail that the finding is about. */
function waysFor(
  document: vscode.TextDocument,
  { code, at }: Finding,
  diagnostics: vscode.Diagnostic[],
): readonly vscode.CodeAction[] {
  const rail = /^rails\.([^.]+)/.exec(at)?.[1];
  if (!sizable.has(code) || rail === undefined) return [];
  const title = 'Ways to make this rail';
  const action = new vscode.CodeAction(title, vscode.CodeActionKind.QuickFix);
  action.command = { title, command: waysCommand, arguments: [rail, { uri: document.uri.toString() }] };
  action.diagnostics = diagnostics;
  return [action];
}
