/**
 * What is packed: every file that the manifest points to is on the list, and nothing of the workshop is.
 */
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { projectRoot, readProjectFile, sourcesUnder } from '../support/project-files';

const manifest = JSON.parse(readProjectFile('package.json'));
const packed: readonly string[] = manifest.files;

/** Whether the allow-list holds a file, by itself or by its folder. */
function isPacked(file: string): boolean {
  const path = file.replace(/^\.\//, '');
  return packed.some((entry) => path === entry || path.startsWith(`${entry}/`));
}

test('every file that the manifest names is packed', () => {
  const named: string[] = [
    manifest.main,
    manifest.browser,
    manifest.icon,
    ...Object.values<string>(manifest.bin),
    ...Object.values<string>(manifest.exports['.']),
  ];
  expect(named.filter((file) => !isPacked(file))).toEqual([]);
});

test("the core's bundle, which the desktop extension loads at the first board, is packed", () => {
  expect(readProjectFile('.tools/build.mjs')).toContain("coreFile: './core.js'");
  expect(isPacked('dist/core.js')).toBe(true);
});

test('the extension names the core by its types only, so that activation never loads it', () => {
  const values = sourcesUnder('extension').flatMap(({ path, text }) =>
    [...text.matchAll(/^import (?!type )[^;]*core\/index';/gm)].map(([line]) => `${path}: ${line}`),
  );
  expect(values).toEqual([]);
});

test('nothing of the workshop is packed', () => {
  const workshop = [
    'core',
    'extension',
    'test',
    '.tools',
    '.ci',
    'node_modules',
    'dist/editor-tests.js',
    'dist',
  ];
  expect(workshop.filter((path) => packed.includes(path))).toEqual([]);
  expect(packed.some((path) => path.includes('*'))).toBe(false);
});

test('no ignore file competes with the list', () => {
  expect(existsSync(join(projectRoot, '.vscodeignore'))).toBe(false);
  expect(existsSync(join(projectRoot, '.npmignore'))).toBe(false);
});

test('nothing is installed beside the bundles', () => {
  expect(manifest.dependencies ?? {}).toEqual({});
});

test('the lock files hold no download addresses', () => {
  for (const path of ['package-lock.json', 'test/editor/package-lock.json']) {
    expect(readProjectFile(path)).not.toMatch(/"resolved": "http/);
  }
});
