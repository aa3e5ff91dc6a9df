/**
 * "Size this rail": one change, in place, and one undo takes it back.
 */
import * as vscode from 'vscode';
import { analyse, applyEdits, type Sizing, sizeRail } from '../../../core/index';
import { equal, eventually, ok } from '../expect';
import { test } from '../runner';
import { closeEditor, codeOf, openFixture, ourDiagnostics } from '../workspace';

const command = 'railLedger.sizeRail';

export function sizeRailTests(): void {
  test('sizing writes what the core proposes, keeps the comments, meets the need, and one undo restores', async () => {
    const { document } = await openFixture('rails.yaml');
    const before = document.getText();
    const expected = sizeRail(analyse(before, { file: 'rails.yaml' }), 'vlamp');
    ok(expected.ok && expected.edits.length > 0, `the core has a proposal: ${JSON.stringify(expected)}`);

    const answer = await vscode.commands.executeCommand<Sizing>(command, 'vlamp', { apply: true });
    equal(answer, expected, 'the command answers with the proposal');
    const after = document.getText();
    equal(after, applyEdits(before, expected.edits), 'text');
    ok(after !== before, 'the text has changed');
    const comments = (text: string) => text.match(/#.*$/gm);
    equal(comments(after), comments(before), 'comments');
    await eventually(
      () => !ourDiagnostics(document.uri).some((one) => codeOf(one) === 'rail-low'),
      'the rail meets its need afterwards',
    );

    await vscode.commands.executeCommand('undo');
    await eventually(() => document.getText() === before, 'one undo brings the text back');
    await closeEditor();
  });

  test('asked only for an answer, it changes nothing', async () => {
    const { document } = await openFixture('rails.yaml');
    const before = document.getText();
    const answer = await vscode.commands.executeCommand<Sizing>(command, 'vlamp', { apply: false });
    equal(answer?.rail, 'vlamp', 'rail');
    equal(document.getText(), before, 'text');
    await closeEditor();
  });

  test('a rail that no pump feeds is answered with a reason', async () => {
    const { document } = await openFixture('rails.yaml');
    const answer = await vscode.commands.executeCommand<Sizing>(command, 'v3', { apply: true });
    ok(answer && !answer.ok && answer.reason.length > 0, `a reason: ${JSON.stringify(answer)}`);
    equal(document.isDirty, false, 'changed');
    await closeEditor();
  });
}
