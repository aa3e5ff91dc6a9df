/**
 * Included files are read through the editor, as they stand in it, and waivers take findings away.
 */
import * as vscode from 'vscode';
import { eventually, ok } from '../expect';
import { test } from '../runner';
import { closeEditor, codeOf, fixture, openFixture, ourDiagnostics, rangeOf, replace } from '../workspace';

export function includeTests(): void {
  test('parts of an included file count, and a waived finding is not shown', async () => {
    const { document } = await openFixture('shared.rails.yaml');
    await eventually(() => ourDiagnostics(document.uri).length > 0, 'judged');
    const codes = ourDiagnostics(document.uri).map(codeOf);
    for (const code of ['include-failed', 'unknown-name', 'rail-low', 'waiver-stale'])
      ok(!codes.includes(code), `${code} among ${codes.join(', ')}`);
    await closeEditor();
  });

  test('a change of an included file is seen in the board, without saving', async () => {
    const { document } = await openFixture('shared.rails.yaml');
    await eventually(() => ourDiagnostics(document.uri).length > 0, 'judged');
    const parts = await vscode.window.showTextDocument(fixture('parts/shared.yaml'), {
      viewColumn: vscode.ViewColumn.Beside,
    });
    await replace(parts, rangeOf(parts.document, 'ours'), 'theirs');
    await eventually(
      () => ourDiagnostics(document.uri).some((one) => codeOf(one) === 'unknown-name'),
      'the diode is gone',
    );
    await closeEditor();
    await eventually(
      () => !ourDiagnostics(document.uri).some((one) => codeOf(one) === 'unknown-name'),
      'the diode is back',
    );
    await closeEditor();
  });
}
