/**
 * Findings of the text itself, and the last look at all findings: order, places, and silence where text is broken.
 */
import type { Finding } from '../checks/finding';
import { locate } from '../syntax/locate';
import type { Node, SyntaxIssue } from '../syntax/node';
import { covers } from '../text/span';
import { besides } from '../text/visible';
import { join } from './slot';

export function syntaxFinding(text: string, root: Node | undefined, issue: SyntaxIssue): Finding {
  const { kind, span, message, related } = issue;
  // A second key is not in the tree: the first one has the same path.
  const { path } = locate(text, root, (related ?? issue).span.start);
  const base: Finding = {
    code: kind === 'duplicate-key' ? 'duplicate-name' : 'syntax',
    severity: kind === 'warning' ? 'warning' : 'error',
    at: path.reduce<string>(join, ''),
    span,
    message,
  };
  return related ? { ...base, related: [related] } : base;
}

/** By place; and where the text itself is broken, nothing is said about what it might mean. */
export function settle(
  text: string,
  findings: readonly Finding[],
  issues: readonly SyntaxIssue[],
): Finding[] {
  const broken = issues.filter(({ kind }) => kind === 'broken').map(({ span }) => span);
  const kept = findings.filter(
    ({ code, span }) =>
      code === 'syntax' ||
      code === 'rail-cycle' ||
      !broken.some((hole) => covers(hole, span) || covers(span, hole)),
  );
  const seen = kept.map((finding) =>
    finding.span.end > finding.span.start ? finding : { ...finding, span: besides(text, finding.span.start) },
  );
  return seen.sort((a, b) => a.span.start - b.span.start || a.span.end - b.span.end);
}
