/**
 * Entry of the tests that run inside the extension host, in the browser workbench and on the desktop alike.
 * The order matters once: that the core stays unloaded can be seen only before the first board opens.
 */
import { runTests } from './runner';
import { activationTests } from './suites/activation';
import { diagnosticsTests } from './suites/diagnostics';
import { hoverTests } from './suites/hover';
import { includeTests } from './suites/include';
import { quickFixTests } from './suites/quick-fix';
import { sizeRailTests } from './suites/size-rail';
import { waysTests } from './suites/ways';
import { yieldTests } from './suites/yield';

export async function run(): Promise<void> {
  activationTests();
  diagnosticsTests();
  hoverTests();
  includeTests();
  quickFixTests();
  sizeRailTests();
  waysTests();
  yieldTests();
  await runTests();
}
