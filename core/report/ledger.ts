/**
 * The ledger for a terminal: the board's rails, pins and supplies as aligned tables, then the findings, one line
 * each, then a sum. Made for 100 columns, readable from 80; a finding is one long line, as tools that read it expect.
 */
import type { BoardAnalysis } from '../analysis/types';
import type { Finding, Severity, Waived } from '../checks/finding';
import { lineIndex } from '../text/lines';
import { benchSection } from './ledger-bench';
import { pinSection } from './ledger-pins';
import { railSection } from './ledger-rails';
import { supplySection } from './ledger-supplies';
import type { Palette } from './paint';

export interface LedgerOptions {
  readonly palette: Palette;
  /** Characters on a line; tables leave out what they can spare. */
  readonly width: number;
}

/** `findings` are all of the board, in the order to print them. Ends in a line break. */
export function ledgerText(
  analysis: BoardAnalysis,
  findings: readonly Finding[],
  waived: readonly Waived[],
  { palette, width }: LedgerOptions,
): string {
  const title = analysis.reading.board.title ?? 'Board without a title';
  const sections = [
    [`${palette.strong(title)}  ${palette.faint(analysis.file)}`],
    railSection(analysis, palette, width),
    pinSection(analysis, palette, width),
    supplySection(analysis, palette, width),
    benchSection(analysis, palette, width),
    findingLines(analysis, findings, palette),
    waivedLines(analysis, waived, palette),
    [summary(findings, palette)],
  ];
  return `${sections
    .filter((section) => section.length > 0)
    .map((section) => section.join('\n'))
    .join('\n\n')}\n`;
}

function findingLines(
  { text, file }: BoardAnalysis,
  findings: readonly Finding[],
  palette: Palette,
): readonly string[] {
  if (findings.length === 0) return [];
  const lines = lineIndex(text);
  return [
    palette.heading('Findings'),
    ...findings.map(({ span, severity, code, message }) => {
      const { line, column } = lines.position(span.start);
      const paint = paintOf(severity, palette);
      return `${file}:${line}:${column} ${paint(severity)} ${palette.strong(code)} ${oneLine(message)}`;
    }),
  ];
}

function waivedLines(
  { text, file }: BoardAnalysis,
  waived: readonly Waived[],
  palette: Palette,
): readonly string[] {
  if (waived.length === 0) return [];
  const lines = lineIndex(text);
  return [
    palette.heading('Waived'),
    ...waived.map(({ finding: { span, code, at }, because, until }) => {
      const { line, column } = lines.position(span.start);
      const end = until === undefined ? '' : palette.faint(` (until ${oneLine(until)})`);
      return `${file}:${line}:${column} ${palette.strong(code)} ${at}: ${oneLine(because)}${end}`;
    }),
  ];
}

export function paintOf(severity: Severity, palette: Palette) {
  return { error: palette.bad, warning: palette.close, information: palette.note }[severity];
}

/** A message may quote the file. */
function oneLine(message: string): string {
  return message.replace(/\s+/g, ' ');
}

function summary(findings: readonly Finding[], palette: Palette): string {
  const count = (severity: Severity) => findings.filter((finding) => finding.severity === severity).length;
  const words = [
    counted(count('error'), 'error', palette.bad),
    counted(count('warning'), 'warning', palette.close),
    counted(count('information'), 'note', palette.note),
  ].filter((word) => word !== '');
  return words.length === 0 ? palette.good('No findings.') : `${words.join(', ')}.`;
}

function counted(number: number, word: string, paint: (text: string) => string): string {
  return number === 0 ? '' : paint(`${number} ${word}${number === 1 ? '' : 's'}`);
}
