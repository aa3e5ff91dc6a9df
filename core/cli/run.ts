/**
 * The command line as a function from arguments to an exit code: 0 clean, 1 findings of severity error or a need that
 * a sample missed, 2 wrong use or a file that cannot be read. Reports go to standard output, everything else to standard error.
 */
import { type Analysis, ledgerText, toolName, toolVersion } from '../index';
import { analyseSource } from './analyse-source';
import { type CheckRequest, readArguments } from './arguments';
import { useColour } from './colour';
import { explain } from './explain';
import { boardFileName, findBoard, readSource } from './files';
import { helpText } from './help';
import type { Io } from './io';
import { complain, type ExitCode, usualWidth } from './output';
import { size } from './size';
import { runYield } from './yield';

export async function run(args: readonly string[], io: Io): Promise<ExitCode> {
  const request = readArguments(args);
  switch (request.command) {
    case 'help':
      io.out(helpText);
      return 0;
    case 'version':
      io.out(`${toolName} ${toolVersion}\n`);
      return 0;
    case 'wrong':
      return complain(io, `${request.because}\nTry rail-ledger --help.`);
    case 'check':
      return check(request, io);
    case 'yield':
      return runYield(request, io);
    case 'size':
      return size(request, io);
    case 'explain':
      return explain(request, io);
  }
}

async function check(request: CheckRequest, io: Io): Promise<ExitCode> {
  const files = request.files.length > 0 ? request.files : await foundFiles(io);
  if (files.length === 0)
    return complain(io, `There is no ${boardFileName} in this folder or above it. Name a file to check.`);
  const analyses: Analysis[] = [];
  let unreadable = false;
  for (const file of files) {
    const source = await readSource(file, request.stdinName, io);
    if ('problem' in source) {
      unreadable = true;
      complain(io, `${source.name} cannot be read: ${source.problem}.`);
    } else analyses.push(await analyseSource(source, io));
  }
  print(analyses, files.length, request, io);
  if (unreadable) return 2;
  return analyses.some(({ findings }) => findings.some(({ severity }) => severity === 'error')) ? 1 : 0;
}

async function foundFiles(io: Io): Promise<readonly string[]> {
  const found = await findBoard(io);
  return found === undefined ? [] : [found];
}

function print(analyses: readonly Analysis[], asked: number, request: CheckRequest, io: Io): void {
  if (analyses.length === 0) return;
  if (request.format === 'json') {
    const reports = analyses.map(({ report }) => report);
    io.out(`${JSON.stringify(asked === 1 ? reports[0] : reports, null, 2)}\n`);
    return;
  }
  const colour = useColour(request.color, io);
  const width = io.width ?? usualWidth;
  io.out(analyses.map((analysis) => ledgerText(analysis, { colour, width })).join('\n'));
}
