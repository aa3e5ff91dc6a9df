/**
 * "Yield of this board": a Monte Carlo run with its progress in a notification that can stop it, and the result as
 * a document beside the board. Runs in short slices, so that the editor answers meanwhile.
 */
import * as vscode from 'vscode';
import type { YieldProgress, YieldResult } from '../../core/index';
import type { Analyses, Core } from '../analyses';
import { findDocument } from './find-document';

export interface YieldCommandOptions {
  /** The document; the active one if left out. */
  readonly uri?: string;
  /** Asks the user if left out. */
  readonly samples?: number;
  readonly seed?: number;
  /** `false` only answers; the result is opened if left out. */
  readonly open?: boolean;
}

/** Time after which the editor gets its turn, ms. */
const slice = 20;

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
    const result = await vscode.window.withProgress(
      { location: vscode.ProgressLocation.Notification, title: 'Yield of this board', cancellable: true },
      (progress, token) =>
        inSlices(core.yieldRun(analysis, { samples, seed: options.seed ?? 1 }), progress, token),
    );
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

async function inSlices(
  run: Generator<YieldProgress, YieldResult, void>,
  progress: vscode.Progress<{ message?: string; increment?: number }>,
  token: vscode.CancellationToken,
): Promise<YieldResult | undefined> {
  let shown = 0;
  let end = performance.now() + slice;
  while (!token.isCancellationRequested) {
    const step = run.next();
    if (step.done) return step.value;
    if (performance.now() < end) continue;
    const { done, samples } = step.value;
    const percent = (100 * done) / samples;
    progress.report({ message: `${done} of ${samples} samples`, increment: percent - shown });
    shown = percent;
    await pause();
    end = performance.now() + slice;
  }
  return undefined;
}

function pause(): Promise<void> {
  return new Promise((resolve) => {
    setTimeout(resolve, 0);
  });
}

async function show(content: string): Promise<void> {
  const document = await vscode.workspace.openTextDocument({ language: 'markdown', content });
  await vscode.window.showTextDocument(document, { viewColumn: vscode.ViewColumn.Beside, preview: false });
}
