/**
 * A board with what it includes. Included files are read relative to the board's, and never from outside its workspace:
 * the nearest folder at or above the board that holds a `.git`, or the board's own.
 */
import { dirname, join, relative, resolve, sep } from 'node:path';
import { type Analysis, analyse, type IncludeProblem, readIncludes } from '../index';
import { reason } from './files';
import type { Io } from './io';

export async function analyseSource(
  source: { readonly name: string; readonly text: string },
  io: Io,
): Promise<Analysis> {
  const folder = dirname(resolve(io.cwd, source.name));
  let workspace: string | undefined;
  const include = await readIncludes(source.text, async (path): Promise<string | IncludeProblem> => {
    workspace ??= await workspaceOf(folder, io);
    const file = resolve(folder, path);
    if (!isInside(workspace, file)) return { problem: 'it lies outside the folder of the project' };
    try {
      return new TextDecoder('utf-8', { fatal: true }).decode(await io.readFile(file));
    } catch (error) {
      return { problem: reason(error) };
    }
  });
  return analyse(source.text, { file: source.name, include, today: io.today() });
}

async function workspaceOf(folder: string, io: Io): Promise<string> {
  for (let at = folder; ; at = dirname(at)) {
    // A folder of its own, or a file that points to one.
    for (const mark of [join(at, '.git', 'HEAD'), join(at, '.git')]) if (await io.isFile(mark)) return at;
    if (dirname(at) === at) return folder;
  }
}

function isInside(folder: string, file: string): boolean {
  const path = relative(folder, file);
  return path !== '' && path !== '..' && !path.startsWith(`..${sep}`) && !/^[a-z]:/i.test(path);
}
