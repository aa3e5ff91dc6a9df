/**
 * Builds everything under dist/: the extension for both hosts, the command line, the library and its types.
 * Quiet unless something fails. `--no-types` leaves the declarations out, which saves most of the time.
 */
import { spawn } from 'node:child_process';
import { chmodSync, existsSync, mkdirSync, rmSync } from 'node:fs';
import { createRequire } from 'node:module';
import { join } from 'node:path';
import { build } from 'vite';
import { dist, isStarted, root } from './paths.mjs';

/**
 * One bundle in one file. `coreFile` names the file beside it that holds the core, which then stays outside.
 * @param {{ entry: string, file: string, format: 'cjs' | 'es', node: boolean, banner?: string, outDir?: string, coreFile?: string }} options
 */
export async function bundle({ entry, file, format, node, banner, outDir = dist, coreFile }) {
  const core = join(root, 'core', 'index');
  await build({
    configFile: false,
    root,
    logLevel: 'error',
    mode: 'production',
    publicDir: false,
    define: { 'process.env.NODE_ENV': '"production"' },
    ssr: node ? { noExternal: true, target: 'node' } : undefined,
    plugins: coreFile === undefined ? [] : [coreStaysOutside(core, coreFile)],
    build: {
      outDir,
      emptyOutDir: false,
      copyPublicDir: false,
      minify: true,
      target: 'es2022',
      reportCompressedSize: false,
      chunkSizeWarningLimit: 4096,
      ...(node
        ? { ssr: join(root, entry) }
        : { lib: { entry: join(root, entry), formats: [format], fileName: () => file } }),
      rollupOptions: {
        external: (id) => id === 'vscode' || (node && id.startsWith('node:')),
        output: {
          format,
          entryFileNames: file,
          codeSplitting: false,
          exports: 'named',
          // The core is asked for by require, which sees every export of a CommonJS file.
          dynamicImportInCjs: false,
          ...(banner === undefined ? {} : { banner }),
        },
      },
    },
  });
}

/** The Node host's bundle loads the core from the file beside it, so that an editor without a board never reads it. */
function coreStaysOutside(core, file) {
  return {
    name: 'core-stays-outside',
    enforce: 'pre',
    async resolveId(source, importer) {
      if (!source.startsWith('.') || importer === undefined) return null;
      const resolved = await this.resolve(source, importer, { skipSelf: true });
      return resolved?.id.replace(/\.ts$/, '') === core ? { id: file, external: true } : null;
    },
  };
}

async function declarations() {
  const tsc = createRequire(import.meta.url).resolve('typescript/bin/tsc');
  const args = [
    '-p',
    join(root, 'core', 'tsconfig.json'),
    '--noEmit',
    'false',
    '--declaration',
    '--emitDeclarationOnly',
  ];
  args.push('--rootDir', root, '--outDir', join(dist, 'types'));
  const child = spawn(process.execPath, [tsc, ...args], { stdio: 'inherit' });
  const code = await new Promise((resolve) => child.once('exit', resolve));
  if (code !== 0) throw new Error('the type declarations could not be written');
}

/** @param {{ types?: boolean }} options */
export async function buildAll({ types = true } = {}) {
  mkdirSync(dist, { recursive: true });
  const withTypes = types ? declarations() : Promise.resolve();
  await bundle({ entry: 'core/index.ts', file: 'core.js', format: 'cjs', node: true });
  await bundle({ entry: 'core/index.ts', file: 'core.mjs', format: 'es', node: true });
  await bundle({
    entry: 'extension/main.ts',
    file: 'extension.js',
    format: 'cjs',
    node: true,
    coreFile: './core.js',
  });
  await bundle({ entry: 'extension/main.ts', file: 'extension.web.js', format: 'cjs', node: false });
  if (existsSync(join(root, 'core', 'cli', 'main.ts'))) {
    await bundle({
      entry: 'core/cli/main.ts',
      file: 'cli.js',
      format: 'cjs',
      node: true,
      banner: '#!/usr/bin/env node',
    });
    chmodSync(join(dist, 'cli.js'), 0o755);
  }
  await withTypes;
}

if (isStarted(import.meta.url)) {
  rmSync(dist, { recursive: true, force: true });
  try {
    await buildAll({ types: !process.argv.includes('--no-types') });
  } catch (error) {
    console.error(error instanceof Error ? error.message : error);
    process.exitCode = 1;
  }
}
