/**
 * Squiggles: where they stand, when they come, and that they go.
 */
import * as vscode from 'vscode';
import { analyse } from '../../../core/index';
import { equal, eventually, ok, pause } from '../expect';
import { test } from '../runner';
import {
  closeEditor,
  codeOf,
  diagnosticAt,
  fixture,
  openFixture,
  ourDiagnostics,
  rangeOf,
  replace,
} from '../workspace';

/** Writes `colour` as a key that the language does not know, and says where it stands then. */
async function misspell(editor: vscode.TextEditor): Promise<vscode.Range> {
  await replace(editor, new vscode.Range(1, 0, 1, 0), 'colour: red\n');
  return rangeOf(editor.document, 'colour');
}

export function diagnosticsTests(): void {
  test('every finding of the core is shown, with its code, its severity and exactly its range', async () => {
    const editor = await openFixture('rails.yaml');
    const { document } = editor;
    const expected = analyse(document.getText(), { file: 'rails.yaml' }).findings;
    ok(expected.length > 0, 'the fixture has findings');
    await eventually(
      () => ourDiagnostics(document.uri).length === expected.length,
      'as many as the core has',
    );
    const severities = ['error', 'warning', 'information'];
    const shown = ourDiagnostics(document.uri).map((one) => [
      codeOf(one),
      severities[one.severity],
      document.offsetAt(one.range.start),
      document.offsetAt(one.range.end),
      one.message,
    ]);
    equal(
      shown.sort(),
      expected.map((one) => [one.code, one.severity, one.span.start, one.span.end, one.message]).sort(),
      'findings',
    );
    await closeEditor();
  });

  test('the rail that misses its need is an error in the file', async () => {
    const { document } = await openFixture('rails.yaml');
    const finding = await eventually(
      () => ourDiagnostics(document.uri).find((one) => codeOf(one) === 'rail-low'),
      'rail-low is shown',
    );
    equal(finding.severity, vscode.DiagnosticSeverity.Error, 'severity');
    ok(/\d V\b/.test(finding.message), `the message says by how much: ${finding.message}`);
    await closeEditor();
  });

  test('a squiggle comes on the unknown key alone, and goes when the key is taken out', async () => {
    const editor = await openFixture('rails.yaml');
    const { uri } = editor.document;
    const range = await misspell(editor);
    await eventually(() => diagnosticAt(uri, 'unknown-key', range), 'unknown-key under the key');
    await replace(editor, new vscode.Range(1, 0, 2, 0), '');
    await eventually(
      () => !ourDiagnostics(uri).some((one) => codeOf(one) === 'unknown-key'),
      'unknown-key is gone once the key is',
    );
    await closeEditor();
  });

  test('typing without a pause is judged once, at its end', async () => {
    const editor = await openFixture('rails.yaml');
    const { uri } = editor.document;
    await eventually(() => ourDiagnostics(uri).length > 0, 'judged on opening');
    let changes = 0;
    const counting = vscode.languages.onDidChangeDiagnostics((event) => {
      if (event.uris.some((changed) => changed.toString() === uri.toString())) changes += 1;
    });
    for (const letter of 'colour: red') {
      await replace(
        editor,
        new vscode.Range(editor.document.lineCount, 0, editor.document.lineCount, 0),
        letter,
      );
    }
    await eventually(
      () => ourDiagnostics(uri).some((one) => codeOf(one) === 'unknown-key'),
      'judged at the end',
    );
    counting.dispose();
    equal(changes, 1, 'times judged');
    await closeEditor();
  });

  test('closing the document takes its findings away', async () => {
    const editor = await openFixture('night.rails.yaml');
    const { uri } = editor.document;
    const range = rangeOf(editor.document, 'colour');
    await eventually(
      () => diagnosticAt(uri, 'unknown-key', range),
      'a file named *.rails.yaml is judged too',
    );
    await closeEditor();
    await eventually(() => ourDiagnostics(uri).length === 0, 'findings are gone');
  });

  test('with "on save", typing changes nothing until the file is saved', async () => {
    const uri = fixture('rails.yaml');
    const settings = vscode.workspace.getConfiguration('railLedger', uri);
    await settings.update('run', 'onSave', vscode.ConfigurationTarget.Global);
    try {
      const editor = await openFixture('rails.yaml');
      await eventually(() => ourDiagnostics(uri).length > 0, 'judged on opening');
      const range = await misspell(editor);
      await pause(1000);
      equal(
        ourDiagnostics(uri).some((one) => codeOf(one) === 'unknown-key'),
        false,
        'judged while typing',
      );
      ok(await editor.document.save(), 'saved');
      await eventually(() => diagnosticAt(uri, 'unknown-key', range), 'judged on saving');
      await replace(editor, new vscode.Range(1, 0, 2, 0), '');
      ok(await editor.document.save(), 'saved as it was');
      await closeEditor();
    } finally {
      await settings.update('run', undefined, vscode.ConfigurationTarget.Global);
    }
  });
}
