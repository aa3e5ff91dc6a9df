/**
 * Text to tree. The only door to the YAML library: nothing of its types leaves this folder.
 * Never throws; a half-typed or broken text gives what is readable, and issues.
 */
import { type Document, parseDocument } from 'yaml';
import { span } from '../text/span';
import { visible } from '../text/visible';
import { convert } from './convert';
import type { SyntaxIssue, SyntaxTree } from './node';
import { syntaxSentence } from './sentences';

/** A file above this is not read at all: the time for reading must stay below a keystroke's. */
export const longestText = 256 * 1024;

const mostIssues = 100;

/** `text` has no byte-order mark any more. */
export function parseText(text: string): SyntaxTree {
  if (text.length > longestText) {
    const message = 'The file is longer than 256 kB and is not read.';
    return { issues: [{ kind: 'broken', span: visible(text, span(0, 0)), message }] };
  }
  let document: Document.Parsed;
  try {
    // Failsafe keeps every scalar as text; the library's own test of unique keys takes quadratic time.
    document = parseDocument(text, {
      schema: 'failsafe',
      uniqueKeys: false,
      prettyErrors: false,
      version: '1.2',
    });
  } catch {
    // The library overflows the stack on some deeply nested texts.
    const message = 'The file is nested too deeply to be read.';
    return { issues: [{ kind: 'broken', span: visible(text, span(0, 0)), message }] };
  }
  const broken = [
    ...document.errors.map((error) => ({ error, kind: 'broken' as const })),
    ...document.warnings.map((error) => ({ error, kind: 'warning' as const })),
  ].map(({ error, kind }): SyntaxIssue => {
    const place = visible(text, span(error.pos[0], error.pos[1]));
    const message = syntaxSentence(error.code, error.message, text.slice(place.start, place.end));
    return { kind, span: place, message };
  });
  const { root, issues } = convert(text, document.contents);
  const all = unique([...broken, ...issues]).slice(0, mostIssues);
  return root ? { root, issues: all } : { issues: all };
}

function unique(issues: readonly SyntaxIssue[]): SyntaxIssue[] {
  const seen = new Set<string>();
  const sorted = [...issues].sort((a, b) => a.span.start - b.span.start || a.span.end - b.span.end);
  return sorted.filter((issue) => {
    const mark = `${issue.span.start} ${issue.span.end} ${issue.message}`;
    return seen.size < seen.add(mark).size;
  });
}
