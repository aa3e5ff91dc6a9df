/**
 * "Yield of this board": the command answers with what the core computes, and opens it as a document of its own.
 */
import * as vscode from 'vscode';
import { analyse, type YieldResult, yieldMarkdown, yieldRun } from '../../../core/index';
import { equal, ok } from '../expect';
import { test } from '../runner';
import { closeEditor, openFixture } from '../workspace';

const command = 'railLedger.runYield';

export function yieldTests(): void {
  test('a Monte Carlo run answers with the result of the core and shows it as Markdown', async () => {
    const { document } = await openFixture('rails.yaml');
    const before = document.getText();
    const run = yieldRun(analyse(before, { file: 'rails.yaml' }), { samples: 20, seed: 3 });
    let step = run.next();
    while (!step.done) step = run.next();
    const expected: YieldResult = step.value;

    const uri = document.uri.toString();
    const answer = await vscode.commands.executeCommand<YieldResult>(command, { uri, samples: 20, seed: 3 });
    equal(answer, expected, 'the command answers with the result');
    const shown = vscode.window.activeTextEditor?.document;
    equal(shown?.languageId, 'markdown', 'language of the document that is shown');
    equal(shown?.getText(), yieldMarkdown(expected), 'text of the document that is shown');
    equal(document.getText(), before, 'the board is untouched');
    await vscode.commands.executeCommand('workbench.action.revertAndCloseActiveEditor');
    await closeEditor();
  });

  test('asked only for an answer, it opens nothing', async () => {
    const { document } = await openFixture('rails.yaml');
    const answer = await vscode.commands.executeCommand<YieldResult>(command, { samples: 5, open: false });
    ok(answer?.samples === 5 && answer.rails.length > 0, `a result: ${JSON.stringify(answer)}`);
    equal(
      vscode.window.activeTextEditor?.document.uri.toString(),
      document.uri.toString(),
      'the active document',
    );
    await closeEditor();
  });
}
