/**
 * Which documents are ours: `rails.yaml` and `*.rails.yaml`, whose language stays `yaml` so that colouring,
 * formatting and other YAML tools keep working on them.
 */
import * as vscode from 'vscode';

/** Reading features work in every scheme, history views included. */
export const selector: vscode.DocumentSelector = { language: 'yaml', pattern: '**/{rails,*.rails}.yaml' };

export function isOurs(document: vscode.TextDocument): boolean {
  return vscode.languages.match(selector, document) > 0;
}

/** Any other YAML file: one that boards may include. */
export function isPart(document: vscode.TextDocument): boolean {
  return document.languageId === 'yaml' && !isOurs(document);
}

/** Only where one can write: the old side of a comparison must not double every problem. */
export function isJudged(document: vscode.TextDocument): boolean {
  const { scheme } = document.uri;
  const writable = scheme === 'untitled' || vscode.workspace.fs.isWritableFileSystem(scheme) === true;
  return writable && isOurs(document);
}
