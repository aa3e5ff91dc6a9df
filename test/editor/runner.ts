/**
 * A runner of a few lines: tests in the order in which they are named, each line of the result printed for the
 * script outside, which counts them.
 */

interface Test {
  readonly name: string;
  readonly body: () => Promise<void>;
}

const tests: Test[] = [];

export function test(name: string, body: () => Promise<void>): void {
  tests.push({ name, body });
}

/** Throws at the end when a test failed, which is what the editor's test host expects. */
export async function runTests(): Promise<void> {
  let failed = 0;
  for (const { name, body } of tests) {
    try {
      await body();
      console.log(`ok - ${name}`);
    } catch (error) {
      failed += 1;
      console.log(`not ok - ${name}\n    ${error instanceof Error ? error.message : String(error)}`);
    }
  }
  if (failed > 0) throw new Error(`${failed} of ${tests.length} editor tests failed`);
}
