/**
 * Waivers: each takes one finding out of the list, for a reason. One that no longer fits is a finding itself, so that a
 * waiver never hides what it was not written for.
 */
import type { Board, Waiver } from '../model/board';
import { closest } from '../text/closest';
import type { Finding, FindingCode, Waived } from './finding';

export interface Judged {
  readonly findings: readonly Finding[];
  readonly waived: readonly Waived[];
}

/** What is wrong with the file itself is not a matter of opinion. */
const never: ReadonlySet<FindingCode> = new Set([
  'syntax',
  'unknown-key',
  'missing-key',
  'unknown-name',
  'duplicate-name',
  'bad-quantity',
  'wrong-unit',
  'rail-cycle',
  'include-failed',
  'waiver-stale',
]);

/** `today` as an ISO date; without it no date has passed. */
export function applyWaivers(board: Board, all: readonly Finding[], today: string | undefined): Judged {
  const left = new Set(all);
  const waived: Waived[] = [];
  const stale: Finding[] = [];
  for (const waiver of board.waivers) {
    const result = judge(waiver, all, today);
    if (!result) continue;
    if ('stale' in result) stale.push(staleFinding(waiver, result.stale, result.fix));
    else if (left.delete(result.finding))
      waived.push({
        finding: result.finding,
        because: waiver.because!,
        ...(waiver.until === undefined ? {} : { until: waiver.until }),
      });
    else stale.push(staleFinding(waiver, 'another waiver takes the same finding already', 'delete'));
  }
  return { findings: [...left, ...stale], waived };
}

type Outcome =
  | { readonly finding: Finding }
  | { readonly stale: string; readonly fix?: 'delete' | { readonly at: string } };

/** Undefined while the waiver is not whole: what is missing is reported where it is read. */
function judge(
  { finding: code, at, because, until }: Waiver,
  all: readonly Finding[],
  today: string | undefined,
): Outcome | undefined {
  if (!code || !at || because === undefined) return undefined;
  if (because.trim() === '') return { stale: 'it gives no reason, and without one it silences nothing' };
  if (never.has(code.name as FindingCode))
    return { stale: `\`${code.name}\` cannot be waived: the file itself is at fault and is to be corrected` };
  if (until && today && isDate(until) && today > until)
    return {
      stale: `it ran out on ${until}; look at the finding again, then move the date or delete the waiver`,
    };
  const ofCode = all.filter((finding) => finding.code === code.name);
  const exact = ofCode.filter((finding) => finding.at === at.name);
  if (exact.length === 1) return { finding: exact[0]! };
  const below = exact.length > 1 ? exact : ofCode.filter((finding) => isBelow(finding.at, at.name));
  if (below.length === 1) return { finding: below[0]! };
  if (below.length > 1) {
    const places = [...new Set(below.map((finding) => finding.at))];
    return {
      stale: `it fits ${below.length} findings (${places.slice(0, 4).join(', ')}) and silences none of them: name one place`,
    };
  }
  if (ofCode.length === 0)
    return { stale: `there is no \`${code.name}\` any more, at ${at.name} or elsewhere`, fix: 'delete' };
  const near =
    closest(
      at.name,
      ofCode.map((finding) => finding.at),
    ) ?? ofCode[0]!.at;
  return { stale: `there is no \`${code.name}\` at ${at.name}; there is one at ${near}`, fix: { at: near } };
}

function isDate(text: string): boolean {
  return /^\d{4}-(0[1-9]|1[0-2])-(0[1-9]|[12]\d|3[01])$/.test(text);
}

function isBelow(path: string, above: string): boolean {
  return path.startsWith(`${above}.`) || path.startsWith(`${above}[`);
}

function staleFinding(
  { path, span, at, finding }: Waiver,
  why: string,
  fix: 'delete' | { readonly at: string } | undefined,
): Finding {
  const place =
    at && fix !== 'delete' ? { at: `${path}.at`, span: at.span } : { at: path, span: finding?.span ?? span };
  return {
    code: 'waiver-stale',
    severity: 'warning',
    ...place,
    message: `This waiver does nothing: ${why}.`,
    fixes:
      fix && fix !== 'delete' && at
        ? [{ title: `Waive it at ${fix.at}`, edits: [{ span: at.span, text: fix.at }], preferred: true }]
        : [],
  };
}
