/**
 * Expected findings written into the board itself, as comments beneath the line they speak of:
 *
 *     needs: { voltage: 8..9 V }
 *     #                 ^^^^^^ error rail-low: 0.2 V short
 *
 * YAML does not see them, so the text that is checked is the text of the test.
 */

export interface Mark {
  /** 1-based line that the mark speaks of. */
  readonly line: number;
  /** What stands above the carets. */
  readonly over: string;
  readonly column: number;
  readonly severity: string;
  readonly code: string;
  /** Part of the message; empty: any. */
  readonly says: string;
}

const markLine = /^\s*#\s*(\^+)\s+(error|warning|information)\s+([a-z0-9-]+)(?::\s*(.*?))?\s*$/;

export function marksOf(text: string): readonly Mark[] {
  const lines = text.split('\n');
  const marks: Mark[] = [];
  let target = 0;
  lines.forEach((line, index) => {
    const found = markLine.exec(line);
    if (!found) {
      target = index;
      return;
    }
    const [, carets = '', severity = '', code = '', says = ''] = found;
    const start = line.indexOf('^');
    const over = (lines[target] ?? '').slice(start, start + carets.length);
    marks.push({ line: target + 1, over, column: start + 1, severity, code, says });
  });
  return marks;
}
