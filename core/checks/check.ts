/**
 * The shape of a rule. A rule is a pure function from the analysed board to findings: it sees neither the editor
 * nor the terminal nor other rules. Title, severity and reason are data, so that lists and pages can show them.
 */
import type { BoardAnalysis } from '../analysis/types';
import type { Finding, FindingCode, Severity } from './finding';

export interface Check {
  readonly code: FindingCode;
  /** A few words for a list of rules. */
  readonly title: string;
  /** The gravest that the rule gives. */
  readonly severity: Severity;
  /** Why it matters on a real board. */
  readonly why: string;
  readonly run: (analysis: BoardAnalysis) => readonly Finding[];
}
