/**
 * Paths of files relative to another, written with slashes, without touching any file system.
 */

/** Why a path is not one relative to its file; undefined when it is. */
export function pathFault(path: string): string | undefined {
  if (path.trim() === '') return 'the name is empty';
  if (/^[a-z][a-z0-9+.-]+:/i.test(path)) return 'it is an address, not a file beside this one';
  if (/^[a-z]:/i.test(path) || path.startsWith('/')) return 'it is absolute; write it relative to this file';
  if (path.includes('\\')) return 'write the path with slashes';
  if (path.startsWith('~')) return 'it leads to a home folder; write it relative to this file';
  return undefined;
}

/** `path` as seen from the folder of `from`, as short as it can be: `a/b.yaml` and `../c.yaml` give `c.yaml`. */
export function joined(from: string, path: string): string {
  const steps = [...from.split('/').slice(0, -1), ...path.split('/')];
  const result: string[] = [];
  for (const step of steps) {
    if (step === '' || step === '.') continue;
    if (step === '..' && result.length > 0 && result.at(-1) !== '..') result.pop();
    else result.push(step);
  }
  return result.join('/');
}
