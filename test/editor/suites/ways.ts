/**
 * "Ways to make this rail": the command answers with what the core finds and writes the chosen one as one change.
 */
import * as vscode from 'vscode';
import { analyse, applyEdits, type SizeResult, sizeRun } from '../../../core/index';
import { equal, eventually, ok } from '../expect';
import { test } from '../runner';
import { closeEditor, codeOf, openFixture, ourDiagnostics } from '../workspace';

const command = 'railLedger.waysToMake';

export function waysTests(): void {
  test('a rail without a pump gets one that meets its needs, and one undo takes it back', async () => {
    const { document } = await openFixture('wanted.rails.yaml');
    const before = document.getText();
    const run = sizeRun(analyse(before, { file: 'wanted.rails.yaml' }), 'up');
    let step = run.next();
    while (!step.done) step = run.next();
    const expected: SizeResult = step.value;
    ok(expected.choices.length > 0, 'the fixture can be made');

    const uri = document.uri.toString();
    const answer = await vscode.commands.executeCommand<SizeResult>(command, 'up', { uri, choice: 0 });
    equal(answer, expected, 'the command answers with the ways of the core');
    equal(document.getText(), applyEdits(before, expected.choices[0]!.edits), 'the file as proposed');
    await eventually(
      () => !ourDiagnostics(document.uri).some((one) => codeOf(one) === 'missing-key'),
      'the rail has an origin',
    );
    await vscode.commands.executeCommand('undo');
    equal(document.getText(), before, 'one undo');
    await closeEditor();
  });

  test('asked only for an answer, it writes nothing', async () => {
    const { document } = await openFixture('wanted.rails.yaml');
    const before = document.getText();
    const options = { uri: document.uri.toString(), choice: -1 };
    const answer = await vscode.commands.executeCommand<SizeResult>(command, 'up', options);
    ok((answer?.choices.length ?? 0) > 0, 'there are ways');
    equal(document.getText(), before, 'the file is untouched');
    await closeEditor();
  });
}
