/**
 * `npm run test:desktop`: the same extension tests in a desktop VS Code, for machines that can download one.
 * Without a screen on Linux: xvfb-run -a npm run test:desktop.
 */
import { cpSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { runTests } from '@vscode/test-electron';
import { buildAll, bundle } from './build.mjs';
import { dist, editorTests, root } from './paths.mjs';

await buildAll({ types: false });
await bundle({ entry: 'test/editor/run.ts', file: 'editor-tests.js', format: 'cjs', node: false });

// A folder of its own: the tests save files, and the editor keeps its state there too.
const folder = mkdtempSync(join(tmpdir(), 'rail-ledger-'));
cpSync(join(editorTests, 'fixtures'), join(folder, 'board'), { recursive: true });
try {
  await runTests({
    cachePath: join(tmpdir(), 'rail-ledger-desktop'),
    extensionDevelopmentPath: root,
    extensionTestsPath: join(dist, 'editor-tests.js'),
    launchArgs: [
      join(folder, 'board'),
      `--user-data-dir=${join(folder, 'user')}`,
      `--extensions-dir=${join(folder, 'extensions')}`,
      '--disable-extensions',
      '--disable-workspace-trust',
    ],
  });
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
} finally {
  rmSync(folder, { recursive: true, force: true });
}
