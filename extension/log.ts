/**
 * The log channel: the only place where the extension speaks unasked.
 */
import * as vscode from 'vscode';

export type Log = vscode.LogOutputChannel;

export function createLog(): Log {
  return vscode.window.createOutputChannel('Rail Ledger', { log: true });
}

/** The whole story of a fault, for the log. */
export function describe(error: unknown): string {
  return error instanceof Error ? (error.stack ?? error.message) : String(error);
}
