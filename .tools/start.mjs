/**
 * `npm start`: builds, prints the demo board's ledger, then shows the board in the embedded editor.
 * `--once` ends after printing; `--no-open` serves without opening a browser.
 */
import { spawn } from 'node:child_process';
import { existsSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { browserAdvice, findBrowser, freshProfile } from './browser.mjs';
import { buildAll } from './build.mjs';
import { demo, dist } from './paths.mjs';
import { installWorkbench, serveWorkbench } from './workbench.mjs';

const once = process.argv.includes('--once');
const noOpen = process.argv.includes('--no-open');

await buildAll({ types: false });
await printLedger();
if (!once) await showEditor();

async function printLedger() {
  const cli = join(dist, 'cli.js');
  if (!existsSync(cli)) throw new Error('dist/cli.js was not built');
  const child = spawn(process.execPath, [cli, 'check', join(demo, 'rails.yaml')], { stdio: 'inherit' });
  const code = await new Promise((resolve) => child.once('exit', resolve));
  // 1 only says that the board has errors, as a demo may.
  if (code !== 0 && code !== 1) throw new Error(`the ledger could not be printed (exit code ${code})`);
}

async function showEditor() {
  await installWorkbench();
  const workbench = await serveWorkbench({ folder: demo });
  const page = workbench.open('rails.yaml');
  console.log(`\nThe board is open in the editor at\n  ${page}`);
  console.log('Changes made there stay in the browser; the file on disk is left alone. Ctrl-C ends it.');
  const browser = noOpen ? undefined : openBrowser(page);
  const end = () => {
    browser?.kill();
    workbench.stop();
    process.exit(0);
  };
  process.once('SIGINT', end);
  process.once('SIGTERM', end);
}

function openBrowser(page) {
  const program = findBrowser();
  if (program === undefined) {
    console.log(`${browserAdvice} Or open the address above in one by hand.`);
    return undefined;
  }
  if (process.platform === 'linux' && !process.env.DISPLAY && !process.env.WAYLAND_DISPLAY) {
    console.log('There is no screen here, so no browser was opened.');
    return undefined;
  }
  const profile = freshProfile('start');
  const args = [`--user-data-dir=${profile}`, '--no-first-run', '--no-default-browser-check'];
  // Chromium refuses to start for root with its sandbox on.
  if (process.getuid?.() === 0) args.push('--no-sandbox');
  const browser = spawn(program, [...args, page], { stdio: 'ignore' });
  browser.once('error', (error) => console.log(`The browser could not be started: ${error.message}`));
  browser.once('exit', () => rmSync(profile, { recursive: true, force: true }));
  return browser;
}
