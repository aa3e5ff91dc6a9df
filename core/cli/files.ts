/**
 * Finding board files and reading them as text.
 */
import { dirname, join, relative } from 'node:path';
import { stripBom } from '../index';
import type { Io } from './io';

export const boardFileName = 'rails.yaml';

export type Source =
  | { readonly name: string; readonly text: string }
  | { readonly name: string; readonly problem: string };

/** Relative path of the nearest board file in the working folder or above it. */
export async function findBoard(io: Io): Promise<string | undefined> {
  for (let folder = io.cwd; ; folder = dirname(folder)) {
    const candidate = join(folder, boardFileName);
    if (await io.isFile(candidate)) return relative(io.cwd, candidate) || boardFileName;
    if (dirname(folder) === folder) return undefined;
  }
}

/** `-` reads standard input, shown as `stdinName`. */
export async function readSource(file: string, stdinName: string, io: Io): Promise<Source> {
  const name = file === '-' ? stdinName : file;
  try {
    const bytes = file === '-' ? await io.readInput() : await io.readFile(file);
    return { name, text: stripBom(new TextDecoder('utf-8', { fatal: true, ignoreBOM: true }).decode(bytes)) };
  } catch (error) {
    return { name, problem: reason(error) };
  }
}

export function reason(error: unknown): string {
  const code = typeof error === 'object' && error !== null && 'code' in error ? error.code : undefined;
  switch (code) {
    case 'ENOENT':
      return 'there is no such file';
    case 'EISDIR':
      return 'it is a folder';
    case 'EACCES':
    case 'EPERM':
      return 'it may not be read';
    case 'ERR_ENCODING_INVALID_ENCODED_DATA':
      return 'it is not UTF-8 text';
    default:
      return error instanceof Error ? error.message : String(error);
  }
}
