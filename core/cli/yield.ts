/**
 * `rail-ledger yield`: a Monte Carlo run of one board. Progress goes to standard error, and only to a terminal.
 */
import { toolName, toolVersion, type YieldResult, yieldRun, yieldText } from '../index';
import { analyseSource } from './analyse-source';
import type { YieldRequest } from './arguments';
import { useColour } from './colour';
import { boardFileName, findBoard, readSource } from './files';
import type { Io } from './io';
import { complain, type ExitCode, usualWidth } from './output';

/** 0 when every sample met every need, 1 when not or when that is not known. */
export async function runYield(request: YieldRequest, io: Io): Promise<ExitCode> {
  const file = request.file ?? (await findBoard(io));
  if (file === undefined)
    return complain(io, `There is no ${boardFileName} in this folder or above it. Name a file to draw.`);
  const source = await readSource(file, request.stdinName, io);
  if ('problem' in source) return complain(io, `${source.name} cannot be read: ${source.problem}.`);
  const analysis = await analyseSource(source, io);
  const misread = analysis.board.reading.findings.filter(({ severity }) => severity === 'error').length;
  if (misread > 0)
    complain(
      io,
      `${source.name} has ${misread === 1 ? 'an error' : `${misread} errors`} that rail-ledger check shows; ` +
        'the yield is that of what could be read.',
    );
  const result = drawn(yieldRun(analysis, request), io);
  if (request.format === 'json')
    io.out(`${JSON.stringify({ format: 1, tool: `${toolName} ${toolVersion}`, ...result }, null, 2)}\n`);
  else io.out(yieldText(result, { colour: useColour(request.color, io), width: io.width ?? usualWidth }));
  const allMet = result.rails.length === 0 || result.outcome?.met === result.samples;
  return allMet && misread === 0 ? 0 : 1;
}

/** Runs to the end, and writes each percent over the one before. */
function drawn(run: ReturnType<typeof yieldRun>, io: Io): YieldResult {
  let shown = -1;
  for (;;) {
    const step = run.next();
    if (step.done) {
      if (shown >= 0) io.err('\r\u001b[K');
      return step.value;
    }
    const { done, samples } = step.value;
    const percent = Math.floor((100 * done) / samples);
    if (!io.errorIsTerminal || percent === shown) continue;
    shown = percent;
    io.err(`\r${done} of ${samples} samples (${percent} %)`);
  }
}
