/**
 * `rail-ledger size RAIL [FILE]`: ways to make a rail that meets its needs; `--write` puts the first one into the file.
 */
import { applyEdits, type SizeResult, sizeRun, sizeText, toolName, toolVersion } from '../index';
import { analyseSource } from './analyse-source';
import type { SizeRequest } from './arguments';
import { useColour } from './colour';
import { boardFileName, findBoard, readSource } from './files';
import type { Io } from './io';
import { complain, type ExitCode } from './output';

/** 0 when there is a way, 1 when there is none. */
export async function size(request: SizeRequest, io: Io): Promise<ExitCode> {
  const file = request.file ?? (await findBoard(io));
  if (file === undefined)
    return complain(io, `There is no ${boardFileName} in this folder or above it. Name a file.`);
  const source = await readSource(file, request.stdinName, io);
  if ('problem' in source) return complain(io, `${source.name} cannot be read: ${source.problem}.`);
  const analysis = await analyseSource(source, io);
  if (!analysis.board.rails.has(request.rail)) {
    const rails = [...analysis.board.rails.keys()].join(', ');
    return complain(io, `There is no rail ${request.rail}; there ${rails ? `are ${rails}` : 'are none'}.`);
  }
  const result = run(analysis, request.rail, io);
  if (request.format === 'json')
    io.out(`${JSON.stringify({ format: 1, tool: `${toolName} ${toolVersion}`, ...result }, null, 2)}\n`);
  else io.out(sizeText(result, { colour: useColour(request.color, io) }));
  const [first] = result.choices;
  if (!first) return 1;
  if (!request.write) return 0;
  if (file === '-') return complain(io, 'Standard input cannot be written to: name a file.');
  await io.writeFile(file, applyEdits(analysis.text, first.edits));
  io.err(`rail-ledger: ${file} now makes ${request.rail} with a ${first.title}.\n`);
  return 0;
}

function run(analysis: Parameters<typeof sizeRun>[0], rail: string, io: Io): SizeResult {
  const steps = sizeRun(analysis, rail);
  for (;;) {
    const step = steps.next();
    if (step.done) {
      if (io.errorIsTerminal) io.err('\r\u001b[K');
      return step.value;
    }
    if (io.errorIsTerminal) io.err(`\r${step.value.done} of ${step.value.of} ways`);
  }
}
