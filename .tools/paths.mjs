/**
 * Places in the project that the scripts share, whatever folder they are started from.
 */
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

export const root = fileURLToPath(new URL('..', import.meta.url)).replace(/[\\/]$/, '');
export const dist = join(root, 'dist');
export const demo = join(root, 'media', 'demo');
export const editorTests = join(root, 'test', 'editor');
