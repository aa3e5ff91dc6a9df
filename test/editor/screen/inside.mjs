/**
 * Opens the page of a workbench whose extension host runs the test bundle, and hands on what it reports.
 */
import { launch } from './page.mjs';

/**
 * @param {{ program: string, profile: string, address: string, report: (line: string) => void, deadlineMs: number }} options
 * @returns {Promise<number>} the exit code that the test host gives
 */
export async function runInside({ program, profile, address, report, deadlineMs }) {
  const { context, page } = await launch({ program, profile });
  try {
    const code = new Promise((resolve, reject) => {
      setTimeout(
        () => reject(new Error(`the editor tests did not end within ${deadlineMs / 1000} s`)),
        deadlineMs,
      ).unref();
      void page.exposeFunction('codeAutomationExit', resolve);
    });
    await page.exposeFunction('codeAutomationLog', (_kind, args) => {
      for (const arg of args) if (typeof arg === 'string') report(arg);
    });
    await page.goto(address);
    return await code;
  } finally {
    await context.close();
  }
}
