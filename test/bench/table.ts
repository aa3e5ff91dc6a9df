/**
 * Plain tables for the benchmark, and the best of several timings: the one least disturbed by other work.
 */

/** Milliseconds of the fastest of `rounds` runs, after the function has been warmed up. */
export function bestTime(run: () => void, rounds = 7): number {
  if (rounds > 1) for (let n = 0; n < 200; n++) run();
  let best = Number.POSITIVE_INFINITY;
  for (let n = 0; n < rounds; n++) {
    const start = performance.now();
    run();
    best = Math.min(best, performance.now() - start);
  }
  return best;
}

export function table(head: readonly string[], rows: readonly (readonly string[])[]): string {
  const widths = head.map((title, k) => Math.max(title.length, ...rows.map((row) => row[k]!.length)));
  const line = (cells: readonly string[]) =>
    cells
      .map((cell, k) => (k === 0 ? cell.padEnd(widths[k]!) : cell.padStart(widths[k]!)))
      .join('  ')
      .trimEnd();
  return [line(head), widths.map((w) => '-'.repeat(w)).join('  '), ...rows.map(line)].join('\n');
}
