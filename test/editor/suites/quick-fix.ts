/**
 * Quick fixes: what a finding carries is offered at its place, does what it says, and nothing is offered elsewhere.
 */
import * as vscode from 'vscode';
import { analyse, applyEdits } from '../../../core/index';
import { equal, ok } from '../expect';
import { test } from '../runner';
import { closeEditor, openFixture, rangeOf } from '../workspace';

async function fixesAt(uri: vscode.Uri, range: vscode.Range): Promise<vscode.CodeAction[]> {
  const kind = vscode.CodeActionKind.QuickFix.value;
  const all = await vscode.commands.executeCommand<vscode.CodeAction[]>(
    'vscode.executeCodeActionProvider',
    uri,
    range,
    kind,
  );
  return all.filter(({ edit }) => edit !== undefined);
}

export function quickFixTests(): void {
  test('a misspelt key is offered its right spelling there, and nowhere else', async () => {
    const { document } = await openFixture('night.rails.yaml');
    const text = document.getText();
    const finding = analyse(text, { file: 'night.rails.yaml' }).findings.find(({ fixes }) => fixes?.length);
    ok(finding?.fixes?.[0], 'the core has a fix for the misspelt key');
    const place = rangeOf(document, 'chps');
    const [fix] = await fixesAt(document.uri, place);
    ok(fix?.edit, 'the editor offers it');
    equal(fix.title, finding.fixes[0].title, 'title');
    ok(await vscode.workspace.applyEdit(fix.edit), 'the edit was accepted');
    equal(document.getText(), applyEdits(text, finding.fixes[0].edits), 'text');
    equal((await fixesAt(document.uri, new vscode.Range(0, 0, 0, 1))).length, 0, 'offers at the title');
    await closeEditor();
  });

  test('a rail that misses its need is offered the ways to make it', async () => {
    const { document } = await openFixture('rails.yaml');
    const all = await vscode.commands.executeCommand<vscode.CodeAction[]>(
      'vscode.executeCodeActionProvider',
      document.uri,
      rangeOf(document, '5.0..6.6 V'),
      vscode.CodeActionKind.QuickFix.value,
    );
    const ways = all.find(({ command }) => command?.command === 'railLedger.waysToMake');
    ok(ways, 'the action is offered');
    equal(ways.command?.arguments?.[0], 'vlamp', 'for that rail');
    await closeEditor();
  });
}
