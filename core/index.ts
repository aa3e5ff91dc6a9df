/**
 * The façade: the only door through which the command line, the editor and library users reach the core.
 * `analyse` runs once per text; every other function reads its immutable result and never parses again.
 */
import { analyseBoard } from './analysis/analyse-board';
import { Memory } from './analysis/memory';
import { monteCarlo } from './analysis/monte-carlo';
import type { BoardAnalysis } from './analysis/types';
import type { YieldOptions, YieldProgress, YieldResult } from './analysis/yield-result';
import { catalogue } from './catalog';
import { runChecks, sortFindings } from './checks';
import type { Finding, Waived } from './checks/finding';
import { findingTitles as titles } from './checks/titles';
import { applyWaivers } from './checks/waiver-stale';
import type { Card } from './features/card';
import { hoverCard as cardAt } from './features/hover';
import { railAt as findRail, pumpRails as listPumpRails, type PumpRail } from './features/rails';
import { type Sizing, sizeRail as size } from './features/size-rail';
import { type IncludeProblem, type IncludeSource, includePaths } from './model/include';
import { toReport } from './report/json';
import { ledgerText as writeLedger } from './report/ledger';
import { colourPalette, plainPalette } from './report/paint';
import type { Report } from './report/report';
import { sizeText as writeSizes } from './report/size-text';
import { yieldMarkdown as writeYieldMarkdown } from './report/yield-markdown';
import { yieldText as writeYieldText } from './report/yield-text';
import type { Progress } from './sizing/search';
import { type SizeResult, sizing } from './sizing/size';
import { stripBom } from './text/bom';
import { joined } from './text/relative-path';

export { mostSamples, usualSamples } from './analysis/monte-carlo';
export type { YieldOptions, YieldProgress, YieldResult } from './analysis/yield-result';
export type { Finding, FindingCode, Fix, Related, Severity, Waived } from './checks/finding';
export type { Card, Picture, Theme } from './features/card';
export type { PumpRail } from './features/rails';
export type { Sizing } from './features/size-rail';
export type { IncludeProblem, IncludeSource } from './model/include';
export type { Report } from './report/report';
export type { Progress as SizeProgress } from './sizing/search';
export type { SizeChoice, SizeResult } from './sizing/size';
export { stripBom } from './text/bom';
export { applyEdits, type TextEdit } from './text/edit';
export type { Span } from './text/span';

export const toolName = 'Rail Ledger';
export const toolVersion = '0.1.0';

/** Every code with a few words, in the order of the language. */
export const findingTitles = titles;

/** Everything known about one text, immutable. Spans are UTF-16 offsets into `text`. */
export interface Analysis {
  readonly text: string;
  /** In the order of the text. */
  readonly findings: readonly Finding[];
  /** Findings that the file accepts, with its reasons; none of them stands in `findings`. */
  readonly waived: readonly Waived[];
  /** Made at the first reading. */
  readonly report: Report;
  /** What the feature functions read; its shape may change between versions. */
  readonly board: BoardAnalysis;
}

export interface AnalyseOptions {
  /** Only a name to show. */
  readonly file: string;
  /** Solved pumps of earlier analyses: with it an edit costs no more than the pumps that it reaches. */
  readonly memory?: PumpMemory;
  /**
   * Text of an included file by its path relative to this one, or why there is none; `readIncludes` makes one.
   * Without it nothing is included.
   */
  readonly include?: IncludeSource;
  /** ISO date of today, `2027-03-31`: without it no waiver runs out. */
  readonly today?: string;
}

/** What a caller keeps from one analysis of a text to the next. Its inside is nobody's business. */
export type PumpMemory = Memory;

export function newMemory(): PumpMemory {
  return new Memory();
}

/**
 * Reads and computes a whole board. Never throws: what cannot be read or computed stands in the findings.
 * A byte-order mark is taken off first and counts nowhere; `options.file` is only a name to show.
 */
export function analyse(text: string, options: AnalyseOptions): Analysis {
  const plain = stripBom(text);
  const board = analyseBoard(plain, options.file, catalogue, options.memory, options.include);
  const all = [...board.reading.findings, ...board.problems, ...runChecks(board)];
  const judged = applyWaivers(board.reading.board, all, options.today);
  const findings = sortFindings(judged.findings);
  let report: Report | undefined;
  return {
    text: plain,
    findings,
    waived: judged.waived,
    // Switch-on and switch-off cost more than the rest, and an editor does not ask for the report at each keystroke.
    get report() {
      report ??= toReport(board, findings, judged.waived, `${toolName} ${toolVersion}`);
      return report;
    },
    board,
  };
}

/**
 * Asks `read` for every file that the text includes, and for those that they include, each once; paths are relative to
 * the text's own file. What comes back is the `include` of `analyse`. Never throws as long as `read` does not.
 */
export async function readIncludes(
  text: string,
  read: (path: string) => Promise<string | IncludeProblem>,
): Promise<IncludeSource> {
  const known = new Map<string, string | IncludeProblem>();
  const open = includePaths(text).map((path) => joined('', path));
  // More files than anybody shares parts in: a list that grows without end is not followed.
  for (let path = open.shift(); path !== undefined && known.size < 100; path = open.shift()) {
    if (known.has(path)) continue;
    const found = await read(path);
    known.set(path, found);
    if (typeof found === 'string') open.push(...includePaths(found).map((inner) => joined(path!, inner)));
  }
  const left: IncludeProblem = { problem: 'more than 100 files are included in all' };
  return (path) => known.get(path) ?? (known.size >= 100 ? left : undefined);
}

/**
 * The board's ledger for a terminal of `width` characters: rails, pins, supplies and findings as aligned text, the
 * findings as `file:line:column severity code message`.
 */
export function ledgerText(
  analysis: Analysis,
  { colour, width }: { readonly colour: boolean; readonly width: number },
): string {
  return writeLedger(analysis.board, analysis.findings, analysis.waived, {
    palette: colour ? colourPalette : plainPalette,
    width,
  });
}

/** The card about the thing at a text offset, or nothing. */
export function hoverCard(analysis: Analysis, offset: number): Card | undefined {
  return cardAt(analysis.board, offset);
}

/** Rails that a charge pump feeds, in the order of the file. */
export function pumpRails(analysis: Analysis): readonly PumpRail[] {
  return listPumpRails(analysis.board);
}

/** Name of the rail whose entry holds the offset. */
export function railAt(analysis: Analysis, offset: number): string | undefined {
  return findRail(analysis.board, offset);
}

/** Smallest preferred capacitors with which a pump rail meets its needs. */
export function sizeRail(analysis: Analysis, rail: string): Sizing {
  return size(analysis.board, rail);
}

/**
 * A Monte Carlo run of the board against its needs, one sample for each step: a host shows the progress that it
 * yields, stops when told to, and finds the result in the last step. The first step comes before any work.
 */
export function yieldRun(
  analysis: Analysis,
  options: YieldOptions,
): Generator<YieldProgress, YieldResult, void> {
  return monteCarlo(analysis.board, options);
}

/** The result of a Monte Carlo run for a terminal of `width` characters. */
export function yieldText(
  result: YieldResult,
  { colour, width }: { readonly colour: boolean; readonly width: number },
): string {
  return writeYieldText(result, { palette: colour ? colourPalette : plainPalette, width });
}

/** The same as a Markdown document. */
export function yieldMarkdown(result: YieldResult): string {
  return writeYieldMarkdown(result);
}

/**
 * Ways to make a rail that meets its needs, with their parts and edits; one step for each way that is looked into, so
 * that a host may show progress or stop. The last value is the result.
 */
export function sizeRun(analysis: Analysis, rail: string): Generator<Progress, SizeResult> {
  return sizing(analysis.board, rail);
}

/** The result of `sizeRun` for a terminal. */
export function sizeText(result: SizeResult, { colour }: { readonly colour: boolean }): string {
  return writeSizes(result, colour ? colourPalette : plainPalette);
}
