import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

// The command line as it is shipped: one bundled file, run by Node in a process of its own.

const root = fileURLToPath(new URL('../../..', import.meta.url));
const folder = mkdtempSync(join(tmpdir(), 'rail-ledger-'));
const board =
  'supplies: { lab: { voltage: 5 V, current: 1 A } }\nrails: { v5: { supply: lab, loads: { x: 2 A } } }\n';

beforeAll(() => {
  const build = pathToFileURL(join(root, '.tools', 'build.mjs')).href;
  const script = `import { bundle } from ${JSON.stringify(build)};
await bundle({ entry: 'core/cli/main.ts', file: 'cli.cjs', format: 'cjs', node: true, outDir: ${JSON.stringify(folder)} });`;
  const built = spawnSync(process.execPath, ['--input-type=module', '-e', script], {
    cwd: root,
    encoding: 'utf8',
  });
  expect(built.status, built.stderr).toBe(0);
  writeFileSync(join(folder, 'rails.yaml'), board);
});

afterAll(() => rmSync(folder, { recursive: true, force: true }));

function rail(args: readonly string[], input?: string) {
  return spawnSync(process.execPath, [join(folder, 'cli.cjs'), ...args], {
    cwd: folder,
    encoding: 'utf8',
    ...(input === undefined ? {} : { input }),
  });
}

describe('built command line', () => {
  it('finds the board of its working folder, prints without colour into a pipe, and exits 1 for errors', () => {
    const { status, stdout, stderr } = rail(['check']);
    expect([status, stderr]).toEqual([1, '']);
    expect(stdout).toMatch(/^rails\.yaml:1:43 error supply-over-limit /m);
    expect(stdout).not.toContain('\u001b');
  });

  it('reads standard input and writes the report', () => {
    const { status, stdout } = rail(['check', '-', '--format', 'json'], board.replace('2 A', '1 mA'));
    expect(status).toBe(0);
    expect(JSON.parse(stdout)).toMatchObject({ format: 1, findings: [] });
  });

  it('exits 2 for a folder and for wrong use', () => {
    const { status, stderr } = rail(['check', '.']);
    expect(status).toBe(2);
    expect(stderr).toContain('it is a folder');
    expect(rail(['check', '--nothing']).status).toBe(2);
  });
});
