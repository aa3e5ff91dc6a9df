/**
 * Places in the project that the scripts share, whatever folder they are started from.
 */
import { realpathSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

export const root = fileURLToPath(new URL('..', import.meta.url)).replace(/[\\/]$/, '');
export const dist = join(root, 'dist');
export const demo = join(root, 'media', 'demo');
export const editorTests = join(root, 'test', 'editor');

/** True when the file with this `import.meta.url` was started by itself, not imported. */
export function isStarted(url) {
  const started = process.argv[1];
  return started !== undefined && realpathSync(started) === realpathSync(fileURLToPath(url));
}
