/**
 * Assertions for both hosts: a web worker has no assertion module of its own.
 */

export function ok(condition: unknown, what: string): asserts condition {
  if (!condition) throw new Error(what);
}

/** Compares by content, as JSON. */
export function equal(actual: unknown, expected: unknown, what: string): void {
  const [a, b] = [JSON.stringify(actual), JSON.stringify(expected)];
  if (a !== b) throw new Error(`${what}\n    expected ${b}\n    but got  ${a}`);
}

/** Asks again until the answer is something, and fails at the deadline. */
export async function eventually<T>(
  ask: () => T | undefined | false | Promise<T | undefined | false>,
  what: string,
  deadlineMs = 20_000,
): Promise<T> {
  const start = Date.now();
  for (;;) {
    const answer = await ask();
    if (answer !== undefined && answer !== false) return answer;
    if (Date.now() - start > deadlineMs) throw new Error(`not within ${deadlineMs / 1000} s: ${what}`);
    await pause(50);
  }
}

export function pause(milliseconds: number): Promise<void> {
  return new Promise((resolve) => setTimeout(resolve, milliseconds));
}
