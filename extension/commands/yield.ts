/**
 * "Yield of this board": a Monte Carlo run with its progress in a notification that can stop it, and the result as
 * a document beside the board. Runs in short slices, so that the editor answers meanwhile.
 */
import * as vscode from 'vscode';
import type { YieldResult } from '../../core/index';
import type { Analyses, Core } from '../analyses';
import { findDocument } from './find-document';
import { inSlices } from './in-slices';

export interface YieldCommandOptions {
  /** The document; the active one if left out. */
  readonly uri?: string;
  /** Asks the user if left out. */
  readonly samples?: number;
  readonly seed?: number;
  /** `false` only answers; the result is opened if left out. */
  readonly open?: boolean;
}

/** The command's body. Answers with the result; with nothing when it was stopped. */
export function yieldHandler(analyses: Analyses) {
  return async (options: YieldCommandOptions = {}): Promise<YieldResult | undefined> => {
    const document = await findDocument(options.uri);
    if (document === undefined) {
      void vscode.window.showInformationMessage('Open a rails.yaml first: its yield is computed there.');
      return undefined;
    }
    const core = await analyses.loadCore();
    const samples = options.samples ?? (await askSamples(core));
    const analysis = samples === undefined ? undefined : await analyses.of(document);
    if (samples === undefined || analysis === undefined) return undefined;
    const run = core.yieldRun(analysis, { samples, seed: options.seed ?? 1 });
    const result = await inSlices('Yield of this board', run, ({ done, samples: all }) => ({
      message: `${done} of ${all} samples`,
      share: done / all,
    }));
    if (result !== undefined && options.open !== false) await show(core.yieldMarkdown(result));
    return result;
  };
}

async function askSamples({ usualSamples, mostSamples }: Core): Promise<number | undefined> {
  const wanted = `A whole number from 1 to ${mostSamples}`;
  const answer = await vscode.window.showInputBox({
    title: 'Yield of this board',
    prompt: 'How many boards to draw by lot within the tolerances of their parts',
    value: String(usualSamples),
    validateInput: (text) => {
      const count = Number(text);
      return /^\s*\d+\s*$/.test(text) && count >= 1 && count <= mostSamples ? undefined : wanted;
    },
  });
  return answer === undefined ? undefined : Number(answer);
}

async function show(content: string): Promise<void> {
  const document = await vscode.workspace.openTextDocument({ language: 'markdown', content });
  await vscode.window.showTextDocument(document, { viewColumn: vscode.ViewColumn.Beside, preview: false });
}
