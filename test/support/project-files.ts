/**
 * The project's own files, for the tests about the project.
 */
import { readdirSync, readFileSync } from 'node:fs';
import { join, relative, sep } from 'node:path';
import { fileURLToPath } from 'node:url';
import type { SourceFile } from './import-rule';

export const projectRoot = fileURLToPath(new URL('../..', import.meta.url));

export function readProjectFile(path: string): string {
  return readFileSync(join(projectRoot, path), 'utf8');
}

/** All TypeScript under the folders, installed packages left out. */
export function sourcesUnder(...folders: readonly string[]): SourceFile[] {
  return folders.flatMap((folder) =>
    readdirSync(join(projectRoot, folder), { recursive: true, withFileTypes: true })
      .filter((entry) => entry.isFile() && entry.name.endsWith('.ts'))
      .map((entry) => relative(projectRoot, join(entry.parentPath, entry.name)).split(sep).join('/'))
      .filter((path) => !path.includes('node_modules/'))
      .map((path) => ({ path, text: readProjectFile(path) })),
  );
}
