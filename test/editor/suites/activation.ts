/**
 * The extension is for boards: another YAML file gets nothing, and does not even make it load the core.
 */
import * as vscode from 'vscode';
import { equal, eventually, ok, pause } from '../expect';
import { test } from '../runner';
import { closeEditor, type ExtensionApi, extensionId, openFixture, ourDiagnostics } from '../workspace';

export function activationTests(): void {
  test('a YAML file that is no board gets no findings, no hover, and the core is not loaded', async () => {
    const extension = vscode.extensions.getExtension<ExtensionApi>(extensionId);
    ok(extension, 'the extension is installed');
    const editor = await openFixture('plain.yaml');
    equal(editor.document.languageId, 'yaml', 'language');
    await eventually(() => extension.isActive, 'the extension is active once YAML is open');
    // Longer than the pause after typing, so that a finding would have had time to come.
    await pause(1000);
    equal(ourDiagnostics(editor.document.uri).length, 0, 'findings');
    const hovers = await vscode.commands.executeCommand<vscode.Hover[]>(
      'vscode.executeHoverProvider',
      editor.document.uri,
      new vscode.Position(3, 3),
    );
    equal(hovers.length, 0, 'hovers');
    equal(extension.exports.coreLoaded(), false, 'core loaded');
    await closeEditor();
  });

  test('the first board loads the core; its language stays yaml', async () => {
    const extension = vscode.extensions.getExtension<ExtensionApi>(extensionId);
    const editor = await openFixture('rails.yaml');
    equal(editor.document.languageId, 'yaml', 'language');
    await eventually(() => extension?.exports.coreLoaded() === true, 'the core is loaded');
    await closeEditor();
  });
}
