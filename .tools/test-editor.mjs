/**
 * `npm run test:editor`: the extension's tests inside a real workbench in a headless browser, then the pass by eye,
 * which leaves pictures in RAIL_LEDGER_ARTEFACTS (a folder of the system's temporary one if unset).
 * `--picture` draws the README's picture from the demo board instead.
 */
import { mkdirSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { browserAdvice, findBrowser, freshProfile } from './browser.mjs';
import { buildAll, bundle } from './build.mjs';
import { demo, dist, editorTests, root } from './paths.mjs';
import { installWorkbench, serveWorkbench } from './workbench.mjs';

const pictures = process.env.RAIL_LEDGER_ARTEFACTS ?? join(tmpdir(), 'rail-ledger-artefacts');
const fixtures = join(editorTests, 'fixtures');
let passed = 0;
let failed = 0;

const program = findBrowser();
if (program === undefined) {
  console.error(browserAdvice);
  process.exit(1);
}
mkdirSync(pictures, { recursive: true });
await buildAll({ types: false });
await bundle({ entry: 'test/editor/run.ts', file: 'editor-tests.js', format: 'cjs', node: false });
await installWorkbench();

if (process.argv.includes('--picture')) {
  const { drawPicture } = await import('../test/editor/screen/picture.mjs');
  const core = await import(pathToFileURL(join(dist, 'core.mjs')).href);
  await withWorkbench({ folder: demo }, ({ open }) =>
    drawPicture({
      program,
      profile: freshProfile('picture'),
      open,
      board: join(demo, 'rails.yaml'),
      core,
      file: join(root, 'media', 'hover.png'),
    }),
  );
} else {
  await inside();
  await byEye();
  console.log(`Pictures: ${pictures}`);
  console.log(`${passed} passed, ${failed} failed`);
  if (failed > 0) process.exitCode = 1;
}

async function inside() {
  const { runInside } = await import('../test/editor/screen/inside.mjs');
  await check('the tests in the extension host ran to their end', async () => {
    await withWorkbench({ folder: fixtures, tests: join(dist, 'editor-tests.js') }, async ({ address }) => {
      const [before, failedBefore] = [passed, failed];
      const code = await runInside({
        program,
        profile: freshProfile('inside'),
        address,
        report,
        deadlineMs: 240_000,
      });
      if (code !== 0 && failed === failedBefore) throw new Error(`the test host gave exit code ${code}`);
      if (passed + failed === before + failedBefore) throw new Error('no test was run');
    });
  });
}

async function byEye() {
  const { screenPass } = await import('../test/editor/screen/screen.mjs');
  await check('the pass by eye ran to its end', () =>
    withWorkbench({ folder: fixtures }, ({ open }) =>
      screenPass({ program, profile: freshProfile('screen'), open, pictures, check }),
    ),
  );
}

/** Counts and shows the result lines of the extension host, among whatever else it says. */
function report(line) {
  const result = /(?:^|\s)((not )?ok - [\s\S]*)$/.exec(line);
  if (result === null) return;
  if (result[2] === undefined) passed += 1;
  else failed += 1;
  console.log(result[1]);
}

/** @param {() => Promise<void>} body */
async function check(name, body) {
  try {
    await body();
    report(`ok - ${name}`);
  } catch (error) {
    report(`not ok - ${name}\n    ${error instanceof Error ? error.message : error}`);
  }
}

async function withWorkbench(options, body) {
  const workbench = await serveWorkbench(options);
  try {
    return await body(workbench);
  } finally {
    workbench.stop();
  }
}
