/**
 * `npm run bench`: bundles the benchmark and runs it in a process of its own.
 */
import { spawn } from 'node:child_process';
import { join } from 'node:path';
import { bundle } from './build.mjs';
import { dist } from './paths.mjs';

await bundle({ entry: 'test/bench/main.ts', file: 'bench.cjs', format: 'cjs', node: true, outDir: dist });
const child = spawn(process.execPath, [join(dist, 'bench.cjs')], { stdio: 'inherit' });
child.once('exit', (code) => {
  process.exitCode = code ?? 1;
});
