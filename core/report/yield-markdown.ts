/**
 * A Monte Carlo run as a Markdown document, for an editor to open. Words from the file are escaped.
 */
import type { YieldResult } from '../analysis/yield-result';
import {
  becauseWords,
  boardWords,
  confidenceWords,
  headWords,
  leadingWords,
  spreadTables,
  type YieldTable,
  yieldTable,
} from './yield-words';

/** Ends in a line break. */
export function yieldMarkdown(result: YieldResult): string {
  const moves = leadingWords(result).map(({ rail, words }) => `- ${escaped(rail)}: ${escaped(words)}`);
  const sections = [
    `# Yield of ${escaped(result.board ?? 'a board without a title')}`,
    `${escaped(result.file)}: ${headWords(result)}`,
    `**${escaped(boardWords(result))}**`,
    ...[yieldTable(result), ...spreadTables(result)].flatMap(section),
    ...becauseWords(result.rails).map(escaped),
    ...(moves.length === 0 ? [] : ['## What the voltage goes with (correlation)', moves.join('\n')]),
    '## How sure',
    confidenceWords(result)
      .map((line) => `- ${escaped(line)}`)
      .join('\n'),
  ];
  return `${sections.join('\n\n')}\n`;
}

/** Columns without any entry are left out, as in the terminal. */
function section({ title, columns, rows }: YieldTable): readonly string[] {
  if (rows.length === 0) return [];
  const shown = columns.map((_, c) => c).filter((c) => rows.some((row) => row[c] !== ''));
  const line = (cell: (c: number) => string) => `| ${shown.map(cell).join(' | ')} |`;
  return [
    `## ${title}`,
    [
      line((c) => columns[c]!.head),
      line((c) => (columns[c]!.align === 'right' ? '---:' : ':---')),
      ...rows.map((row) => line((c) => escaped(row[c] ?? ''))),
    ].join('\n'),
  ];
}

function escaped(text: string): string {
  return text.replace(/\s+/g, ' ').replace(/[\\`*_{}[\]<>#|!~&]/g, '\\$&');
}
