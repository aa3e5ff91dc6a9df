/**
 * The façade: the only door through which the command line, the editor and library users reach the core.
 * `analyse` runs once per text; every other function reads its immutable result and never parses again.
 */
import type { Finding } from './checks/finding';
import type { Card } from './features/card';
import type { Report } from './report/report';
import type { TextEdit } from './text/edit';
import type { Span } from './text/span';

export type { Finding, FindingCode, Fix, Related, Severity } from './checks/finding';
export type { Card, Picture, Theme } from './features/card';
export type { Report } from './report/report';
export { applyEdits, type TextEdit } from './text/edit';
export type { Span } from './text/span';

export const toolName = 'Rail Ledger';
export const toolVersion = '0.1.0';

/** Everything known about one text, immutable. Spans are UTF-16 offsets into `text`. */
export interface Analysis {
  readonly text: string;
  readonly findings: readonly Finding[];
  readonly report: Report;
}

/** A pump rail, where its name stands, and a few words about it for a list to choose from. */
export interface PumpRail {
  readonly name: string;
  readonly span: Span;
  readonly detail: string;
}

/** The outcome of sizing: the edits that make the rail meet its needs, or the limit that stops it. */
export type Sizing =
  | {
      readonly ok: true;
      readonly rail: string;
      readonly summary: string;
      readonly details: readonly string[];
      readonly edits: readonly TextEdit[];
    }
  | {
      readonly ok: false;
      readonly rail: string;
      readonly reason: string;
      readonly details: readonly string[];
    };

/**
 * Reads and computes a whole board. Never throws: what cannot be read or computed stands in the findings.
 * `text` comes without a byte-order mark; `options.file` is only a name to show.
 */
export function analyse(text: string, options: { readonly file: string }): Analysis {
  return {
    text,
    findings: [],
    report: {
      format: 1,
      tool: `${toolName} ${toolVersion}`,
      file: options.file,
      board: null,
      rails: {},
      pins: {},
      groups: {},
      chips: {},
      clocks: {},
      drivers: {},
      supplies: {},
      parts: {},
      balance: null,
      findings: [],
    },
  };
}

/** The card about the thing at a text offset, or nothing. */
export function hoverCard(_analysis: Analysis, _offset: number): Card | undefined {
  return undefined;
}

/** Rails that a charge pump feeds, in the order of the file. */
export function pumpRails(_analysis: Analysis): readonly PumpRail[] {
  return [];
}

/** Name of the rail whose entry holds the offset. */
export function railAt(_analysis: Analysis, _offset: number): string | undefined {
  return undefined;
}

/** Smallest preferred capacitors with which a pump rail meets its needs. */
export function sizeRail(_analysis: Analysis, rail: string): Sizing {
  return { ok: false, rail, reason: `There is no pump rail named ${rail}.`, details: [] };
}
