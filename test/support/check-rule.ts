/**
 * The one helper of the rule tests: a board as text, the findings of one rule as marks in it.
 */
import { expect } from 'vitest';
import { analyse, type FindingCode } from '../../core/index';
import { lineIndex } from '../../core/text/lines';
import { marksOf } from './marks';

/** Every finding of `code` is marked in `text` and every mark is found, with severity, place and words. */
export function checkRule(code: FindingCode, text: string): void {
  const { findings } = analyse(text, { file: 'rails.yaml' });
  const lines = lineIndex(text);
  const found = findings
    .filter((finding) => finding.code === code)
    .map(({ span, severity, message }) => ({
      ...lines.position(span.start),
      over: text.slice(span.start, span.end),
      severity,
      message,
    }));
  const marks = marksOf(text);
  const place = ({ line, column, over, severity }: (typeof found)[number] | (typeof marks)[number]) =>
    `${line}:${column} ${severity} ${over}`;
  const listing = found.map((finding) => `${place(finding)}: ${finding.message}`).join('\n');
  expect(found.map(place), listing).toEqual(marks.map(place));
  marks.forEach((mark, k) => {
    expect(mark.code).toBe(code);
    expect(found[k]?.message).toContain(mark.says);
  });
}

/** The rule says nothing, and the file has no error that could be the reason. */
export function checkSilent(code: FindingCode, text: string): void {
  const { findings } = analyse(text, { file: 'rails.yaml' });
  const bad = findings.filter((finding) => finding.code === code || isMisreading(finding.code));
  expect(bad.map((finding) => `${finding.code}: ${finding.message}`)).toEqual([]);
}

function isMisreading(code: FindingCode): boolean {
  return /^(syntax|unknown-|missing-|duplicate-|bad-|wrong-|rail-cycle|include-|not-converged)/.test(code);
}
