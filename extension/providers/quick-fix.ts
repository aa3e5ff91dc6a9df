/**
 * Quick fixes: the cures that findings carry, offered where the finding is drawn. They come from the same analysis
 * as the squiggle, so that they never disagree with it.
 */
import * as vscode from 'vscode';
import type { Analyses } from '../analyses';
import { toRange, toWorkspaceEdit } from '../convert';

export const quickFixKinds = [vscode.CodeActionKind.QuickFix];

export function quickFixProvider(analyses: Analyses): vscode.CodeActionProvider {
  return {
    async provideCodeActions(document, range, context, cancellation) {
      const analysis = await analyses.of(document);
      if (analysis === undefined || cancellation.isCancellationRequested) return [];
      return analysis.findings.flatMap((finding) => {
        const place = toRange(document, finding.span);
        if (finding.fixes === undefined || place.intersection(range) === undefined) return [];
        const diagnostics = context.diagnostics.filter(
          (shown) => codeOf(shown) === finding.code && shown.range.isEqual(place),
        );
        return finding.fixes.map((fix) => {
          const action = new vscode.CodeAction(fix.title, vscode.CodeActionKind.QuickFix);
          action.edit = toWorkspaceEdit(document, fix.edits);
          action.isPreferred = fix.preferred;
          action.diagnostics = diagnostics;
          return action;
        });
      });
    },
  };
}

/** The code of one of our diagnostics, whose page stands beside it. */
function codeOf({ code }: vscode.Diagnostic): string | number | undefined {
  return typeof code === 'object' ? code.value : code;
}
