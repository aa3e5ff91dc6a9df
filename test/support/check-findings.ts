/**
 * Findings of the language, marked in the text itself. Under a line stands a comment whose carets cover the range:
 *
 *     voltage: 20 mA
 *     #           ^^ wrong-unit: unit of a current
 *
 * The words behind the colon are part of the message. A mark that has to begin in the first column begins with
 * the hash sign itself: `#^^^`. Every finding must be marked and every mark must be met.
 */
import { expect } from 'vitest';
import type { Finding } from '../../core/checks/finding';
import { type BoardReading, readBoard } from '../../core/model/build';
import { lineIndex } from '../../core/text/lines';
import { smallCatalogue } from './small-catalogue';

export interface CheckOptions {
  /** Codes that the test is not about. */
  readonly ignore?: readonly Finding['code'][];
}

export function checkFindings(text: string, options: CheckOptions = {}): BoardReading {
  const reading = readBoard(text, smallCatalogue);
  const ignored = options.ignore ?? [];
  const actual = reading.findings
    .filter(({ code }) => !ignored.includes(code))
    .map((finding) => shown(text, finding));
  const expected = marks(text);
  const matched = expected.map((mark) => {
    const at = actual.findIndex(
      ({ place, message }) => place === mark.place && message.includes(mark.message),
    );
    return at < 0 ? { place: mark.place, message: mark.message } : actual[at];
  });
  const byPlace = (a: Shown | undefined, b: Shown | undefined) =>
    `${a?.place} ${a?.message}`.localeCompare(`${b?.place} ${b?.message}`);
  expect([...actual].sort(byPlace)).toEqual([...matched].sort(byPlace));
  return reading;
}

interface Shown {
  readonly place: string;
  readonly message: string;
}

/** `3:5-9 wrong-unit`, the end column exclusive, or with its line when it lies on another one. */
function shown(text: string, { code, span, message }: Finding): Shown {
  const lines = lineIndex(text.replace(/^\ufeff/, ''));
  const start = lines.position(span.start);
  const end = lines.position(span.end);
  const last = end.line === start.line ? `${end.column}` : `${end.line}:${end.column}`;
  return { place: `${start.line}:${start.column}-${last} ${code}`, message };
}

function marks(text: string): Shown[] {
  let line = 0;
  return text.split(/\r?\n/).flatMap((content, index) => {
    const mark = /^( *)#( *)(\^+) ([a-z-]+)(?:: (.*))?$/.exec(content);
    if (!mark) {
      line = index + 1;
      return [];
    }
    const [, indent = '', gap = '', carets = '', code = '', message = ''] = mark;
    const column = indent.length + (gap === '' ? 0 : 1 + gap.length) + 1;
    const width = carets.length + (gap === '' ? 1 : 0);
    return [{ place: `${line}:${column}-${column + width} ${code}`, message }];
  });
}
