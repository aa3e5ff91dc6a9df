/**
 * Draws media/icon.png, which the packed extension needs, from media/icon.svg. Run by hand after a change of it.
 */
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { browserAdvice, findBrowser, freshProfile } from './browser.mjs';
import { root } from './paths.mjs';
import { installWorkbench } from './workbench.mjs';

const program = findBrowser();
if (program === undefined) throw new Error(browserAdvice);
await installWorkbench();
const { launch } = await import('../test/editor/screen/page.mjs');
const { context, page } = await launch({ program, profile: freshProfile('icon'), width: 128, height: 128 });
const drawing = readFileSync(join(root, 'media', 'icon.svg'), 'utf8');
await page.setContent(
  `<style>html,body{margin:0;background:transparent}svg{display:block}</style>${drawing}`,
);
await page.screenshot({ path: join(root, 'media', 'icon.png'), omitBackground: true });
await context.close();
