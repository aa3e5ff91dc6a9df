/**
 * Text to tree. The only door to the YAML library: nothing of its types leaves this folder.
 * Never throws; a half-typed or broken text gives what is readable, and issues.
 */
import { type Document, parseDocument } from 'yaml';
import type { Span } from '../text/span';
import { span } from '../text/span';
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
    return { issues: [{ kind: 'broken', span: visible(text, 0, 0), message }] };
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
    return { issues: [{ kind: 'broken', span: visible(text, 0, 0), message }] };
  }
  const broken = [
    ...document.errors.map((error) => ({ error, kind: 'broken' as const })),
    ...document.warnings.map((error) => ({ error, kind: 'warning' as const })),
  ].map(({ error, kind }): SyntaxIssue => {
    const place = visible(text, error.pos[0], error.pos[1]);
    const message = syntaxSentence(error.code, error.message, text.slice(place.start, place.end));
    return { kind, span: place, message };
  });
  const { root, issues } = convert(text, document.contents);
  const all = unique([...broken, ...issues]).slice(0, mostIssues);
  return root ? { root, issues: all } : { issues: all };
}

/** The part of a stretch that can be underlined: inside the text, on one line, at least one character wide. */
function visible(text: string, from: number, to: number): Span {
  let start = Math.min(Math.max(from, 0), text.length);
  const breakAt = text.slice(start, to).search(/[\r\n]/);
  let end = Math.min(Math.max(breakAt < 0 ? to : start + breakAt, start), text.length);
  if (end > start) return span(start, end);
  const next = text[start];
  if (next !== undefined && next !== '\n' && next !== '\r') end = start + 1;
  else {
    while (start > 0 && /\s/.test(text[start - 1] ?? '')) start--;
    end = start;
    if (start > 0) start--;
  }
  return span(start, end);
}

function unique(issues: readonly SyntaxIssue[]): SyntaxIssue[] {
  const seen = new Set<string>();
  const sorted = [...issues].sort((a, b) => a.span.start - b.span.start || a.span.end - b.span.end);
  return sorted.filter((issue) => {
    const mark = `${issue.span.start} ${issue.span.end} ${issue.message}`;
    return seen.size < seen.add(mark).size;
  });
}
