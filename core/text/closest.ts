/**
 * The word that somebody probably meant: the base of every "did you mean".
 */

/**
 * The candidate nearest to `word` by edits (insert, delete, replace, swap of neighbours; case counts half),
 * or undefined when none is near: at most one edit in three letters.
 */
export function closest(word: string, candidates: Iterable<string>): string | undefined {
  const wanted = word.toLowerCase();
  const limit = Math.max(1, Math.floor(word.length / 3));
  let best: string | undefined;
  let bestDistance = limit + 0.75;
  for (const candidate of candidates) {
    if (Math.abs(candidate.length - word.length) > limit) continue;
    const plain = editDistance(wanted, candidate.toLowerCase(), limit);
    const distance = plain + (candidate === word || plain > 0 ? 0 : 0.5);
    if (distance < bestDistance) {
      best = candidate;
      bestDistance = distance;
    }
  }
  return best;
}

/**
 * Optimal string alignment distance: how many single edits lead from `a` to `b`. Beyond `limit` the exact count
 * does not matter, and any number above it may come back.
 */
export function editDistance(a: string, b: string, limit = Number.POSITIVE_INFINITY): number {
  let beforeLast: number[] = [];
  let last = Array.from({ length: b.length + 1 }, (_, j) => j);
  for (let i = 1; i <= a.length; i++) {
    const row = [i];
    for (let j = 1; j <= b.length; j++) {
      const same = a[i - 1] === b[j - 1];
      let cost = Math.min((last[j] ?? 0) + 1, (row[j - 1] ?? 0) + 1, (last[j - 1] ?? 0) + (same ? 0 : 1));
      if (i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1]) {
        cost = Math.min(cost, (beforeLast[j - 2] ?? 0) + 1);
      }
      row.push(cost);
    }
    // A swap reaches back two rows: both must be beyond the limit before nothing can come of it.
    if (Math.min(...row) > limit && Math.min(...last) > limit) return limit + 1;
    beforeLast = last;
    last = row;
  }
  return last[b.length] ?? 0;
}

/** `a`, `b` and `c`: names in back quotes for a sentence, cut after `most`. */
export function listNames(names: readonly string[], most = 8, joint = ', '): string {
  const shown = names.slice(0, most).map((name) => `\`${name}\``);
  if (names.length > most) shown.push(`and ${names.length - most} more`);
  return shown.join(joint);
}
