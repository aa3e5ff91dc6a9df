/**
 * Reads the settings: the only file that knows their names. Each document has those of its own folder.
 */
import * as vscode from 'vscode';

const section = 'railLedger';

export interface Settings {
  readonly run: 'onType' | 'onSave';
  /** Pause after the last change before the board is computed again, in milliseconds. */
  readonly delayMs: number;
}

export function settingsFor(uri: vscode.Uri): Settings {
  const configuration = vscode.workspace.getConfiguration(section, uri);
  const delay = configuration.get<number>('delay', 250);
  return {
    run: configuration.get<string>('run') === 'onSave' ? 'onSave' : 'onType',
    delayMs: Number.isFinite(delay) ? Math.min(Math.max(delay, 0), 10_000) : 250,
  };
}

export function concernsUs(event: vscode.ConfigurationChangeEvent): boolean {
  return event.affectsConfiguration(section);
}
