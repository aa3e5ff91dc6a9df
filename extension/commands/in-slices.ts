/**
 * A long computation in short slices with its progress in a notification that can stop it: the user asked for it, and the
 * editor answers meanwhile.
 */
import * as vscode from 'vscode';

/** Time after which the editor gets its turn, ms. */
const slice = 20;

/** The result; nothing when the user stopped it. */
export function inSlices<Step, Result>(
  title: string,
  run: Generator<Step, Result, void>,
  words: (step: Step) => { readonly message: string; readonly share: number },
): Thenable<Result | undefined> {
  return vscode.window.withProgress(
    { location: vscode.ProgressLocation.Notification, title, cancellable: true },
    async (progress, token) => {
      let shown = 0;
      let end = performance.now() + slice;
      while (!token.isCancellationRequested) {
        const step = run.next();
        if (step.done) return step.value;
        if (performance.now() < end) continue;
        const { message, share } = words(step.value);
        const percent = 100 * share;
        progress.report({ message, increment: percent - shown });
        shown = percent;
        await pause();
        end = performance.now() + slice;
      }
      return undefined;
    },
  );
}

function pause(): Promise<void> {
  return new Promise((resolve) => {
    setTimeout(resolve, 0);
  });
}
